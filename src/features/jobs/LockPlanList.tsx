import type { JobPreview } from '../../../shared/api/jobs';
import { Tag } from '../../components/Tag';
import { useWords } from '../../components/words';

type Plan = NonNullable<JobPreview['plan']>;

function Measures({ isolator }: { isolator: Plan['isolators'][number] }) {
  const { t } = useWords();
  const says = [
    isolator.lock === 'device-needed' &&
      t('office.plan.device', { device: isolator.lockDevice ?? t('office.point.notStated') }),
    isolator.lock === 'cannot-lock' && t('office.plan.cannotLock'),
    isolator.afterDoor && t('office.plan.afterDoor'),
    isolator.currentMustBeZero && t('office.plan.zeroCurrent'),
    isolator.extraMeasure && t('office.plan.extra'),
    isolator.tell.length > 0 && t('office.plan.tell', { whom: isolator.tell.join('; ') }),
  ].filter((each): each is string => typeof each === 'string');
  return says.map((each) => (
    <span key={each} className="block text-sm">
      {each}
    </span>
  ));
}

/** The isolators in opening order with what each asks for, then what stays on under guard and other energy. */
export function LockPlanList({ plan }: { plan: Plan }) {
  const { t } = useWords();
  return (
    <>
      <ol className="m-0 list-decimal pl-6">
        {plan.isolators.map((isolator) => (
          <li key={isolator.tag} className="py-1">
            <Tag>{isolator.tag}</Tag> {isolator.location}
            <Measures isolator={isolator} />
          </li>
        ))}
      </ol>
      {plan.guarded.map((each) => (
        <p key={each.supply} className="my-1">
          {t('office.plan.guard', { supply: each.supply, reason: each.reason, guard: each.guard })}
        </p>
      ))}
      {plan.otherEnergy.length > 0 && (
        <p className="my-1">{t('office.plan.otherEnergy', { sources: plan.otherEnergy.join(', ') })}</p>
      )}
      {!plan.proven && <p className="my-1">{t('office.plan.notProven')}</p>}
    </>
  );
}

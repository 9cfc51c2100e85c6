import type { PanelCheck } from '../../../shared/api/panels';
import type { Panel } from '../../../shared/panel/panelSchema';
import { usePanelCheck } from '../../api/panels';
import { Answered } from '../../components/Answered';
import { StillLiveList } from '../../components/findings/StillLiveList';
import { WaitsList } from '../../components/findings/WaitsList';
import { SheetSection } from '../../components/sheet/SheetSection';
import { SignalBox } from '../../components/SignalBox';
import { Tag } from '../../components/Tag';
import { useWords } from '../../components/words';

type Isolation = PanelCheck['isolation'];

function Plan({ plan, panel }: { plan: Isolation['plan']; panel: Panel }) {
  const { t } = useWords();
  if (plan === null) return <SignalBox signal="danger">{t('office.plan.none')}</SignalBox>;
  const location = (tag: string) => panel.isolators.find((each) => each.tag === tag)?.location;
  return (
    <>
      <p className="m-0 font-bold">{t('office.plan.open')}</p>
      <ol className="m-0 list-decimal pl-6">
        {plan.isolators.map((tag) => (
          <li key={tag} className="py-0.5">
            <Tag>{tag}</Tag> {location(tag)}
          </li>
        ))}
      </ol>
      {plan.tell.length > 0 && (
        <p className="mb-0">{t('office.plan.tell', { whom: plan.tell.join('; ') })}</p>
      )}
      {plan.guarded.length > 0 && (
        <p className="mb-0">{t('office.plan.guarded', { supplies: plan.guarded.join(', ') })}</p>
      )}
    </>
  );
}

/** What stays live behind the panel's own disconnect, and the lock plan for work on the whole panel. */
export function IsolationSection({ panel, version }: { panel: Panel; version: string }) {
  const { t, language } = useWords();
  const check = usePanelCheck(panel, version, language);
  return (
    <SheetSection title={t('office.isolation')} note={t('office.isolation.note')}>
      <Answered query={check}>
        {({ isolation }) => (
          <div className="grid items-start gap-6 md:grid-cols-2">
            <StillLiveList stillLive={isolation.stillLive} disconnect={panel.disconnect} />
            <div>
              <Plan plan={isolation.plan} panel={panel} />
              <WaitsList waits={isolation.waits} />
            </div>
          </div>
        )}
      </Answered>
    </SheetSection>
  );
}

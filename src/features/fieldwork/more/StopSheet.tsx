import { fieldButtonClass } from '../../../components/field/fieldButtonClass';
import type { Pack } from '../../../../shared/api/jobs';
import { Sheet } from '../../../components/field/Sheet';
import { SignalBox } from '../../../components/SignalBox';
import { useWords } from '../../../components/words';

/** A telephone number as the link that dials it. */
const dial = (number: string): string => `tel:${number.replace(/[^\d+*#]/g, '')}`;

/** A number that stays on one line. */
const unbroken = (number: string): string => number.replace(/ /g, '\u00a0');

/** Stop work: the emergency number, where to go, and the foreman. From the site's settings, with no network. */
export function StopSheet({ pack, onClose }: { pack: Pack; onClose: () => void }) {
  const { t } = useWords();
  const { emergencyNumber, musterPoint, foremanPhone } = pack.job.site.settings;
  const foremen = pack.people.filter(({ part }) => part === 'foreman').map(({ name }) => name);
  return (
    <Sheet title={t('field.stop.title')} onClose={onClose}>
      <SignalBox signal="danger">{t('field.stop.do')}</SignalBox>
      <a href={dial(emergencyNumber)} className={fieldButtonClass('primary', 'text-[1.3rem]')}>
        {t('field.stop.emergency', { number: unbroken(emergencyNumber) })}
      </a>
      <p className="m-0">
        <b>{t('field.stop.muster')}</b> {musterPoint}
      </p>
      {foremanPhone ? (
        <a href={dial(foremanPhone)} className={fieldButtonClass('outlined')}>
          {t('field.stop.foreman', { name: foremen.join(', '), number: unbroken(foremanPhone) })}
        </a>
      ) : (
        <p className="m-0">{t('field.stop.noPhone', { name: foremen.join(', ') })}</p>
      )}
    </Sheet>
  );
}

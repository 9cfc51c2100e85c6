import { useWords } from '../../components/words';
import type { ReadPanel } from './readPanelFile';

// A file of the wrong kind fails at every row; the first hundred places tell enough, the count tells the rest.
const shownErrors = 100;

interface PanelFileRefusedProps {
  name: string;
  refused: Extract<ReadPanel, { ok: false }>;
}

/** Why a file was not taken, place by place, and that nothing of it was stored. */
export function PanelFileRefused({ name, refused }: PanelFileRefusedProps) {
  const { t } = useWords();
  const more = refused.errors.length - shownErrors;
  return (
    <div role="alert" className="my-3 max-w-[44rem] border-2 border-l-8 border-ink px-4 py-3">
      <p className="m-0 font-bold wrap-anywhere">{t(`office.panel.file.${refused.code}`, { name })}</p>
      {refused.errors.length > 0 && (
        <ul tabIndex={0} aria-label={t('app.reasons')} className="my-2 max-h-80 list-disc overflow-auto pl-5">
          {refused.errors.slice(0, shownErrors).map((error, index) => (
            <li key={index}>
              <code className="font-mono wrap-anywhere">{error.path || t('office.panel.file.top')}</code>{' '}
              {error.says}
            </li>
          ))}
        </ul>
      )}
      {more > 0 && <p className="m-0">{t('office.panel.file.more', { n: more })}</p>}
      <p className="m-0">{t('office.panel.file.nothing')}</p>
    </div>
  );
}

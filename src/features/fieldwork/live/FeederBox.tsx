import { Fragment } from 'react';
import { useWords } from '../../../components/words';
import { useFieldJob } from '../job/useFieldJob';
import type { Feeder } from './feeders';

/** "HQ-MC2 → F12 → C2" with the isolator that is not locked drawn heavy. */
function PathLine({ path, open }: { path: string[]; open: string | undefined }) {
  return (
    <span className="font-mono">
      {path.map((tag, index) => (
        <Fragment key={`${index} ${tag}`}>
          {index > 0 && ' → '}
          {tag === open ? <b className="underline underline-offset-4">{tag}</b> : tag}
        </Fragment>
      ))}
    </span>
  );
}

function useFeederWords(feeder: Feeder): string {
  const { t } = useWords();
  switch (feeder.why) {
    case 'path':
      return feeder.open
        ? t('field.live.notLocked', { location: feeder.open.location })
        : t(feeder.maybe ? 'field.live.maybePath' : 'field.live.noIsolator');
    case 'not-opened':
      return t('field.live.notOpened', { isolator: feeder.isolator.tag, location: feeder.isolator.location });
    case 'stored':
      return t('field.live.stored', { supply: feeder.supply });
    case 'induced':
      return t('field.live.induced');
    case 'wrong-terminal':
      return t('field.live.wrongTerminal');
  }
}

/** One likely reason in its own box. */
export function FeederBox({ feeder }: { feeder: Feeder }) {
  const { pack } = useFieldJob();
  const words = useFeederWords(feeder);
  return (
    <li className="border-2 border-current px-3 py-2 leading-snug">
      {feeder.why === 'path' && (
        <p className="m-0">
          <PathLine path={feeder.path.filter((tag) => tag !== pack.panel.tag)} open={feeder.open?.tag} />
        </p>
      )}
      <p className={`m-0 ${feeder.why === 'path' ? 'text-[0.95rem]' : ''}`}>{words}</p>
    </li>
  );
}

import type { PanelCheck } from '../../../shared/api/panels';
import { formatNumber } from '../../../shared/wording/renderWith';
import { SignalBox } from '../SignalBox';
import { Tag } from '../Tag';
import { useWords } from '../words';

type StillLive = PanelCheck['isolation']['stillLive'];

/** What stays live when only the panel's own disconnect is opened: the picture people remember. */
export function StillLiveList({
  stillLive,
  disconnect,
}: {
  stillLive: StillLive;
  disconnect: string | null;
}) {
  const { t } = useWords();
  if (stillLive.length === 0) return <p className="m-0">{t('office.stillLive.none')}</p>;
  const title =
    disconnect === null ? t('office.stillLive.noDisconnect') : t('office.stillLive', { disconnect });
  return (
    <SignalBox signal="danger">
      <p className="m-0 font-bold">{title}</p>
      <ul className="m-0 max-h-72 list-none overflow-auto p-0" tabIndex={0} aria-label={title}>
        {stillLive.map((live, index) => (
          <li
            key={index}
            className="flex flex-wrap items-center gap-x-2 border-b border-rule py-1 last:border-0"
          >
            {live.terminal === undefined ? (
              <span>{live.place ?? live.supply}</span>
            ) : (
              <Tag>{live.terminal}</Tag>
            )}
            <strong className="font-mono">{formatNumber(live.V)} V</strong>
            {live.maybe && <span>{t('office.stillLive.maybe')}</span>}
            <span className="text-sm text-muted wrap-anywhere">{live.path.join(' → ')}</span>
          </li>
        ))}
      </ul>
    </SignalBox>
  );
}

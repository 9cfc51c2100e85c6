import { useState } from 'react';
import { clockWords } from '../../components/field/clockWords';
import { FieldButton } from '../../components/field/FieldButton';
import { useWords } from '../../components/words';
import { useDeviceStore, useSendState } from '../../offline/useDevice';
import { Section } from './Section';

// Long enough for any browser to have read the file before its address is taken back.
const fileReadMs = 60_000;

/** Hands the text to the person as a file. */
function saveFile(name: string, content: string) {
  const url = URL.createObjectURL(new Blob([content], { type: 'application/json' }));
  const link = document.createElement('a');
  link.href = url;
  link.download = name;
  link.click();
  setTimeout(() => {
    URL.revokeObjectURL(url);
  }, fileReadMs);
}

/** What is not sent, since when, what the server said, and the two ways to bring it over: send, or a file. */
export function UnsentSection() {
  const { t, say, language } = useWords();
  const store = useDeviceStore();
  const send = useSendState();
  const [busy, setBusy] = useState(false);
  const at = (time: string) => clockWords(time, language, new Date());
  async function exportFile() {
    const day = new Date().toISOString().slice(0, 10);
    saveFile(`${day}.coldloop-entries.json`, await store.exportUnsent());
  }
  return (
    <Section title={t('device.unsent.title')}>
      <p role="status" className="m-0 font-bold">
        {send.unsent === 0 ? t('field.unsent.none') : t('device.unsent.count', { n: send.unsent })}
      </p>
      {send.oldestUnsentAt && (
        <p className="m-0">{t('device.unsent.oldest', { since: at(send.oldestUnsentAt) })}</p>
      )}
      {send.lastSentAt && <p className="m-0">{t('device.unsent.last', { at: at(send.lastSentAt) })}</p>}
      {send.lastError && <p className="m-0">{t('device.unsent.error', { says: say(send.lastError) })}</p>}
      {send.needsAttention.map(({ entry, says }) => (
        <p key={entry} className="m-0 border-l-8 border-ink pl-2">
          {t('device.unsent.aside', { says })}
        </p>
      ))}
      <FieldButton
        look="primary"
        disabled={busy}
        aria-busy={busy}
        onClick={() => {
          setBusy(true);
          void store.sendNow().finally(() => {
            setBusy(false);
          });
        }}
      >
        {t(busy ? 'device.unsent.sending' : 'device.unsent.send')}
      </FieldButton>
      <FieldButton
        disabled={send.unsent === 0 && send.needsAttention.length === 0}
        onClick={() => void exportFile()}
      >
        {t('device.unsent.export')}
      </FieldButton>
    </Section>
  );
}

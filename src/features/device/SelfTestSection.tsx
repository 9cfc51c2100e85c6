import { useState } from 'react';
import { FieldButton } from '../../components/field/FieldButton';
import { useWords } from '../../components/words';
import type { LocalJob, Readiness } from '../../offline/types';
import { useDeviceStore, useLocalJobs } from '../../offline/useDevice';
import { Section } from './Section';

function JobTest({ local }: { local: LocalJob }) {
  const { t, say } = useWords();
  const store = useDeviceStore();
  const [readiness, setReadiness] = useState<Readiness>();
  const [busy, setBusy] = useState(false);
  const { id, number } = local.pack.job;
  async function test() {
    setBusy(true);
    try {
      await store.fix(id, 'self-test');
    } finally {
      setReadiness(await store.readiness(id));
      setBusy(false);
    }
  }
  const missing = readiness?.checks.filter(({ ok }) => !ok) ?? [];
  return (
    <div className="grid gap-1">
      <FieldButton disabled={busy} aria-busy={busy} onClick={() => void test()}>
        {t(busy ? 'device.test.running' : 'device.test.run', { number })}
      </FieldButton>
      <div role="status">
        {readiness?.ready && <p className="m-0 font-bold">{t('field.ready.yes')}</p>}
        {missing.map(({ check, says }) => (
          <p key={check} className="m-0">
            {say(says)}
          </p>
        ))}
      </div>
    </div>
  );
}

/** Opens each job with the network refused, to see that it really works with no signal. */
export function SelfTestSection({ person }: { person: string }) {
  const { t } = useWords();
  const jobs = useLocalJobs(person);
  return (
    <Section title={t('device.test.title')}>
      <p className="m-0">{t('device.test.what')}</p>
      {jobs?.map((local) => (
        <JobTest key={local.pack.job.id} local={local} />
      ))}
      {jobs?.length === 0 && <p className="m-0">{t('field.jobs.none')}</p>}
    </Section>
  );
}

import { useState } from 'react';
import { paths } from '../../../app/paths';
import { ActionBar } from '../../../components/field/ActionBar';
import { FieldButton, FieldLink } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { setHere, useHere } from '../../../components/field/here';
import { Sheet } from '../../../components/field/Sheet';
import { Switches } from '../../../components/field/Switches';
import { TitleStrip } from '../../../components/field/TitleStrip';
import { useWords } from '../../../components/words';
import type { LocalJob } from '../../../offline/types';
import { useDeviceStore, useLocalJobs } from '../../../offline/useDevice';
import { UnsentLine } from '../layout/UnsentLine';
import { SiteStop } from './SiteStop';
import { JobCard } from './JobCard';

function NoJobs() {
  const { t } = useWords();
  return (
    <div className="border-2 border-ink bg-sheet px-3 py-3">
      <p className="m-0 font-bold">{t('field.jobs.none')}</p>
      <p className="m-0">{t('field.jobs.noneWhat')}</p>
    </div>
  );
}

function Jobs({ jobs, person }: { jobs: LocalJob[]; person: string }) {
  if (jobs.length === 0) return <NoJobs />;
  return (
    <ul className="m-0 grid list-none gap-3 p-0">
      {jobs.map((local) => (
        <JobCard key={local.pack.job.id} local={local} person={person} />
      ))}
    </ul>
  );
}

/** What is mine on this phone. Nothing here needs the network. */
export function MyJobsPage() {
  const { t } = useWords();
  const store = useDeviceStore();
  const here = useHere();
  const jobs = useLocalJobs(here?.person ?? '');
  const [more, setMore] = useState(false);
  const [looking, setLooking] = useState(false);
  async function look() {
    setLooking(true);
    await store.sendNow();
    setLooking(false);
  }
  if (!here) return null;
  return (
    <FieldPage
      header={
        <TitleStrip
          cells={[
            { label: t('field.jobs.sheet'), value: here.name },
            { label: t('field.app'), value: t('field.jobs.title') },
          ]}
        />
      }
      banner={<UnsentLine />}
      footer={
        <ActionBar>
          <FieldButton disabled={looking} aria-busy={looking} onClick={() => void look()}>
            {t(looking ? 'field.jobs.looking' : 'field.jobs.look')}
          </FieldButton>
          <FieldButton
            onClick={() => {
              setMore(true);
            }}
          >
            {t('field.more')}
          </FieldButton>
          <SiteStop jobs={jobs ?? []} />
        </ActionBar>
      }
    >
      <h1 className="m-0 font-bold text-[1.6rem] leading-tight">{t('field.jobs.title')}</h1>
      {jobs && <Jobs jobs={jobs} person={here.person} />}
      {more && (
        <Sheet
          title={t('field.more')}
          onClose={() => {
            setMore(false);
          }}
        >
          <Switches />
          <FieldLink to={paths.device}>{t('field.thisDevice')}</FieldLink>
          <FieldLink to={paths.home}>{t('field.office')}</FieldLink>
          <FieldButton
            onClick={() => {
              setHere(null);
            }}
          >
            {t('field.who.leave')}
          </FieldButton>
        </Sheet>
      )}
    </FieldPage>
  );
}

import { useEffect, useMemo } from 'react';
import { Outlet, useParams } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { FieldLink } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { useHere } from '../../../components/field/here';
import { TitleStrip } from '../../../components/field/TitleStrip';
import { useWords } from '../../../components/words';
import { useDeviceStore, useLocalJob } from '../../../offline/useDevice';
import { UnsentLine } from '../layout/UnsentLine';
import { fieldJobOf } from './fieldJobOf';
import { FieldJobContext } from './useFieldJob';

function JobMissing() {
  const { t } = useWords();
  return (
    <FieldPage
      header={<TitleStrip cells={[{ label: t('field.app'), value: t('field.job.missing') }]} />}
      banner={<UnsentLine />}
    >
      <h1 className="m-0 font-bold text-[1.6rem] leading-tight">{t('field.job.missing')}</h1>
      <p className="m-0">{t('field.job.missingWhy')}</p>
      <FieldLink to={paths.myJobs} look="primary">
        {t('field.jobs.title')}
      </FieldLink>
    </FieldPage>
  );
}

/** Opens one job from what this phone holds; every page of the job reads it from here. */
export function JobLayout() {
  const { job: id = '' } = useParams();
  const here = useHere();
  const { language } = useWords();
  const store = useDeviceStore();
  const local = useLocalJob(id);
  useEffect(() => store.watch(id), [store, id]);
  const job = useMemo(
    () => (local && here ? fieldJobOf(local, here, language) : undefined),
    [local, here, language],
  );
  if (local === undefined) return null;
  if (!job) return <JobMissing />;
  return (
    <FieldJobContext.Provider value={job}>
      <Outlet />
    </FieldJobContext.Provider>
  );
}

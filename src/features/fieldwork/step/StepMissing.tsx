import { paths } from '../../../app/paths';
import { FieldLink } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { useWords } from '../../../components/words';
import { JobHeader } from '../job/JobHeader';
import { useFieldJob } from '../job/useFieldJob';
import { UnsentLine } from '../layout/UnsentLine';

/** An address that names no step of this checklist, an old link for example. */
export function StepMissing() {
  const { t } = useWords();
  const { pack } = useFieldJob();
  return (
    <FieldPage header={<JobHeader />} banner={<UnsentLine />}>
      <h1 className="m-0 font-bold text-[1.6rem] leading-tight">{t('field.step.missing')}</h1>
      <FieldLink to={paths.myJob(pack.job.id)} look="primary">
        {t('field.job.open')}
      </FieldLink>
    </FieldPage>
  );
}

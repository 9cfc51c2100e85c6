import { useEffect } from 'react';
import { useNavigate } from 'react-router-dom';
import { paths } from '../../app/paths';
import { ActionBar } from '../../components/field/ActionBar';
import { FieldButton, FieldLink } from '../../components/field/FieldButton';
import { FieldPage } from '../../components/field/FieldPage';
import { useHere } from '../../components/field/here';
import { SaveLine } from '../../components/field/SaveLine';
import { Switches } from '../../components/field/Switches';
import { applyTheme } from '../../components/field/theme';
import { TitleStrip } from '../../components/field/TitleStrip';
import { useWords } from '../../components/words';
import { useSendState } from '../../offline/useDevice';
import { LeaveSection } from './LeaveSection';
import { PeopleSection } from './PeopleSection';
import { SelfTestSection } from './SelfTestSection';
import { StorageSection } from './StorageSection';
import { UnsentSection } from './UnsentSection';
import { VersionSection } from './VersionSection';

/** This device: what waits on it, who uses it, what it can keep, and which version it runs. */
export function DevicePage() {
  const { t } = useWords();
  const here = useHere();
  const send = useSendState();
  const navigate = useNavigate();
  useEffect(applyTheme, []);
  return (
    <FieldPage
      header={
        <TitleStrip
          cells={[
            { label: t('field.app'), value: t('field.thisDevice') },
            ...(here ? [{ label: t('field.jobs.sheet'), value: here.name }] : []),
          ]}
        />
      }
      banner={
        <SaveLine ticked={send.unsent === 0}>
          {send.unsent === 0 ? t('field.unsent.none') : t('field.unsent.some', { n: send.unsent })}
        </SaveLine>
      }
      footer={
        <ActionBar>
          <FieldButton onClick={() => void navigate(-1)}>{t('field.back')}</FieldButton>
          <FieldLink to={paths.myJobs}>{t('field.jobs.title')}</FieldLink>
        </ActionBar>
      }
    >
      <h1 className="m-0 font-bold text-[1.6rem] leading-tight">{t('field.thisDevice')}</h1>
      <UnsentSection />
      <PeopleSection />
      {here && <SelfTestSection person={here.person} />}
      <StorageSection />
      <VersionSection />
      <LeaveSection />
      <Switches />
    </FieldPage>
  );
}

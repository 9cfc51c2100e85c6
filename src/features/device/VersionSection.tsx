import { useState } from 'react';
import { version } from '../../../package.json';
import { FieldButton } from '../../components/field/FieldButton';
import { useWords } from '../../components/words';
import { Section } from './Section';
import { useUpdate } from './useUpdate';

/** Which version runs, and whether a newer one waits. */
export function VersionSection() {
  const { t } = useWords();
  const { waiting, look, apply } = useUpdate();
  const [looked, setLooked] = useState(false);
  return (
    <Section title={t('device.version.title')}>
      <p className="m-0">{t('device.version.is', { version })}</p>
      <p role="status" className="m-0 empty:hidden">
        {waiting ? t('device.version.waits') : looked ? t('device.version.newest') : ''}
      </p>
      {waiting ? (
        <FieldButton look="primary" onClick={apply}>
          {t('device.version.apply')}
        </FieldButton>
      ) : (
        <FieldButton
          onClick={() =>
            void look().then(() => {
              setLooked(true);
            })
          }
        >
          {t('device.version.look')}
        </FieldButton>
      )}
    </Section>
  );
}

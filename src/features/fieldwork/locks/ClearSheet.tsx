import { useEffect, useState } from 'react';
import type { PackPerson } from '../../../../shared/api/jobs';
import { PinForm } from '../../../components/field/PinForm';
import { Sheet } from '../../../components/field/Sheet';
import { useWords } from '../../../components/words';
import { NotSavedError } from '../../../offline/types';
import { useDeviceStore } from '../../../offline/useDevice';
import { NotSaved } from '../job/NotSaved';
import { useFieldJob } from '../job/useFieldJob';

/** Who may say it here: the person with their PIN on this phone; for one who never locked on, the foreman. */
function useSigner(person: PackPerson): string | undefined {
  const store = useDeviceStore();
  const { state, me, part } = useFieldJob();
  const [enrolled, setEnrolled] = useState(false);
  useEffect(() => {
    void store.people().then((people) => {
      setEnrolled(people.some((each) => each.person === person.id));
    });
  }, [store, person.id]);
  const everLocked = state.locks.some((lock) => lock.person === person.id);
  if (enrolled) return person.id;
  return part === 'foreman' && !everLocked ? me.person : undefined;
}

/** One person says with their own PIN: my hands, tools and people are out, power may come back. */
export function ClearSheet({ person, onClose }: { person: PackPerson; onClose: () => void }) {
  const { t } = useWords();
  const store = useDeviceStore();
  const { pack, nameOf } = useFieldJob();
  const signer = useSigner(person);
  const [failed, setFailed] = useState<NotSavedError['code']>();
  async function say(pin: string): Promise<number | undefined> {
    if (!signer) return undefined;
    const result = await store.checkPin(signer, pin);
    if (!result.ok) return result.waitMs;
    try {
      await store.append(signer, pack.job.id, 'clear', { person: person.id });
      onClose();
    } catch (error) {
      setFailed(error instanceof NotSavedError ? error.code : 'unknown');
    }
    return undefined;
  }
  return (
    <Sheet
      title={t('field.clear.say', { name: person.name })}
      onClose={onClose}
      closeWords={t('field.cancel')}
    >
      {signer ? (
        <>
          <p className="m-0">{t('field.clear.means')}</p>
          <PinForm
            label={t('field.clear.pin', { name: nameOf(signer) })}
            submit={t('field.clear.say', { name: person.name })}
            check={say}
          />
        </>
      ) : (
        <p className="m-0">{t('field.clear.cannot', { name: person.name })}</p>
      )}
      <NotSaved code={failed} />
    </Sheet>
  );
}

import { useState, type SubmitEvent } from 'react';
import { Link, useLocation, useNavigate } from 'react-router-dom';
import { useSession } from '../../api/session';
import { paths } from '../../app/paths';
import { fieldButtonClass } from '../../components/field/fieldButtonClass';
import { FieldButton } from '../../components/field/FieldButton';
import { setHere } from '../../components/field/here';
import { minPinLength } from '../../components/field/PinForm';
import { useWords } from '../../components/words';
import type { SessionView } from '../../../shared/api/people';
import type { DevicePerson } from '../../offline/types';
import { useDeviceStore } from '../../offline/useDevice';
import { PinField } from './PinField';

function SetPin({ person }: { person: SessionView['person'] }) {
  const { t } = useWords();
  const store = useDeviceStore();
  const navigate = useNavigate();
  // Whoever was sent here from a page goes back to it.
  const { state } = useLocation() as { state: { to?: string } | null };
  const [pin, setPin] = useState('');
  const [again, setAgain] = useState('');
  const [busy, setBusy] = useState(false);
  const [failed, setFailed] = useState(false);
  const tooShort = pin.length > 0 && pin.length < minPinLength;
  const differs = again.length > 0 && again !== pin;
  async function enrol(event: SubmitEvent) {
    event.preventDefault();
    setBusy(true);
    setFailed(false);
    try {
      await store.enrol({ id: person.id, name: person.name, email: person.email }, pin);
      setHere({ person: person.id, name: person.name });
      await navigate(state?.to ?? paths.myJobs);
    } catch {
      setFailed(true);
      setBusy(false);
    }
  }
  return (
    <form className="grid gap-2" onSubmit={(event) => void enrol(event)}>
      <p className="m-0">{t('device.enrol.what', { name: person.name })}</p>
      <PinField
        label={t('device.enrol.pin')}
        value={pin}
        onChange={setPin}
        error={tooShort ? t('device.enrol.short', { n: minPinLength }) : undefined}
      />
      <PinField
        label={t('device.enrol.again')}
        value={again}
        onChange={setAgain}
        error={differs ? t('device.enrol.differs') : undefined}
      />
      <p role="alert" className="m-0 font-bold empty:hidden">
        {failed && t('device.enrol.failed')}
      </p>
      <FieldButton
        type="submit"
        look="primary"
        aria-busy={busy}
        disabled={busy || pin.length < minPinLength || pin !== again}
      >
        {t('device.enrol.save')}
      </FieldButton>
    </form>
  );
}

/** Signing in online gives this device a key for the person, and the person a PIN for this device. */
export function EnrolForm({ enrolled }: { enrolled: DevicePerson[] }) {
  const { t } = useWords();
  const session = useSession();
  const person = session.data?.person;
  if (person && enrolled.some((each) => each.person === person.id))
    return <p className="m-0">{t('device.enrol.other', { name: person.name })}</p>;
  if (person) return <SetPin person={person} />;
  return (
    <>
      <p className="m-0">{t(session.isError ? 'device.enrol.noNetwork' : 'device.enrol.signIn')}</p>
      <Link to={paths.signIn} className={fieldButtonClass('outlined')}>
        {t('app.signIn')}
      </Link>
    </>
  );
}

import { useState } from 'react';
import type { PersonView } from '../../../shared/api/people';
import { useChangePerson } from '../../api/people';
import { useSession } from '../../api/session';
import { Button } from '../../components/Button';
import { Dialog } from '../../components/Dialog';
import { CheckField } from '../../components/form/CheckField';
import { TextField } from '../../components/form/TextField';
import { ProblemMessage } from '../../components/ProblemMessage';
import { SignalBox } from '../../components/SignalBox';
import { useWords } from '../../components/words';
import { RolesField } from './RolesField';
import { oneLine } from '../../components/field/oneLine';

/** Name, roles, and whether the person may use Coldloop at all, with what switching off does. */
export function PersonDialog({ person, onClose }: { person: PersonView; onClose: () => void }) {
  const { t } = useWords();
  const session = useSession();
  const change = useChangePerson();
  const [name, setName] = useState(person.name);
  const [roles, setRoles] = useState(person.roles);
  const [active, setActive] = useState(person.active);
  const self = session.data?.person.id === person.id;
  const nameError = oneLine(name) === '' ? t('app.required') : undefined;
  const save = () =>
    !nameError &&
    change.mutate(
      { id: person.id, version: person.version, name: oneLine(name), roles, active },
      { onSuccess: onClose },
    );
  return (
    <Dialog
      open
      title={person.name}
      onClose={onClose}
      closeWords={t('app.cancel')}
      actions={
        <Button look="primary" onClick={save} busy={change.isPending}>
          {active || !person.active ? t('app.save') : t('office.people.switchOff')}
        </Button>
      }
    >
      <p className="m-0">{person.email}</p>
      <TextField
        label={t('office.people.name')}
        maxLength={120}
        value={name}
        onChange={(event) => setName(event.target.value)}
        error={nameError}
      />
      <RolesField roles={roles} onChange={setRoles} />
      {self ? (
        <p>{t('office.people.self')}</p>
      ) : (
        <CheckField
          label={t('office.people.active')}
          checked={active}
          onChange={(event) => setActive(event.target.checked)}
        />
      )}
      {person.active && !active && (
        <SignalBox signal="notice">{t('office.people.off.consequence', { name: person.name })}</SignalBox>
      )}
      <ProblemMessage error={change.error} />
    </Dialog>
  );
}

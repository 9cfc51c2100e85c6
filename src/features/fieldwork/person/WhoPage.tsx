import { useEffect, useState } from 'react';
import { useLocation } from 'react-router-dom';
import { paths } from '../../../app/paths';
import { FieldButton, FieldLink } from '../../../components/field/FieldButton';
import { FieldPage } from '../../../components/field/FieldPage';
import { PinForm } from '../../../components/field/PinForm';
import { setHere } from '../../../components/field/here';
import { Switches } from '../../../components/field/Switches';
import { TitleStrip } from '../../../components/field/TitleStrip';
import { useWords } from '../../../components/words';
import type { DevicePerson } from '../../../offline/types';
import { useDeviceStore } from '../../../offline/useDevice';
import { presenceProven } from './idle';
import { UnsentLine } from '../layout/UnsentLine';

function PersonPin({ person, onBack }: { person: DevicePerson; onBack: () => void }) {
  const { t } = useWords();
  const store = useDeviceStore();
  return (
    <>
      <h1 className="m-0 font-bold text-[1.6rem] leading-tight">{person.name}</h1>
      <PinForm
        label={t('field.pin.yours')}
        submit={t('field.pin.open')}
        check={async (pin) => {
          const result = await store.checkPin(person.person, pin);
          if (!result.ok) return result.waitMs;
          presenceProven();
          setHere({ person: person.person, name: person.name });
          return undefined;
        }}
      />
      <FieldButton onClick={onBack}>{t('field.who.other')}</FieldButton>
    </>
  );
}

function PersonList({
  people,
  onChoose,
}: {
  people: DevicePerson[];
  onChoose: (person: DevicePerson) => void;
}) {
  const { t } = useWords();
  const { pathname } = useLocation();
  return (
    <>
      <h1 className="m-0 font-bold text-[1.6rem] leading-tight">
        {t(people.length ? 'field.who.title' : 'field.who.nobody')}
      </h1>
      {people.map((person) => (
        <FieldButton
          key={person.person}
          onClick={() => {
            onChoose(person);
          }}
        >
          {person.name}
        </FieldButton>
      ))}
      <p className="m-0 text-muted">{t('field.who.add')}</p>
      <FieldLink to={paths.device} state={{ to: pathname }} look={people.length ? 'quiet' : 'primary'}>
        {t('field.who.setUp')}
      </FieldLink>
      <p className="m-0 text-[0.95rem]">{t('field.safetyPosition')}</p>
    </>
  );
}

/** The door of the field part: a person of this phone opens it with their PIN, with or without a network. */
export function WhoPage() {
  const { t } = useWords();
  const store = useDeviceStore();
  const [people, setPeople] = useState<DevicePerson[]>();
  const [chosen, setChosen] = useState<DevicePerson>();
  useEffect(() => {
    void store.people().then(setPeople);
  }, [store]);
  return (
    <FieldPage
      header={<TitleStrip cells={[{ label: t('field.app'), value: t('field.who.sheet') }]} />}
      banner={<UnsentLine />}
      answer={<Switches />}
    >
      {chosen ? (
        <PersonPin
          person={chosen}
          onBack={() => {
            setChosen(undefined);
          }}
        />
      ) : (
        people && <PersonList people={people} onChoose={setChosen} />
      )}
    </FieldPage>
  );
}

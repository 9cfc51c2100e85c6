import { useEffect, useState } from 'react';
import { clockWords } from '../../components/field/clockWords';
import { useWords } from '../../components/words';
import type { DevicePerson } from '../../offline/types';
import { useDeviceStore } from '../../offline/useDevice';
import { EnrolForm } from './EnrolForm';
import { Section } from './Section';

/** Who has a PIN on this device, and a PIN for who is signed in. */
export function PeopleSection() {
  const { t, language } = useWords();
  const store = useDeviceStore();
  const [people, setPeople] = useState<DevicePerson[]>([]);
  useEffect(() => {
    const read = () => void store.people().then(setPeople);
    read();
    return store.subscribe(read);
  }, [store]);
  return (
    <Section title={t('device.people.title')}>
      {people.length === 0 && <p className="m-0">{t('field.who.nobody')}</p>}
      <ul className="m-0 list-none p-0">
        {people.map(({ person, name, email, enrolledAt }) => (
          <li key={person}>
            <b>{name}</b> {email}{' '}
            <span className="text-muted">
              {t('device.people.since', { at: clockWords(enrolledAt, language, new Date()) })}
            </span>
          </li>
        ))}
      </ul>
      <EnrolForm enrolled={people} />
    </Section>
  );
}

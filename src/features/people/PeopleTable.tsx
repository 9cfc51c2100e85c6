import type { PersonView } from '../../../shared/api/people';
import { useCurrentSite } from '../../api/currentSite';
import { Button } from '../../components/Button';
import { Moment } from '../../components/Moment';
import { Table, type Column } from '../../components/Table';
import { useWords } from '../../components/words';

interface PeopleTableProps {
  rows: readonly PersonView[];
  onChange: (person: PersonView) => void;
}

function Standing({ person }: { person: PersonView }) {
  const { t } = useWords();
  if (!person.active) return <strong>{t('office.people.off')}</strong>;
  if (person.joinedAt !== null)
    return (
      <>
        {t('office.people.joined')} <Moment at={person.joinedAt} form="date" />
      </>
    );
  return (
    <>
      {t('office.people.invited')} {person.invitedAt && <Moment at={person.invitedAt} form="date" />}
    </>
  );
}

export function PeopleTable({ rows, onChange }: PeopleTableProps) {
  const { t } = useWords();
  const { sites } = useCurrentSite();
  const roleWords = (person: PersonView) =>
    sites.flatMap((site) => {
      const held = person.roles
        .filter((each) => each.site === site.id)
        .map((each) => t(`app.role.${each.role}`));
      return held.length === 0 ? [] : [`${site.name}: ${held.join(', ')}`];
    });
  const columns: Column<PersonView>[] = [
    {
      head: t('office.people.name'),
      className: 'md:w-[20%]',
      cell: (person) => <strong>{person.name}</strong>,
    },
    { head: t('app.signIn.email'), cell: (person) => person.email },
    {
      head: t('office.people.roles'),
      className: 'md:w-[30%]',
      cell: (person) =>
        roleWords(person).map((words) => (
          <span key={words} className="block">
            {words}
          </span>
        )),
    },
    { head: t('office.people.standing'), cell: (person) => <Standing person={person} /> },
    {
      head: t('office.act'),
      headHidden: true,
      className: 'md:w-[13%]',
      cell: (person) => (
        <Button
          aria-label={t('office.people.changeName', { name: person.name })}
          onClick={() => onChange(person)}
        >
          {t('office.people.change')}
        </Button>
      ),
    },
  ];
  return <Table caption={t('app.tab.people')} columns={columns} rows={rows} keyOf={(person) => person.id} />;
}

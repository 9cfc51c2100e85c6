import type { ReactNode } from 'react';
import { clockWords } from '../../../components/field/clockWords';
import { useWords } from '../../../components/words';
import { HoldList } from '../review/HoldList';
import { useFieldJob } from './useFieldJob';

function Block({ title, children }: { title: string; children: ReactNode }) {
  return (
    <section className="border-t-2 border-ink pt-2">
      <h2 className="m-0 font-bold text-[1.1rem] leading-tight">{title}</h2>
      {children}
    </section>
  );
}

function People() {
  const { t } = useWords();
  const { pack } = useFieldJob();
  return (
    <ul className="m-0 list-none p-0">
      {pack.people.map(({ id, name, part }) => (
        <li key={id}>
          <b>{name}</b> {t(`field.part.${part}`)}
        </li>
      ))}
    </ul>
  );
}

function TitleBlock() {
  const { t } = useWords();
  const { pack } = useFieldJob();
  const { panel, job } = pack;
  const rows = [
    [t('field.title.panel'), `${panel.tag} ${panel.name}`],
    [t('field.job.where'), panel.location],
    [t('field.title.drawing'), `${panel.drawing.number} ${panel.drawing.revision}`],
    [t('field.job.revision'), String(pack.revision)],
    [t('field.job.site'), job.site.name],
    [t('field.job.due'), job.due],
  ] as const;
  return (
    <dl className="m-0 grid grid-cols-[auto_1fr] gap-x-3 leading-snug">
      {rows.map(([label, value]) => (
        <div key={label} className="contents">
          <dt className="text-muted">{label}</dt>
          <dd className="m-0">{value}</dd>
        </div>
      ))}
    </dl>
  );
}

/** Holds, contradictions, people, the title block in full, and the notes of a job. */
export function JobFacts() {
  const { t, language } = useWords();
  const { state, nameOf, plain } = useFieldJob();
  return (
    <>
      {state.contradictions.length > 0 && (
        <Block title={t('field.job.contradictions')}>
          {state.contradictions.map(({ code, entries, says }) => (
            <p key={`${code} ${entries.join()}`} className="m-0 font-bold">
              {plain(says)}
            </p>
          ))}
        </Block>
      )}
      <HoldList />
      <Block title={t('field.job.people')}>
        <People />
      </Block>
      <Block title={t('field.job.titleBlock')}>
        <TitleBlock />
      </Block>
      {state.notes.length > 0 && (
        <Block title={t('field.job.notes')}>
          {state.notes.map(({ entry, person, at, words }) => (
            <p key={entry} className="m-0 leading-snug">
              {words}{' '}
              <span className="text-muted">
                {nameOf(person)}, {clockWords(at, language, new Date())}
              </span>
            </p>
          ))}
        </Block>
      )}
    </>
  );
}

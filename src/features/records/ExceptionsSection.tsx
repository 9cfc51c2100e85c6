import type { RecordDocument } from '../../../shared/api/recordDocument';
import { recordExceptions } from '../../../shared/api/recordExceptions';
import { Moment } from '../../components/Moment';
import { SheetSection } from '../../components/sheet/SheetSection';
import { useWords } from '../../components/words';

/** What did not go as planned: findings that stood, holds with their decision, later rounds. */
export function ExceptionsSection({ document }: { document: RecordDocument }) {
  const { t } = useWords();
  const rounds = document.rounds.filter((round) => round.number > 1);
  const said = [
    ...document.returned.map((each) => ({ ...each, what: t('records.returned') })),
    ...document.chosen.map((each) => ({ ...each, what: t('records.chosen') })),
    ...document.drawingDiffers.map((each) => ({ ...each, what: t('records.drawingDiffers'), shown: null })),
    ...document.notes.map((each) => ({ ...each, what: t('records.note'), shown: null })),
  ];
  const answers = recordExceptions(document);
  const removed = document.lockOut.filter(({ removedBy }) => removedBy !== null);
  const none =
    answers.length +
      removed.length +
      document.findings.length +
      document.holds.length +
      rounds.length +
      said.length ===
    0;
  return (
    <SheetSection title={t('records.exceptions')}>
      {none && <p className="m-0">{t('records.exceptions.none')}</p>}
      <ul className="m-0 list-none p-0">
        {answers.map(({ verdict, shown, between, answer, person, at, then }) => (
          <li key={`${shown ?? between?.join()} ${answer} ${at}`} className="border-b border-rule py-2">
            <strong>{t(`records.verdict.${verdict}`)}</strong>{' '}
            {shown ?? `${t('records.deadTests')}, ${between?.join(' – ') ?? ''}`}: {answer}. {person},{' '}
            <Moment at={at} form="exact" />
            {then.length > 0 && (
              <span className="block">{t('records.exceptions.then', { answers: then.join(', ') })}</span>
            )}
          </li>
        ))}
        {removed.map(({ isolator, lock, person, onAt, removedBy }) => (
          <li key={`${isolator} ${lock} ${onAt}`} className="border-b border-rule py-2">
            <strong>
              {t('records.lock')} {lock}
            </strong>{' '}
            {isolator}, {person}: {t('records.removedBy', { name: removedBy ?? '' })}
          </li>
        ))}
        {rounds.map((round) => (
          <li key={round.number} className="border-b border-rule py-2">
            <strong>{t('records.roundN', { n: round.number })}</strong> {round.words} (
            {round.points.join(', ')}). {round.person}, <Moment at={round.at} form="exact" />
          </li>
        ))}
        {document.holds.map((hold) => (
          <li key={`${hold.step} ${hold.at}`} className="border-b border-rule py-2">
            <strong>{t('records.hold')}</strong> {hold.shown}: {hold.words}. {hold.person},{' '}
            <Moment at={hold.at} form="exact" />
            <span className="block">
              {hold.decidedBy === null
                ? t('records.hold.undecided')
                : t('records.hold.decided', {
                    name: hold.decidedBy,
                    decision: hold.decision === null ? '' : t(`records.decision.${hold.decision}`),
                    words: hold.decidedWords ?? '',
                  })}
            </span>
          </li>
        ))}
        {said.map((each) => (
          <li key={`${each.what} ${each.at} ${each.words}`} className="border-b border-rule py-2">
            <strong>{each.what}</strong> {each.shown !== null && `${each.shown}: `}
            {each.words}. {each.person}, <Moment at={each.at} form="exact" />
          </li>
        ))}
        {document.findings.map((finding) => (
          <li key={`${finding.rule} ${finding.place}`} className="border-b border-rule py-2">
            <code className="font-mono text-sm">
              {finding.rule} {finding.place}
            </code>{' '}
            {finding.says}
            {finding.accepted && (
              <span className="block">
                {t('office.acceptedBy', { name: finding.accepted.by, reason: finding.accepted.reason })}
              </span>
            )}
          </li>
        ))}
      </ul>
    </SheetSection>
  );
}

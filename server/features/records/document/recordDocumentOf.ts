/** A folded job as the document that is sealed. */
import type { Language } from '../../../../shared/api/common';
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import type { FoldedJob } from '../../jobs/folding';
import type { SealableJob } from '../../jobs/turns';
import { deadTests, otherSteps, points } from './answers';
import { readerOf } from './reader';
import { chosen, drawingDiffers, notes, returned } from './said';
import { findings, holds, lockOut, logs, photos, rounds, signatures, times } from './story';

export interface DocumentParts {
  job: SealableJob;
  folded: FoldedJob;
  names: ReadonlyMap<string, string>;
  sentAt: Date | null;
  amends: RecordDocument['amends'];
}

/** The language that the countersigner read, else the one of the last signer. */
export const languageOfRecord = ({ state }: FoldedJob): Language =>
  (state.countersign ?? state.signatures.at(-1))?.body.language ?? 'en';

export function recordDocumentOf({ job, folded, names, sentAt, amends }: DocumentParts): RecordDocument {
  const { pack, facts } = folded;
  const language = languageOfRecord(folded);
  const reader = readerOf(folded, language, names);
  const { tag, name, location, drawing } = pack.panel;
  return {
    format: 'coldloop-record/1',
    language,
    amends,
    site: { id: job.site, name: pack.job.site.name },
    job: { id: job.id, number: job.number, due: pack.job.due, words: pack.job.words ?? null },
    panel: { tag, name, location, drawing, revision: pack.revision, digest: pack.checklist.panelDigest },
    pack: pack.digest,
    logs: logs(reader),
    scope: pack.checklist.scope,
    people: facts.people,
    times: times(reader, sentAt),
    lockOut: lockOut(reader),
    deadTests: deadTests(reader),
    points: points(reader),
    steps: otherSteps(reader),
    findings: findings(reader),
    holds: holds(reader),
    rounds: rounds(reader),
    returned: returned(reader),
    chosen: chosen(reader),
    drawingDiffers: drawingDiffers(reader),
    notes: notes(reader),
    photos: photos(reader),
    signatures: signatures(reader),
  };
}

/** Everything that was not simply done, in limits, in one round. */
export function exceptionCount(document: RecordDocument): number {
  const answers = [...document.points.flatMap((point) => point.answers), ...document.steps];
  return (
    [...answers, ...document.deadTests].filter(({ verdict }) => verdict !== 'ok').length +
    document.holds.length +
    document.returned.length +
    document.chosen.length +
    document.drawingDiffers.length +
    document.rounds.filter(({ number }) => number > 1).length +
    document.lockOut.filter(({ removedBy }) => removedBy !== null).length
  );
}

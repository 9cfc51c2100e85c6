/** What happened beside the answers: locks, holds, rounds, findings, photos, signatures. */
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import type { SignatureState } from '../../../../shared/job/types';
import { placeKey } from '../../../../shared/rules/placeKey';
import type { Reader } from './reader';

export const lockOut = ({ folded, nameOf, roundOf }: Reader): RecordDocument['lockOut'] =>
  folded.state.locks.map((lock) => ({
    isolator: lock.isolator,
    lock: lock.lock,
    person: nameOf(lock.person),
    onAt: lock.onAt,
    offAt: lock.offAt ?? null,
    removedBy: lock.removedBy === undefined ? null : nameOf(lock.removedBy),
    round: roundOf(lock.round),
  }));

/** Who decided a hold: the owner of the log that the decision stands in. */
function deciderOf({ folded, nameOf }: Reader, hold: string): string | null {
  const decision = folded.entries.findLast(
    ({ entry }) => entry.kind === 'hold-decided' && entry.body['hold'] === hold,
  );
  if (!decision) return null;
  return nameOf(folded.facts.logs[decision.entry.log] ?? '');
}

export function holds(reader: Reader): RecordDocument['holds'] {
  return Object.values(reader.folded.state.steps).flatMap(({ step, hold }) =>
    hold
      ? [
          {
            step: step.id,
            shown: reader.say(step.title),
            reason: hold.body.reason,
            words: hold.body.words,
            person: reader.nameOf(hold.person),
            at: hold.at,
            decision: hold.decided?.decision ?? null,
            decidedBy: hold.decided ? deciderOf(reader, hold.entry) : null,
            decidedWords: hold.decided?.words ?? null,
          },
        ]
      : [],
  );
}

export const rounds = ({ folded, nameOf }: Reader): RecordDocument['rounds'] =>
  folded.state.rounds.map(({ number, reason, words, person, at, points }) => ({
    number,
    reason,
    words,
    person: nameOf(person),
    at,
    points,
  }));

export const findings = ({ folded, say }: Reader): RecordDocument['findings'] =>
  folded.pack.findings.map(({ finding, accepted }) => ({
    rule: finding.rule,
    harm: finding.harm,
    place: placeKey(finding.where),
    says: say(finding.says),
    accepted: accepted ?? null,
  }));

const titleOf = ({ folded, say }: Reader, id: unknown): string | null => {
  const step = folded.pack.checklist.steps.find((each) => each.id === id);
  return step ? say(step.title) : null;
};

export const photos = (reader: Reader): RecordDocument['photos'] =>
  reader.folded.entries
    .filter(({ entry }) => entry.kind === 'photo')
    .map(({ entry }) => ({
      sha256: String(entry.body['sha256']),
      shown: titleOf(reader, entry.body['step']),
      person: reader.nameOf(reader.folded.facts.logs[entry.log] ?? ''),
      at: entry.at,
    }));

const signature = (
  kind: 'signed' | 'countersigned',
  { at, body }: SignatureState,
): RecordDocument['signatures'][number] => ({
  kind,
  name: body.name,
  meaning: body.meaning,
  at,
  zone: body.zone,
  digest: body.digest,
  picture: body.picture,
});

/** Those that stand, the countersign last. */
export function signatures({ folded }: Reader): RecordDocument['signatures'] {
  const { signatures: signed, countersign } = folded.state;
  return [
    ...signed.filter(({ stands }) => stands).map((each) => signature('signed', each)),
    ...(countersign ? [signature('countersigned', countersign)] : []),
  ];
}

/** The last entry of every log; two of one log where a restored phone made a fork. */
export function logs({ folded, nameOf }: Reader): RecordDocument['logs'] {
  const followed = new Set(folded.entries.flatMap(({ entry }) => entry.previous ?? []));
  return folded.entries
    .filter(({ hash }) => !followed.has(hash))
    .map(({ entry, hash }) => ({
      log: entry.log,
      person: nameOf(folded.facts.logs[entry.log] ?? ''),
      seq: entry.seq,
      hash,
    }));
}

/** Instants as the devices' clocks said them. */
export function times({ folded }: Reader, sentAt: Date | null): RecordDocument['times'] {
  const { signatures: signed, countersign } = folded.state;
  // The entries stand log by log: the first of the list may be the foreman's last.
  const begun = folded.entries
    .flatMap(({ entry }) => (entry.kind === 'accepted' || entry.kind === 'note' ? [] : [entry.at]))
    .sort((a, b) => Date.parse(a) - Date.parse(b));
  return {
    sentAt: sentAt?.toISOString() ?? null,
    startedAt: begun[0] ?? null,
    signedAt: signed.filter(({ stands }) => stands).at(-1)?.at ?? null,
    countersignedAt: countersign?.at ?? null,
  };
}

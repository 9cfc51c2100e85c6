/** The state of a job from what its entries came to. */
import { say } from '../../panel/says';
import type { JobState, JobStatus } from '../types';
import { isClear } from '../view/clears';
import { contradictionsOf, settledContradictions } from '../view/contradictions';
import { isolationOver } from '../view/rounds';
import { allSigned, firstUnsettled } from '../view/signatures';
import type { View } from '../view/view';
import type { Folded } from './folded';
import { isolatorStates, lockState } from './lockStates';
import { proofs } from './proofs';
import { presentRound, roundStates } from './roundStates';
import { choices, drawingDiffers, notes, returns, temporaries } from './said';
import { countersignOf, signatureStates } from './signatureStates';
import { stageStates } from './stageStates';
import { stepStates } from './stepStates';

function statusOf(view: View, countersigned: boolean): JobStatus {
  if (view.setting.facts.cancelled) return 'cancelled';
  if (countersigned) return 'countersigned';
  if (!view.started) return view.accepted ? 'accepted' : 'sent';
  if (firstUnsettled(view) === undefined && allSigned(view)) return 'signed';
  return view.returned.length > 0 ? 'returned' : 'running';
}

function headsOf({ entries }: Folded): JobState['heads'] {
  const heads: JobState['heads'] = {};
  for (const { log, seq } of entries) heads[log] = Math.max(seq, heads[log] ?? 0);
  return heads;
}

const forksOf = ({ logs }: Folded): JobState['forks'] =>
  logs.flatMap(({ id, levels }) =>
    levels
      .filter(({ entries }) => entries.length > 1)
      .slice(0, 1)
      .map(({ entries }) => ({ log: id, entries: entries.map((each) => each.id) })),
  );

const twoContents = ({ twice }: Folded): JobState['contradictions'] =>
  twice.map((entry) => ({
    code: 'two-contents',
    entries: [entry],
    says: say('job.contradiction.two-contents'),
  }));

export function stateOf(folded: Folded): JobState {
  const { replayed, holes } = folded;
  const { view, placed } = replayed;
  const { lookup, workers } = view.setting;
  const steps = stepStates(replayed);
  const countersign = countersignOf(replayed);
  return {
    status: statusOf(view, countersign?.stands ?? false),
    people: view.setting.facts.people,
    accepted: view.accepted,
    round: presentRound(view, folded.scope),
    rounds: roundStates(view),
    stages: stageStates(lookup, steps),
    steps,
    isolators: isolatorStates(view),
    locks: view.locks.map((lock) => lockState(view, lock)),
    proofs: proofs(view),
    signatures: signatureStates(replayed),
    ...(countersign && { countersign }),
    chosen: choices(view),
    returns: returns(view),
    contradictions: [...contradictionsOf(view), ...twoContents(folded)],
    settled: settledContradictions(view),
    isolationOver: isolationOver(view),
    clear: workers.filter((person) => isClear(view, person)),
    dangers: [...view.dangers.keys()].sort((a, b) => a - b).flatMap((step) => lookup.steps[step]?.id ?? []),
    tookPart: [...view.hands].sort(),
    gaps: holes.map(({ log, heard }) => ({ log, person: view.setting.facts.logs[log] ?? '', seq: heard })),
    forks: forksOf(folded),
    unknown: view.unreadable.map(({ entry }) => ({ entry: entry.id, kind: entry.kind })),
    notes: notes(placed),
    drawingDiffers: drawingDiffers(placed),
    temporaries: temporaries(view),
    heads: headsOf(folded),
  };
}

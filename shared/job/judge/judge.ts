/** Judges one entry by a view of what it had seen. */
import type { Stage } from '../../checklist/types';
import { refusalsOfCountersignature } from '../sign/countersignChecks';
import { refusalsOfSignature } from '../sign/signChecks';
import type { EntryKind } from '../entry';
import { isKnownTo, type Placed, type PlacedOf } from '../order/placed';
import type { Refusal } from '../types';
import { isolationOver } from '../view/rounds';
import type { Round, View } from '../view/view';
import { judgeAnswer } from './judgeAnswer';
import type { Judged } from './judged';

const isWorker = ({ setting }: View, { person }: Placed) => setting.workers.includes(person);
const isForeman = ({ setting }: View, { person }: Placed) => setting.foremen.includes(person);
const plain = (counts: boolean, refusals: Refusal[] = []): Judged => ({ counts, refusals });

const byWorker = (view: View, placed: Placed): Judged => plain(isWorker(view, placed));
const byForeman = (view: View, placed: Placed): Judged => plain(isForeman(view, placed));
const byAnybody = (): Judged => plain(true);

function answered(view: View, placed: Placed): Judged {
  const answer = judgeAnswer(view, placed);
  return { counts: true, refusals: answer?.refusals ?? [], ...(answer && { answer }) };
}

// Work on these needs dead conductors or locks: done again after Locks off they start a round of their own.
const workedIsolated: ReadonlySet<Stage> = new Set<Stage>([
  'isolate',
  'prove-dead',
  'wire',
  'check-cold',
  'close-up',
  'locks-off',
]);

function needsRound(view: View, steps: readonly string[]): boolean {
  const { lookup } = view.setting;
  const asks = steps.some((id) => {
    const stage = lookup.steps[lookup.numberOf.get(id) ?? -1]?.stage;
    return stage !== undefined && workedIsolated.has(stage);
  });
  return asks && isolationOver(view);
}

const roundFor = (view: View, placed: Placed, steps: readonly string[], words: string): Round | undefined =>
  needsRound(view, steps) ? { placed, reason: 'returned', points: [], words } : undefined;

function returned(view: View, placed: PlacedOf<'returned'>): Judged {
  const { steps } = placed.known.body;
  const round = roundFor(
    view,
    placed,
    steps.map(({ step }) => step),
    steps.map(({ words }) => words).join(' '),
  );
  return { ...byForeman(view, placed), ...(round && { round }) };
}

function holdDecided(view: View, placed: PlacedOf<'hold-decided'>): Judged {
  const { hold, decision, words } = placed.known.body;
  const held = [...view.holds.values()].flat().find((each) => each.placed.entry.id === hold);
  const counts = isForeman(view, placed) && held !== undefined && isKnownTo(held.placed, placed);
  const id = held && view.setting.lookup.steps[held.step]?.id;
  const round = decision === 'rework' && id ? roundFor(view, placed, [id], words) : undefined;
  return { ...plain(counts), ...(round && { round }) };
}

const roundStarted = (_view: View, placed: PlacedOf<'round-started'>): Judged => {
  const { reason, points, words } = placed.known.body;
  return { ...plain(true), round: { placed, reason, points, words } };
};

/** A second person witnesses, and it is not the one whose lock comes off. */
function removed(view: View, placed: PlacedOf<'lock-removed-by-supervisor'>): Judged {
  const { witness, owner } = placed.known.body;
  const isWitnessed = witness !== placed.person && witness !== owner;
  return plain(isForeman(view, placed) && owner !== placed.person && isWitnessed);
}

const cleared = (view: View, placed: PlacedOf<'clear'>): Judged =>
  plain(placed.known.body.person === placed.person || isForeman(view, placed));

const signed = (view: View, placed: PlacedOf<'signed'>): Judged =>
  plain(true, refusalsOfSignature(view, placed.person, placed.entry.pack));

const countersigned = (view: View, placed: PlacedOf<'countersigned'>): Judged =>
  plain(true, refusalsOfCountersignature(view, placed.person, placed.entry.pack));

type Judge<K extends EntryKind> = (view: View, placed: PlacedOf<K>) => Judged;

const judges: { [K in EntryKind]: Judge<K> } = {
  accepted: byWorker,
  answer: answered,
  hold: byAnybody,
  'hold-decided': holdDecided,
  chosen: byForeman,
  photo: byAnybody,
  'lock-on': answered,
  'lock-off': answered,
  'lock-removed-by-supervisor': removed,
  closed: answered,
  'round-started': roundStarted,
  handover: byAnybody,
  clear: cleared,
  signed,
  countersigned,
  returned,
  'drawing-differs': byAnybody,
  temporary: byAnybody,
  note: byAnybody,
};

/** @param view everything this entry had seen, and nothing else. */
export function judge(view: View, placed: Placed): Judged {
  if (!placed.known) return plain(true);
  // The judge of a kind takes entries of that kind.
  const own = judges[placed.known.kind] as (view: View, placed: Placed) => Judged;
  return own(view, placed);
}

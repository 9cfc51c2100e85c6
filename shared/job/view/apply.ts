/** Takes one judged entry into a view. */
import type { Stage } from '../../checklist/types';
import type { EntryKind } from '../entry';
import type { Judged } from '../judge/judged';
import { isIsolating } from '../known/proving';
import { before, isKnownTo, type Placed, type PlacedOf } from '../order/placed';
import { applyAnswer } from './applyAnswer';
import { refresh } from './left';
import { reopen, startRound } from './reopen';
import { addTo, type Lock, type View } from './view';

const inPanel: ReadonlySet<Stage> = new Set<Stage>([
  'isolate',
  'prove-dead',
  'wire',
  'check-cold',
  'close-up',
]);

function noteWork(view: View, placed: Placed): void {
  const known = view.work.get(placed.person) ?? [];
  view.work.set(placed.person, [...known.filter((each) => !before(each, placed)), placed]);
}

function refreshAt(view: View, step: number | undefined): void {
  if (step !== undefined) refresh(view, step);
}

function answer(view: View, _placed: Placed, { answer: given }: Judged): void {
  if (!given) return;
  applyAnswer(view, given);
  const stage = view.setting.lookup.steps[given.step]?.stage;
  if (given.verdict !== 'refused' && stage && inPanel.has(stage)) noteWork(view, given.placed);
}

function lockOn(view: View, placed: PlacedOf<'lock-on'>, { answer: given }: Judged): void {
  const { isolator, lock } = placed.known.body;
  view.locks.push({
    on: placed,
    isolator,
    lock,
    person: placed.person,
    counts: given?.verdict === 'ok',
    offs: [],
  });
  view.proofVersion += 1;
  if (given) applyAnswer(view, given);
  noteWork(view, placed);
}

function takeOff(view: View, placed: Placed, of: (lock: Lock) => boolean, removed: boolean): void {
  for (const lock of view.locks)
    if (of(lock) && isKnownTo(lock.on, placed)) lock.offs.push({ placed, removed });
  view.proofVersion += 1;
}

function lockOff(view: View, placed: PlacedOf<'lock-off'>, { answer: given }: Judged): void {
  const { isolator, lock } = placed.known.body;
  takeOff(
    view,
    placed,
    (each) => each.person === placed.person && each.lock === lock && each.isolator === isolator,
    false,
  );
  if (given?.verdict === 'ok') view.restoring.push(placed);
  if (given) applyAnswer(view, given);
  refreshAt(view, view.setting.lookup.lockOff.get(isolator));
}

function lockRemoved(view: View, placed: PlacedOf<'lock-removed-by-supervisor'>): void {
  const { isolator, lock, owner } = placed.known.body;
  takeOff(
    view,
    placed,
    (each) => each.person === owner && each.lock === lock && each.isolator === isolator,
    true,
  );
  view.removals.push(placed);
  refreshAt(view, view.setting.lookup.lockOff.get(isolator));
}

/** Closed is closed, however its gate stood: what hangs on the isolator being open ends. */
function closed(view: View, placed: PlacedOf<'closed'>, { answer: given }: Judged): void {
  const { isolator, counted } = placed.known.body;
  if (counted === 0) view.closings.push({ placed, isolator });
  view.proofVersion += 1;
  if (given) applyAnswer(view, given);
}

function hold(view: View, placed: PlacedOf<'hold'>): void {
  const step = view.setting.lookup.numberOf.get(placed.known.body.step);
  if (step === undefined) return;
  addTo(view.holds, step, { placed, step, decisions: [] });
  view.proofVersion += 1;
  refresh(view, step);
}

function takeOut(view: View, step: number, placed: Placed): void {
  const { lookup } = view.setting;
  const point = lookup.steps[step]?.where?.point;
  const asked = lookup.steps[step];
  if (point === undefined || !asked || isIsolating(asked)) return;
  addTo(view.pointsOut, point, placed);
  for (const each of lookup.ofPoint.get(point) ?? []) refresh(view, each);
}

function holdDecided(view: View, placed: PlacedOf<'hold-decided'>): void {
  const { hold: id, decision } = placed.known.body;
  const held = [...view.holds.values()].flat().find((each) => each.placed.entry.id === id);
  if (!held) return;
  held.decisions.push(placed);
  view.proofVersion += 1;
  if (decision === 'rework') reopen(view, held.step, placed);
  if (decision === 'out-of-scope') takeOut(view, held.step, placed);
  refresh(view, held.step);
}

function chosen(view: View, placed: PlacedOf<'chosen'>): void {
  const step = view.setting.lookup.numberOf.get(placed.known.body.step);
  if (step === undefined) return;
  addTo(view.chosen, step, placed);
  view.proofVersion += 1;
  refresh(view, step);
}

function returned(view: View, placed: PlacedOf<'returned'>): void {
  view.returned.push(placed);
  for (const { step } of placed.known.body.steps) {
    const number = view.setting.lookup.numberOf.get(step);
    if (number !== undefined) reopen(view, number, placed);
  }
}

function temporary(view: View, placed: PlacedOf<'temporary'>): void {
  const { removes } = placed.known.body;
  view.temporaries.push({ placed, removedBy: [] });
  noteWork(view, placed);
  const made = view.temporaries.find((each) => each.placed.entry.id === removes);
  if (made && isKnownTo(made.placed, placed)) made.removedBy.push(placed);
}

// Choosing, deciding a hold and returning are not taking part in the work (records.md).
const working: ReadonlySet<EntryKind> = new Set<EntryKind>([
  'answer',
  'lock-on',
  'lock-off',
  'closed',
  'temporary',
  'signed',
]);

const nothing = () => undefined;
type Apply<K extends EntryKind> = (view: View, placed: PlacedOf<K>, judged: Judged) => void;

const appliers: { [K in EntryKind]: Apply<K> } = {
  accepted: (view) => {
    view.accepted = true;
  },
  answer,
  hold,
  'hold-decided': holdDecided,
  chosen,
  photo: nothing,
  'lock-on': lockOn,
  'lock-off': lockOff,
  'lock-removed-by-supervisor': lockRemoved,
  closed,
  'round-started': nothing,
  handover: nothing,
  clear: (view, placed) => {
    addTo(view.clears, placed.known.body.person, placed);
  },
  signed: (view, placed, { refusals }) => {
    view.signed.push({ placed, refusals });
  },
  countersigned: (view, placed, { refusals }) => {
    view.countersigned.push({ placed, refusals });
  },
  returned,
  'drawing-differs': nothing,
  temporary,
  note: nothing,
};

/** Must come after everything the entry had seen; the order among others makes no difference. */
export function apply(view: View, placed: Placed, judged: Judged): void {
  if (!placed.known) view.unreadable.push(placed);
  if (!placed.known || !judged.counts) return;
  // The applier of a kind takes entries of that kind.
  const own = appliers[placed.known.kind] as (view: View, placed: Placed, judged: Judged) => void;
  own(view, placed, judged);
  if (working.has(placed.known.kind)) view.hands.add(placed.person);
  if (judged.round) startRound(view, judged.round);
}

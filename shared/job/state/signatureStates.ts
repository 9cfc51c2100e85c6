/** Signatures as they stand, each with what made it void. */
import { say } from '../../panel/says';
import type { SignatureState } from '../types';
import type { Replayed } from '../view/replay';
import { changedStep, coversAll } from '../view/signatures';
import type { View } from '../view/view';

type Signed = View['signed'][number];
type Countersigned = View['countersigned'][number];

function signatureState(view: View, { placed, refusals }: Signed): SignatureState {
  const { entry, person, known } = placed;
  const changed = changedStep(view, placed);
  const title = changed === undefined ? undefined : view.setting.lookup.steps[changed]?.title;
  const why = refusals[0]?.says ?? (title && say('job.sign.changed', { step: title }));
  return {
    entry: entry.id,
    person,
    at: entry.at,
    body: known.body,
    stands: why === undefined,
    ...(why && { why }),
  };
}

export const signatureStates = ({ view }: Replayed): SignatureState[] =>
  view.signed.map((each) => signatureState(view, each));

function countersignState({ placed: all }: Replayed, { placed, refusals }: Countersigned): SignatureState {
  const { entry, person, known } = placed;
  const stale = coversAll(all, placed) ? undefined : say('job.sign.earlier-state');
  const why = refusals[0]?.says ?? stale;
  return {
    entry: entry.id,
    person,
    at: entry.at,
    body: known.body,
    stands: why === undefined,
    ...(why && { why }),
  };
}

/** The one that stands, else the last that was made. */
export function countersignOf(replayed: Replayed): SignatureState | undefined {
  const all = replayed.view.countersigned.map((each) => countersignState(replayed, each));
  return all.find(({ stands }) => stands) ?? all.at(-1);
}

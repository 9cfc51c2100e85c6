/** A view as what a gate may ask. */
import type { Known } from '../known/known';
import { isClear } from './clears';
import { contradictionsOf } from './contradictions';
import { stopsOf } from './holds';
import { firstLeft, passes } from './left';
import { locksOn } from './locks';
import { isMeasured, proofOf, sinceOf } from './proof';
import { isolationOver } from './rounds';
import { allSigned, firstUnsettled, unsigned } from './signatures';
import { ownStanding } from './stepStatus';
import { temporariesLeft } from './temporaries';
import type { View } from './view';

/** @param pack digest of the checklist in force; undefined where nobody has said. */
export function knownIn(view: View, pack: string | undefined): Known {
  const { lookup, facts, workers, foremen } = view.setting;
  return {
    lookup,
    workers,
    foremen,
    accepted: view.accepted,
    nameOf: (person) => facts.people.find(({ id }) => id === person)?.name ?? '?',
    passes: (step, whose) => passes(view, step, whose),
    firstLeft: (stage, whose) => firstLeft(view, stage, whose),
    ownStatus: (step, person) => ownStanding(view, step, person).status,
    locksOn: locksOn(view),
    proofOf: (person) => proofOf(view, person, pack),
    isRead: (step, person) => isMeasured(view, step, sinceOf(view, person, pack)),
    isolationOver: isolationOver(view),
    contradictions: contradictionsOf(view),
    unreadable: view.unreadable.length,
    dangers: [...view.dangers.keys()],
    stops: stopsOf(view),
    isClear: (person) => isClear(view, person),
    temporariesLeft: temporariesLeft(view).length,
    firstUnsettled: () => firstUnsettled(view),
    unsigned: (person) => unsigned(view, person),
    allSigned: () => allSigned(view),
    tookPart: (person) => view.hands.has(person),
  };
}

/** A prepared job as the foreman reads it while choosing. */
import type { Language } from '../../../shared/api/common';
import type { JobPreview } from '../../../shared/api/jobs';
import { stepsByStage } from '../../../shared/checklist/panelCheck';
import type { PlannedIsolator } from '../../../shared/isolation/types';
import { render } from '../../../shared/wording/render';
import { findingView, stillLiveView } from '../panels/panelCheckMapper';
import { placeKey } from '../../../shared/rules/placeKey';
import type { PreparedJob } from './prepare';

const isolatorView = ({ isolator, tell, ...rest }: PlannedIsolator) => ({
  tag: isolator.tag,
  location: isolator.location,
  lock: isolator.lock,
  lockDevice: isolator.lockDevice ?? null,
  tell,
  afterDoor: rest.afterDoor,
  currentMustBeZero: rest.currentMustBeZero,
  extraMeasure: rest.extraMeasure,
});

function planView({ plan }: PreparedJob): JobPreview['plan'] {
  if (!plan) return null;
  return {
    isolators: plan.isolators.map(isolatorView),
    weight: plan.weight,
    guarded: plan.guarded,
    otherEnergy: plan.otherEnergy.map(({ tag }) => tag),
    proven: plan.proven,
  };
}

export const previewView = (prepared: PreparedJob, of: number, language: Language): JobPreview => ({
  canStart: prepared.blocked.length === 0 && prepared.findings.every((each) => !each.needsAcceptance),
  blocked: prepared.blocked.map(({ code, says }) => ({ code, says: render(language, says) })),
  points: prepared.points.length,
  of,
  plan: planView(prepared),
  stillLive: prepared.stillLive.map((each) => stillLiveView(each, language)),
  waits: prepared.waits,
  findings: prepared.findings.map(({ finding, accepted, needsAcceptance }) => ({
    ...findingView(finding, language),
    place: placeKey(finding.where),
    accepted: accepted ? { reason: accepted.reason, by: accepted.by } : null,
    needsAcceptance,
  })),
  checks: prepared.checks,
  couldNotRun: prepared.couldNotRun,
  checklist: {
    steps: prepared.checklist?.steps.length ?? 0,
    stages: stepsByStage(prepared.checklist),
  },
});

/** What the engines say about a panel, rendered in a language: the answer of the stateless check and its command line. */
import type { Language } from '../../../shared/api/common';
import type { FindingView, PanelCheck } from '../../../shared/api/panels';
import { stepsByStage, type PanelCheckResult } from '../../../shared/checklist/panelCheck';
import type { StillLive } from '../../../shared/isolation/types';
import { say } from '../../../shared/panel/says';
import type { Finding } from '../../../shared/rules/finding';
import { messageOf, render } from '../../../shared/wording/render';

/** A rule may name its quantity with a plain word that needs no translation ("R"): then it is shown as it is. */
const quantityName = (language: Language, name: string): string =>
  messageOf(language, name) === undefined ? name : render(language, say(name));

export const findingView = (
  { rule, harm, where, says, because, remedy }: Finding,
  language: Language,
): FindingView => ({
  rule,
  harm,
  where,
  says: render(language, says),
  because: because.map((quantity) => ({ ...quantity, name: quantityName(language, quantity.name) })),
  remedy: remedy
    ? { says: render(language, remedy.says), ...(remedy.values ? { values: remedy.values } : {}) }
    : null,
});

export const stillLiveView = (
  { incomingOf, ...live }: StillLive,
  language: Language,
): PanelCheck['isolation']['stillLive'][number] =>
  incomingOf === undefined
    ? live
    : { ...live, place: render(language, say('isolation.incoming', { isolator: incomingOf })) };

function planView({ plan }: PanelCheckResult): PanelCheck['isolation']['plan'] {
  if (!plan) return null;
  return {
    isolators: plan.isolators.map(({ isolator }) => isolator.tag),
    weight: plan.weight,
    tell: [...new Set(plan.isolators.flatMap(({ tell }) => tell))],
    guarded: plan.guarded.map(({ supply }) => supply),
  };
}

export const panelCheckView = (result: PanelCheckResult, language: Language): PanelCheck => ({
  panel: result.panel,
  digest: result.digest,
  ruleSet: result.ruleSet,
  checks: result.checks,
  couldNotRun: result.couldNotRun,
  findings: result.findings.map((finding) => findingView(finding, language)),
  isolation: {
    plan: planView(result),
    stillLive: result.stillLive.map((live) => stillLiveView(live, language)),
    deadTests: result.deadTests.map(({ id, at, terminal, supply, pair, limitV }) => ({
      id,
      at,
      terminal,
      supply,
      pair,
      limitV,
    })),
    waits: result.waits,
  },
  checklist: { steps: result.checklist?.steps.length ?? 0, stages: stepsByStage(result.checklist) },
});

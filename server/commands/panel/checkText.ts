/** The answer of a panel check as lines a person reads in a terminal. */
import type { Language } from '../../../shared/api/common';
import type { FindingView, PanelCheck } from '../../../shared/api/panels';
import { say, type Text } from '../../../shared/panel/says';
import { placeKey } from '../../../shared/rules/placeKey';
import { render } from '../../../shared/wording/render';

type Isolation = PanelCheck['isolation'];

export interface Asked {
  language: Language;
  points: number;
  /** Isolators taken as open for the still-live picture. */
  open: readonly string[];
}

/** Sentences of one part, indented under its first. */
const under = (lines: string[]): string[] => lines.map((line) => `  ${line}`);

function findingLines(finding: FindingView, says: (text: Text) => string): string[] {
  const harm = says(say(`office.harm.${finding.harm}`));
  const place = placeKey(finding.where);
  return [
    [`${harm}: ${finding.rule}`, ...(place ? [place] : [])].join(', '),
    ...under([
      finding.says,
      ...finding.because.map((quantity) => says(say('check.sum', { ...quantity }))),
      ...(finding.remedy ? [says(say('check.remedy', { remedy: finding.remedy.says }))] : []),
    ]),
  ];
}

function planTexts({ plan }: Isolation): Text[] {
  if (!plan) return [say('check.no-plan')];
  const list = (key: string, name: string, values: string[]): Text[] =>
    values.length > 0 ? [say(key, { [name]: values.join(', ') })] : [];
  return [
    ...list('check.tell', 'tell', plan.tell),
    ...(plan.isolators.length > 0
      ? [say('check.plan', { isolators: plan.isolators.join(', ') })]
      : [say('check.plan.nothing')]),
    ...list('check.guarded', 'supplies', plan.guarded),
  ];
}

function stillLiveLines({ stillLive }: Isolation, open: readonly string[], says: (text: Text) => string) {
  const opened = open.join(', ');
  if (stillLive.length === 0) return [says(say('check.dark', { open: opened || '–' }))];
  const heading =
    open.length > 0 ? say('check.still-live', { open: opened }) : say('check.still-live.nothing-open');
  const line = ({ terminal, place, V, maybe, path }: Isolation['stillLive'][number]) =>
    say(maybe ? 'check.maybe-live' : 'check.live', {
      place: terminal ?? place ?? '',
      V,
      path: path.join(' → '),
    });
  return [says(heading), ...under(stillLive.map((live) => says(line(live))))];
}

function waitText({ supply, t60S, t1S, statedS }: Isolation['waits'][number]): Text {
  if (t60S !== null && t1S !== null) return say('check.wait', { supply, t60S, t1S });
  if (statedS !== undefined) return say('check.wait.stated', { supply, statedS });
  return say('check.wait.unknown', { supply });
}

/** How many checks ran always stands before what they found. */
export function checkText(check: PanelCheck, { language, points, open }: Asked): string {
  const says = (text: Text) => render(language, text);
  const { findings, isolation, checklist, couldNotRun } = check;
  const { panel, ruleSet, digest } = check;
  const waiting = couldNotRun.map(({ rule, where, missing }) =>
    say('check.waits', { rule, place: placeKey(where), missing }),
  );
  const lines = [
    says(say('check.panel', { panel, points, ruleSet, digest })),
    says(say('check.ran', { checks: check.checks, waiting: couldNotRun.length })),
    ...under(waiting.map(says)),
    ...(findings.length > 0
      ? findings.flatMap((finding) => findingLines(finding, says))
      : [says(say('check.no-findings'))]),
    ...planTexts(isolation).map(says),
    ...stillLiveLines(isolation, open, says),
    says(say('check.dead-tests', { count: isolation.deadTests.length })),
    ...isolation.waits.map(waitText).map(says),
    says(say('check.steps', { steps: checklist.steps })),
    ...under(
      checklist.stages.map(({ stage, steps }) =>
        says(say('check.stage', { stage: say(`office.stage.${stage}`), steps })),
      ),
    ),
  ];
  return `${lines.join('\n')}\n`;
}

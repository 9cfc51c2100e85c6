/** Which families make each stage and in which order: the path a person walks, what kills first. */
import type { Facts, IsolatorFacts, PointFacts } from './facts';
import type { Block } from './intoParts';
import { closeIsolator } from './steps/close/closeIsolator';
import { fusesIn } from './steps/close/fusesIn';
import { supplyReadings } from './steps/close/supplyReadings';
import { tellAndStandAside } from './steps/close/tellAndStandAside';
import { insulation } from './steps/check-cold/insulation';
import { loop } from './steps/check-cold/loop';
import { panelCold } from './steps/check-cold/panelCold';
import { settlePanelDoubt, settlePointDoubt } from './steps/check-cold/settleDoubt';
import { leaveClean } from './steps/close-up/leaveClean';
import { findingsThatStay } from './steps/get-ready/findingsThatStay';
import { fitForWork } from './steps/get-ready/fitForWork';
import { hazardLabel } from './steps/get-ready/hazardLabel';
import { instrument } from './steps/get-ready/instrument';
import { peopleTold } from './steps/get-ready/peopleTold';
import { permit } from './steps/get-ready/permit';
import { rightPanel } from './steps/get-ready/rightPanel';
import { beforeOpening } from './steps/isolate/beforeOpening';
import { doorOpen } from './steps/isolate/doorOpen';
import { fusesOut } from './steps/isolate/fusesOut';
import { incomingSide } from './steps/isolate/incomingSide';
import { openIsolator } from './steps/isolate/openIsolator';
import { otherEnergy } from './steps/isolate/otherEnergy';
import { stopLoads } from './steps/isolate/stopLoads';
import { lockOff } from './steps/locks-off/lockOff';
import { backFeed } from './steps/prove-dead/backFeed';
import { deadTests } from './steps/prove-dead/deadTests';
import { tryStart } from './steps/prove-dead/tryStart';
import { waits } from './steps/prove-dead/waits';
import { emergencyStops } from './steps/prove-points/emergencyStops';
import { energisedTest } from './steps/prove-points/energisedTest';
import { proveAnalogue } from './steps/prove-points/proveAnalogue';
import { proveInput } from './steps/prove-points/proveInput';
import { proveOutput } from './steps/prove-points/proveOutput';
import { allClear, energyBack, finalProof, handBack } from './steps/restore-motion/restoreMotion';
import { readSummary } from './steps/sign/readSummary';
import { bleeder } from './steps/wire/bleeder';
import { groupCommon, pointFuse } from './steps/wire/commonAndFuse';
import { finish } from './steps/wire/finish';
import { identify } from './steps/wire/identify';
import { land } from './steps/wire/land';
import { polarity } from './steps/wire/polarity';
import { screenEarth } from './steps/wire/screenEarth';
import { suppression } from './steps/wire/suppression';
import { terminalDead } from './steps/wire/terminalDead';
import { motiveSupplies, suppliesMadeDead } from './supplyLimits';
import type { Stage, Step } from './types';

const block = (section: string, steps: Step[]): Block => ({ section, steps });

function getReady(facts: Facts): Block[] {
  const families = [rightPanel, fitForWork, instrument, hazardLabel, permit, peopleTold, findingsThatStay];
  return families.map((family) => block('get-ready', family(facts)));
}

function isolate(facts: Facts): Block[] {
  const { isolators, plan } = facts;
  const opening = (each: IsolatorFacts) => block('isolators', openIsolator(each));
  const electrical = isolators.filter(({ holds }) => !holds);
  return [
    block('before', beforeOpening(facts)),
    block('before', stopLoads(facts)),
    ...electrical.filter(({ afterDoor }) => !afterDoor).map(opening),
    block('door', doorOpen(facts)),
    ...electrical
      .filter(({ afterDoor }) => afterDoor)
      .flatMap((each) => [block('behind', incomingSide(facts, each)), block('behind', openIsolator(each))]),
    block('fuses', fusesOut(facts)),
    ...isolators.filter(({ holds }) => holds).map(opening),
    ...plan.otherEnergy.map((source) => block('other', otherEnergy(source))),
  ];
}

const proveDead = (facts: Facts): Block[] => [
  block('waits', waits(facts)),
  ...deadTests(facts),
  block('back-feed', backFeed(facts)),
  block('try', tryStart(facts)),
];

function wirePoint(facts: Facts, worked: PointFacts): Step[] {
  return [
    ...terminalDead(facts, worked),
    ...identify(worked),
    ...land(facts, worked),
    ...polarity(worked),
    ...pointFuse(facts, worked),
    ...suppression(worked),
    ...screenEarth(facts, worked),
    ...bleeder(facts, worked),
    ...finish(worked),
  ];
}

function wire(facts: Facts): Block[] {
  const begun = new Set<string>();
  return facts.points.flatMap((worked) => {
    const { tag } = worked.group;
    const first = !begun.has(tag);
    begun.add(tag);
    const section = worked.module.tag;
    return [
      ...(first ? [block(section, groupCommon(facts, worked))] : []),
      block(section, wirePoint(facts, worked)),
    ];
  });
}

const checkCold = (facts: Facts): Block[] => [
  ...facts.points.map((worked) =>
    block(worked.module.tag, [
      ...insulation(facts, worked),
      ...loop(facts, worked),
      ...settlePointDoubt(facts, worked.point.address),
    ]),
  ),
  block('panel', [...panelCold(facts), ...settlePanelDoubt(facts)]),
];

/** Restoring is the reverse of opening, control before what also feeds motion. */
function closingOrder({ isolators }: Facts, stage: IsolatorFacts['restoredIn']): IsolatorFacts[] {
  const reverse = isolators.filter(({ restoredIn }) => restoredIn === stage).reverse();
  const control = (each: IsolatorFacts) => each.isolator.purpose === 'control';
  return [...reverse.filter(control), ...reverse.filter((each) => !control(each))];
}

function closing(facts: Facts, stage: IsolatorFacts['restoredIn']): Block[] {
  const motive = motiveSupplies(facts);
  const later = stage === 'restore-motion';
  const isolators = closingOrder(facts, stage);
  const supplies = suppliesMadeDead(facts).filter(({ tag }) => motive.has(tag) === later);
  const groups = facts.groups.filter(({ supply }) => motive.has(supply ?? '') === later);
  return [
    block('tell', tellAndStandAside(isolators, stage)),
    ...isolators.map((each) => block('close', [closeIsolator(each, stage)])),
    block('supplies', supplyReadings(facts, supplies, stage)),
    block('fuses', fusesIn(groups, stage)),
  ];
}

const comesLate = (facts: Facts, motive: ReadonlySet<string>) =>
  facts.points.filter(({ supply }) => motive.has(supply?.tag ?? ''));

function provePoint(facts: Facts, worked: PointFacts, stage: Stage): Step[] {
  const { io } = worked.module;
  if (io.kind === 'digital-output') return proveOutput(facts, worked, stage);
  if (io.kind === 'analogue-input') return proveAnalogue(worked, io.signal, 'input', stage);
  if (io.kind === 'analogue-output') return proveAnalogue(worked, io.signal, 'output', stage);
  return proveInput(worked, stage);
}

/** Inputs first, so that what is commanded afterwards can be seen. */
function inputsFirst(facts: Facts, points: PointFacts[], stage: Stage): Block[] {
  const drives = ({ module }: PointFacts) => module.io.kind.endsWith('output');
  return [...points.filter((each) => !drives(each)), ...points.filter(drives)].map((worked) =>
    block(worked.module.tag, provePoint(facts, worked, stage)),
  );
}

function provePoints(facts: Facts): Block[] {
  const late = new Set(comesLate(facts, motiveSupplies(facts)));
  const now = facts.points.filter((worked) => !late.has(worked));
  return [
    block('energised', energisedTest()),
    block('stops', emergencyStops(facts)),
    ...inputsFirst(facts, now, 'prove-points'),
  ];
}

function restoreMotion(facts: Facts): Block[] {
  const held = facts.isolators.filter(({ restoredIn }) => restoredIn === 'restore-motion');
  return [
    block('clear', [...allClear(facts), ...held.map((each) => lockOff(each, 'restore-motion'))]),
    ...closing(facts, 'restore-motion'),
    block('energy', energyBack(facts)),
    ...inputsFirst(facts, comesLate(facts, motiveSupplies(facts)), 'restore-motion'),
    block('final', [...finalProof(facts), ...handBack(facts)]),
  ];
}

const locksOff = ({ isolators }: Facts): Block[] => [
  block(
    'locks',
    isolators.filter(({ restoredIn }) => restoredIn === 'close').map((each) => lockOff(each, 'locks-off')),
  ),
];

/** The stages in order, each as blocks that stay together when a stage is split into parts. */
export const stageBlocks: Record<Stage, (facts: Facts) => Block[]> = {
  'get-ready': getReady,
  isolate,
  'prove-dead': proveDead,
  wire,
  'check-cold': checkCold,
  'close-up': (facts) => [block('close-up', leaveClean(facts))],
  'locks-off': locksOff,
  close: (facts) => closing(facts, 'close'),
  'prove-points': provePoints,
  'restore-motion': restoreMotion,
  sign: () => [block('sign', readSummary())],
};

/** A supply whose high limit is too much for the module, or whose low limit is too little. */
import { standardInput } from '../../electrical/inputTypes';
import type { DigitalInput, ModuleIo } from '../../panel/moduleIo';
import { say } from '../../panel/says';
import { found, missing, quantity, titleOf, type Outcome, type RuleAt } from '../rule';
import { atFedGroup, type FedGroup } from './fedGroup';

/** A volt limit with where it is written. */
interface Limit {
  V: number;
  basis: string;
}
type Asked = Limit | { missing: string } | undefined;

// 230 V + 10 % is 253 V, also where a sum says 253.00000000000003.
const hair = 1 + 1e-9;

const rangeOf = (io: DigitalInput) =>
  io.type === 'custom' ? undefined : standardInput(io.V, io.current, io.type);
const table = ({ type }: DigitalInput) => `IEC 61131-2 table 7, type ${type}`;

/** A declared type stands its standard range at least; what it stands beyond only its maker knows. */
function most(io: ModuleIo, ioPath: string): Asked {
  if (io.kind === 'digital-output') return { V: io.Vmax, basis: `${ioPath}.Vmax` };
  if (io.kind !== 'digital-input') return undefined;
  if (io.maxV !== undefined) return { V: io.maxV, basis: `${ioPath}.maxV` };
  const range = rangeOf(io);
  return range ? { V: range.mostV, basis: table(io) } : { missing: `${ioPath}.maxV` };
}

function least(io: ModuleIo, ioPath: string): Asked {
  if (io.kind === 'digital-output') return { V: io.Vmin, basis: `${ioPath}.Vmin` };
  if (io.kind !== 'digital-input') return undefined;
  if (io.thresholds && io.type === 'custom') return { V: io.thresholds.UH_V, basis: `${ioPath}.thresholds` };
  const range = rangeOf(io);
  return range ? { V: range.UH_V, basis: table(io) } : { missing: `${ioPath}.thresholds` };
}

/** AC on a DC module and the reverse are no question of volts: `supply.kind` asks it. */
const isOtherKind = ({ module: { io }, supply }: FedGroup) =>
  io.kind === 'digital-input' && (io.current === 'ac') !== (supply.kind !== 'dc');

const passed = ({ volts }: FedGroup): Outcome => (volts.known ? 'ok' : missing(volts.tolerancePath));

function levelHigh(at: FedGroup): Outcome[] {
  const { place, module, supply, volts } = at;
  const limit = most(module.io, at.ioPath);
  if (limit === undefined || isOtherKind(at)) return [];
  if ('missing' in limit) return [missing(limit.missing)];
  if (volts.maxV <= limit.V * hair) return [passed(at)];
  return [
    found('supply.level-high', {
      harm: 'damages',
      where: place.where,
      params: { supply: supply.tag, module: module.tag, V: volts.maxV, most: limit.V },
      because: [
        quantity('supply-high', volts.maxV, 'V', volts.tolerancePath),
        quantity('module-most', limit.V, 'V', limit.basis),
      ],
      remedy: { says: say('finding.supply.level-high.remedy', { V: limit.V }), values: { V: limit.V } },
    }),
  ];
}

function levelLow(at: FedGroup): Outcome[] {
  const { place, module, supply, volts } = at;
  const limit = least(module.io, at.ioPath);
  if (limit === undefined || isOtherKind(at)) return [];
  if ('missing' in limit) return [missing(limit.missing)];
  if (volts.minV * hair >= limit.V) return [passed(at)];
  return [
    found('supply.level-low', {
      harm: 'fails',
      where: place.where,
      params: { supply: supply.tag, module: module.tag, V: volts.minV, least: limit.V },
      because: [
        quantity('supply-low', volts.minV, 'V', volts.tolerancePath),
        quantity('module-least', limit.V, 'V', limit.basis),
      ],
      remedy: { says: say('finding.supply.level-low.remedy', { V: limit.V }), values: { V: limit.V } },
    }),
  ];
}

const level = (id: string, basis: string, ask: (at: FedGroup) => Outcome[]): RuleAt<'group'> => ({
  id,
  title: titleOf(id),
  basis,
  appliesTo: 'group',
  check: (place) => atFedGroup(place, ask),
});

export const supplyLevelHigh = level(
  'supply.level-high',
  "the module's maxV or Vmax; IEC 61131-2 table 7",
  levelHigh,
);
export const supplyLevelLow = level(
  'supply.level-low',
  "the module's UH or Vmin; IEC 61131-2 table 7",
  levelLow,
);

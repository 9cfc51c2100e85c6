/** What an input draws, as far as the panel file says. */
import { standardInput, type StandardInput } from '../../electrical/inputTypes';
import type { Draw } from '../../electrical/inputLoop';
import type { DigitalInput, OptoInput } from '../../panel/moduleIo';

/** Every model that the stated data allow: a rule passes when all of them pass and fails when none does. */
export interface Draws {
  models: Draw[];
  /** The field, below `io`, that would leave one model. */
  lacks?: string;
  /** No upper limit of the current is known: nothing can pass. */
  unbounded?: boolean;
}

/** The standard range of a declared type; undefined for a custom input and where the table has no row. */
export const rangeOf = (io: DigitalInput): StandardInput | undefined =>
  io.type === 'custom' ? undefined : standardInput(io.V, io.current, io.type);

const constant = (mA: number): Draw => ({ kind: 'constant-current', mA });
const resistive = (ohm: number): Draw => ({ kind: 'resistive', ohm });
const ohmOf = (V: number, mA: number) => (V / mA) * 1000;

/** Without a maker's current: anywhere in the range of the declared type. */
function undeclared(io: DigitalInput, lacks: string): Draws {
  const range = rangeOf(io);
  return range
    ? { models: [constant(range.IHmA), constant(range.mostmA)], lacks }
    : { models: [constant(0)], lacks, unbounded: true };
}

function digital(io: DigitalInput): Draws {
  const { V, inputOhm, ratedmA, characteristic } = io;
  if (characteristic === 'constant-current')
    return ratedmA === undefined ? undeclared(io, 'ratedmA') : { models: [constant(ratedmA)] };
  if (inputOhm !== undefined) return { models: [resistive(inputOhm)] };
  if (ratedmA === undefined) return undeclared(io, 'inputOhm');
  return characteristic === 'resistive'
    ? { models: [resistive(ohmOf(V, ratedmA))] }
    : { models: [resistive(ohmOf(V, ratedmA)), constant(ratedmA)], lacks: 'characteristic' };
}

/** @param Vf for an optocoupler the end of its forward volts that hurts. */
export const drawsOf = (io: DigitalInput | OptoInput, Vf: 'min' | 'max'): Draws =>
  io.kind === 'digital-input'
    ? digital(io)
    : {
        models: [{ kind: 'led', seriesOhm: io.seriesOhm, parallelOhm: io.parallelOhm, Vf: io.Vf[Vf] }],
      };

/** Resistance of an input that is off, ohm: the maker's, else by a resistive input's rated current; else undefined. */
export const offOhm = ({ V, inputOhm, ratedmA, characteristic }: DigitalInput): number | undefined =>
  inputOhm ?? (characteristic === 'resistive' && ratedmA !== undefined ? ohmOf(V, ratedmA) : undefined);

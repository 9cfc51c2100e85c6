/** The voltage at which a declared type of input is off for sure: the one place where the checklist will ask the input tables. */
import type { DigitalInput } from '../panel/moduleIo';

/** Volts. Undefined for every declared type while the tables are not there: only an input's own thresholds give a limit. */
export const offVolts = (_io: DigitalInput): number | undefined => undefined;

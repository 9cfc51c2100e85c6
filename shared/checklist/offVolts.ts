/** The voltage at which a declared type of input is off for sure. */
import type { DigitalInput } from '../panel/moduleIo';

export const offVolts = (_io: DigitalInput): number | undefined => undefined;

/** How many times its steady current a load may draw when it is switched on, where its maker does not say. */

export type LoadOf = 'resistive' | 'coil' | 'solenoid' | 'lamp' | 'led' | 'motor' | 'electronic' | 'control';

export interface InrushTimes {
  low: number;
  high: number;
}

// An instrument manual's table (reference §8). LED drivers and electronic loads charge a capacitor: its capacitive row.
const times: Record<LoadOf, InrushTimes> = {
  resistive: { low: 1, high: 1 },
  control: { low: 1, high: 1 },
  coil: { low: 10, high: 20 },
  solenoid: { low: 10, high: 20 },
  motor: { low: 5, high: 10 },
  lamp: { low: 10, high: 15 },
  led: { low: 20, high: 40 },
  electronic: { low: 20, high: 40 },
};

/** A DC coil has none: its inductance makes the current rise to the steady value (U = L·di/dt + R·i). */
export const inrushTimes = (load: LoadOf, current: 'ac' | 'dc'): InrushTimes =>
  current === 'dc' && (load === 'coil' || load === 'solenoid') ? times.resistive : times[load];

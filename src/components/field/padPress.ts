export type PadKey = '0' | '1' | '2' | '3' | '4' | '5' | '6' | '7' | '8' | '9' | '.' | '-' | 'wipe' | 'back';

// Longer than any meter shows; stops a stuck key.
const maxLength = 9;

/** What the reading looks like after one more key. A press that makes no number is ignored, never guessed at. */
export function padPress(value: string, key: PadKey): string {
  if (key === 'wipe') return '';
  if (key === 'back') return value.slice(0, -1);
  if (key === '-') return value.startsWith('-') ? value.slice(1) : `-${value}`;
  if (value.length >= maxLength) return value;
  if (key === '.') return value.includes('.') ? value : `${/\d/.test(value) ? value : `${value}0`}.`;
  if (value === '0' || value === '-0') return value.replace('0', key);
  return value + key;
}

/** The number a pad's text means, or undefined while it is none yet ("", "-", "-0."). */
export function padNumber(value: string): number | undefined {
  if (!/^-?\d+(\.\d*)?$/.test(value)) return undefined;
  const number = Number(value);
  return Number.isFinite(number) ? number : undefined;
}

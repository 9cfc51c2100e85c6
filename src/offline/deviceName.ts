/** What a person reads in the list of their devices, e.g. "Chrome on Android". */

// Order matters: every one of them also names the ones below it.
const browsers = [
  ['Edg', 'Edge'],
  ['SamsungBrowser', 'Samsung Internet'],
  ['Firefox', 'Firefox'],
  ['FxiOS', 'Firefox'],
  ['CriOS', 'Chrome'],
  ['Chrome', 'Chrome'],
  ['Safari', 'Safari'],
] as const;
const systems = [
  ['Android', 'Android'],
  ['iPhone', 'iPhone'],
  ['iPad', 'iPad'],
  ['Windows', 'Windows'],
  ['Mac OS X', 'macOS'],
  ['Linux', 'Linux'],
] as const;

const first = (agent: string, names: readonly (readonly [string, string])[]): string | undefined =>
  names.find(([mark]) => agent.includes(mark))?.[1];

/** From the User-Agent header's text; what it does not say is left out. */
export function deviceName(agent: string): string {
  const browser = first(agent, browsers) ?? 'Browser';
  const system = first(agent, systems);
  return system ? `${browser} on ${system}` : browser;
}

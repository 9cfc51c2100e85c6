/** Without root and with something missing, a command names the packages and stops. */
import { afterEach, describe, expect, it, vi } from 'vitest';
import { ensurePackages } from '../../../server/commands/debian';

afterEach(() => {
  vi.restoreAllMocks();
});

const missing = (name: string) => ({ name, present: () => false });
const present = (name: string) => ({ name, present: () => true });

describe('packages that a command needs', () => {
  it('are named when they are missing and nobody may install them', () => {
    vi.spyOn(process, 'getuid').mockReturnValue(1000);
    expect(() => {
      ensurePackages([missing('postgresql'), present('chromium'), missing('ngspice')]);
    }).toThrow(/missing: postgresql ngspice\nInstall them as root: apt-get install postgresql ngspice/);
  });

  it('are not asked for when they are there', () => {
    vi.spyOn(process, 'getuid').mockReturnValue(1000);
    expect(() => {
      ensurePackages([present('postgresql'), present('ngspice')]);
    }).not.toThrow();
  });
});

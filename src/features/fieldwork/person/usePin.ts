import { createContext, useContext } from 'react';

interface PinAsker {
  /** Asks for the PIN and says why; false when the person turned away. */
  ask: (why: string) => Promise<boolean>;
  /** Asks only after ten idle minutes. */
  askIfIdle: () => Promise<boolean>;
}

export const PinContext = createContext<PinAsker | null>(null);

export function usePin(): PinAsker {
  const asker = useContext(PinContext);
  if (!asker) throw new Error('usePin outside PinProvider');
  return asker;
}

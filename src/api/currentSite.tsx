import { createContext, useContext, useState, type ReactNode } from 'react';
import { useSession } from './session';

interface CurrentSite {
  /** Undefined only for somebody without a role at any site. */
  site: { id: string; name: string } | undefined;
  sites: { id: string; name: string }[];
  choose: (site: string) => void;
}

const SiteContext = createContext<CurrentSite>({ site: undefined, sites: [], choose: () => undefined });
const storageKey = 'coldloop.site';

/** The site whose jobs, panels and records the office screens show. */
export function CurrentSiteProvider({ children }: { children: ReactNode }) {
  const session = useSession();
  const [chosen, setChosen] = useState(() => localStorage.getItem(storageKey));
  const named = new Map(session.data?.roles.map((held) => [held.site, held.siteName]));
  const sites = [...named].map(([id, name]) => ({ id, name }));
  const choose = (site: string) => {
    localStorage.setItem(storageKey, site);
    setChosen(site);
  };
  const site = sites.find((each) => each.id === chosen) ?? sites[0];
  return <SiteContext.Provider value={{ site, sites, choose }}>{children}</SiteContext.Provider>;
}

export const useCurrentSite = () => useContext(SiteContext);

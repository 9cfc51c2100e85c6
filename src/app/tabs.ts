import type { Role } from '../../shared/api/common';
import type { WordingKey } from '../../shared/wording/render';
import { paths } from './paths';

interface Tab {
  to: string;
  words: WordingKey;
  for: readonly Role[];
}

const tabs: readonly Tab[] = [
  { to: paths.myJobs, words: 'app.tab.myJobs', for: ['electrician'] },
  { to: paths.jobs, words: 'app.tab.jobs', for: ['foreman'] },
  { to: paths.panels, words: 'app.tab.panels', for: ['panel-engineer', 'foreman'] },
  { to: paths.records, words: 'app.tab.records', for: ['safety-officer', 'foreman'] },
  { to: paths.people, words: 'app.tab.people', for: ['administrator'] },
  { to: paths.sites, words: 'app.tab.sites', for: ['administrator'] },
];

/** The tabs somebody with these roles may use, in the order of the work. */
export const tabsFor = (held: readonly Role[]): readonly Tab[] =>
  tabs.filter((tab) => tab.for.some((role) => held.includes(role)));

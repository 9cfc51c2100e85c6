/** The invented people and sites of the demo. */
import type { Language, Role } from '../../../shared/api/common';

export const demoPassword = 'halden quay demo';

export const demoSites = {
  waterWorks: {
    name: 'Halden Quay Water Works',
    settings: {
      emergencyNumber: '112',
      musterPoint: 'Car park by the intake gate',
      foremanPhone: '+44 1632 960 311',
      deadLimitV: 1,
      permitAsked: true,
      ferruleScheme: 'DIN 46228-4',
      instruments: [
        {
          make: 'Two-pole tester',
          number: 'VT-031',
          category: 'CAT III' as const,
          ratedV: 690,
          checkDue: '2027-06-30',
        },
        {
          make: 'Two-pole tester',
          number: 'VT-044',
          category: 'CAT III' as const,
          ratedV: 690,
          checkDue: '2027-03-31',
        },
      ],
    },
  },
  packaging: {
    name: 'Quayside Packaging',
    settings: {
      emergencyNumber: '112',
      musterPoint: 'Loading dock, south side',
      deadLimitV: 1,
      permitAsked: false,
      ferruleScheme: 'DIN 46228-4',
      instruments: [],
    },
  },
};
export type DemoSite = keyof typeof demoSites;

export interface DemoPerson {
  key: string;
  name: string;
  email: string;
  language: Language;
  roles: { site: DemoSite; role: Role }[];
}
const person = (
  name: string,
  email: string,
  language: Language,
  ...roles: DemoPerson['roles']
): DemoPerson => ({
  key: email.split('@')[0] ?? email,
  name,
  email,
  language,
  roles,
});
const at = (site: DemoSite, role: Role) => ({ site, role });

/** Several people a role; one who holds two; one who works next door only. */
export const demoPeople: DemoPerson[] = [
  person('Ines Varga', 'ines@halden-quay.example', 'en', at('waterWorks', 'electrician')),
  person('Mateo Ruiz', 'mateo@halden-quay.example', 'es', at('waterWorks', 'electrician')),
  person(
    'Tove Lind',
    'tove@halden-quay.example',
    'en',
    at('waterWorks', 'electrician'),
    at('packaging', 'electrician'),
  ),
  person('Ruth Adeyemi', 'ruth@halden-quay.example', 'en', at('waterWorks', 'foreman')),
  person(
    'Pavel Sand',
    'pavel@halden-quay.example',
    'en',
    at('waterWorks', 'foreman'),
    at('waterWorks', 'electrician'),
  ),
  person(
    'Nora Castell',
    'nora@halden-quay.example',
    'en',
    at('waterWorks', 'panel-engineer'),
    at('packaging', 'panel-engineer'),
  ),
  person(
    'Oskar Brandt',
    'oskar@halden-quay.example',
    'en',
    at('waterWorks', 'safety-officer'),
    at('packaging', 'safety-officer'),
  ),
  person(
    'Ada Holm',
    'ada@halden-quay.example',
    'en',
    at('waterWorks', 'administrator'),
    at('packaging', 'administrator'),
  ),
  person('Jonas Pike', 'jonas@halden-quay.example', 'en', at('packaging', 'foreman')),
];

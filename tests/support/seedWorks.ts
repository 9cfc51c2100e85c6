/** A works with people of each role signed in, a colleague's phone and an issued panel; and a stranger from another site. */
import { healthyPanel } from '../../server/commands/demo/panels/healthy';
import type { Panel } from '../../shared/panel/panelSchema';
import { issuePanel, type Crew } from './seedJobs';
import { seedPerson, seedSite, signIn, type Agent } from './seedPeople';
import { enrolDevice, type SigningDevice } from './signingDevice';
import { testServices, type TestServer } from './testServices';

export interface Works {
  server: TestServer;
  site: string;
  engineer: Agent;
  foreman: Agent;
  electrician: Agent;
  /** An electrician of the site who is on no job. */
  outsider: Agent;
  safety: Agent;
  admin: Agent;
  /** Foreman and electrician of another site. */
  stranger: Agent;
  strangerId: string;
  foremanId: string;
  electricianId: string;
  /** The electrician's. */
  device: SigningDevice;
  /** Issued once, from the healthy panel of the demo. */
  panel: string;
  crew: Crew;
  /** Another issued panel of its own tag. */
  anotherPanel: (change?: (panel: Panel) => Panel) => Promise<string>;
}

export const worksPoints = healthyPanel.points.slice(0, 3).map(({ address }) => address);

export async function seedWorks(): Promise<Works> {
  const server = await testServices();
  const { services, app } = server;
  const site = await seedSite(services, 'Halden Quay');
  const otherSite = await seedSite(services, 'Elsewhere');
  await seedPerson(services, 'Pia Panel', [{ site, role: 'panel-engineer' }]);
  const lead = await seedPerson(services, 'Finn Foreman', [
    { site, role: 'foreman' },
    { site, role: 'electrician' },
  ]);
  const ada = await seedPerson(services, 'Ada Electrician', [{ site, role: 'electrician' }]);
  await seedPerson(services, 'Cy Electrician', [{ site, role: 'electrician' }]);
  await seedPerson(services, 'Sue Safety', [{ site, role: 'safety-officer' }]);
  await seedPerson(services, 'Ann Admin', [{ site, role: 'administrator' }]);
  const otto = await seedPerson(services, 'Otto Other', [
    { site: otherSite, role: 'foreman' },
    { site: otherSite, role: 'electrician' },
  ]);
  const engineer = await signIn(app, 'pia.panel@example.org');
  const electrician = await signIn(app, 'ada.electrician@example.org');
  let made = 0;
  return {
    server,
    site,
    engineer,
    electrician,
    foreman: await signIn(app, 'finn.foreman@example.org'),
    outsider: await signIn(app, 'cy.electrician@example.org'),
    safety: await signIn(app, 'sue.safety@example.org'),
    admin: await signIn(app, 'ann.admin@example.org'),
    stranger: await signIn(app, 'otto.other@example.org'),
    strangerId: otto.id,
    foremanId: lead.id,
    electricianId: ada.id,
    device: await enrolDevice(electrician),
    panel: await issuePanel(engineer, site, healthyPanel),
    crew: { electricians: [ada.id], foreman: lead.id },
    anotherPanel: (change = (same) => same) => {
      const copy = { ...structuredClone(healthyPanel), tag: `JB-${(made += 1)}` };
      return issuePanel(engineer, site, change(copy));
    },
  };
}

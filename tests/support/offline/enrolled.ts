/** A device on which people of the sample job are enrolled and the job's pack is held. */
import { electrician, foreman, jobId, samplePack } from '../fieldHarness/samplePack';
import { FakeDevice } from './fakeDevice';
import { FakeServer } from './fakeServer';

export { jobId };
export const mara = { id: electrician.person, name: electrician.name, email: electrician.email };
export const tomas = { id: foreman.person, name: foreman.name, email: foreman.email };
export const pinOf = '481516';

/** The last of `people` stays signed in. */
export async function enrolledDevice(server = new FakeServer(), people = [mara]) {
  const device = new FakeDevice(server);
  const store = device.tab();
  server.packs = [samplePack];
  for (const person of people) {
    server.session = person.id;
    await store.enrol(person, pinOf);
    await store.sendNow();
  }
  return { device, server, store };
}

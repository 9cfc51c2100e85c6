/** Which devices may ever count as a means of isolation: never a control device. */
import type { Isolator } from '../panel/panelSchema';

const controlKinds: Isolator['kind'][] = ['contactor', 'interlock'];
const mechanicalKinds: Isolator['kind'][] = ['valve', 'blocking-device'];

/** True for a device that is made to open an electrical circuit (or to control one). */
export const electricalKind = (isolator: Isolator): boolean => !mechanicalKinds.includes(isolator.kind);

/** A contactor, an interlock or anything its maker does not call suitable for isolation never counts as open. */
export const countsAsIsolation = (isolator: Isolator): boolean =>
  isolator.suitableForIsolation && !controlKinds.includes(isolator.kind);

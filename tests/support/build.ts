/** Builds the client once for all browser tests; a build of the same sources is used again. */
import { buildClient } from '../../server/commands/clientBuild';

export default function setup(): void {
  buildClient();
}

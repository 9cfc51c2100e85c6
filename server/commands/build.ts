/** `npm run build`: the client, ready to be served. */
import { buildClient } from './clientBuild';

buildClient();
console.log('The client is built.');

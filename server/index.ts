/** The server by itself, all settings from the environment: for production and for `npm run dev`. */
import { readConfig } from './config';
import { serve } from './serve';
import { untilStopped } from './untilStopped';

const serving = await serve(readConfig());
await untilStopped();
await serving.close();
process.exit(0);

/** `npm run bench`: times and sizes, as ratios within this run. Nothing is asserted. */
import { answerSaved } from './answerSaved/run';

await import('./engines');
console.log(await answerSaved());

/** `npm run bench`: times and sizes, as ratios within this run. Nothing is asserted. */
import { answerSaved } from './answerSaved/run';
import { fieldScriptSize } from './fieldScriptSize';

await import('./engines');
console.log(await answerSaved());
console.log(fieldScriptSize());

/** One seed for every property, so that a run can be repeated; `SEED=7 npx vitest run …` takes another look. */
import fc from 'fast-check';

const usualSeed = 20_261_201;
fc.configureGlobal({ seed: Number(process.env.SEED ?? usualSeed) });

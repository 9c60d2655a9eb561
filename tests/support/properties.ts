import fc from 'fast-check'

/**
 * How property tests are run. Everyday runs draw the same cases every time, so that a red run can be run again and a
 * green one means the same for everybody; `npm run test:laws` draws new ones, and many more (LAWS_RUNS).
 */
const everydaySeed = 20_261_201

fc.configureGlobal({
  seed: process.env.LAWS_SEED === 'random' ? Date.now() : Number(process.env.LAWS_SEED ?? everydaySeed),
  numRuns: Number(process.env.LAWS_RUNS ?? 100),
})

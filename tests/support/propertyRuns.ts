import fc from 'fast-check';

const runs = Number(process.env.FAST_CHECK_RUNS);

/** Mutation tests run every property hundreds of times over, so they ask for fewer cases of each. */
if (Number.isInteger(runs) && runs > 0) fc.configureGlobal({ numRuns: runs });

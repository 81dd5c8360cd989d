import fc from 'fast-check';

/** One seed for all property tests of a run, printed so that a failure can be replayed: PROPERTY_SEED=... npm test */
const seed = process.env.PROPERTY_SEED === undefined ? 20261201 : Number(process.env.PROPERTY_SEED);
fc.configureGlobal({ seed, verbose: fc.VerbosityLevel.Verbose });

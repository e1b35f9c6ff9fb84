import fc from 'fast-check';

/**
 * Properties look at the same cases each time, so that a run that passed passes again. RANDOM_SEED=1 looks
 * at others: do so when the code under a property has changed.
 */
if (!process.env.RANDOM_SEED) {
  fc.configureGlobal({ ...fc.readConfigureGlobal(), seed: 20_261_201 });
}

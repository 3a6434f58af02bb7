import fc from 'fast-check';

/**
 * Property tests draw the same cases on every run, so that a build fails for the change it tests and for nothing
 * else. Set PROPERTY_SEED to another whole number to draw others.
 */
fc.configureGlobal({ seed: Number(process.env.PROPERTY_SEED ?? 20_261_201) });

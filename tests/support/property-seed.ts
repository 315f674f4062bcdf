import fc from "fast-check";

/**
 * Property tests draw the same cases at every run, so that a gate never fails by chance. `PROPERTY_SEED=random npm run check`
 * draws new ones; a failure prints its seed, which can be given in place of "random".
 */
const wished = process.env.PROPERTY_SEED;
if (wished !== "random") fc.configureGlobal({ seed: wished === undefined ? 20_261_201 : Number(wished) });

/**
 * How fast-check draws here: five properties of 400 scenarios make the 2,000 of `npm test`; `npm run endure` sets 4,000.
 * A failure prints seed and path; RESTBAND_SEED draws others.
 */
export const propertyRuns = {
  numRuns: Number(process.env.RESTBAND_PROPERTY_RUNS ?? 400),
  seed: Number(process.env.RESTBAND_SEED ?? 20261201),
  endOnFailure: true,
};

/** What all of them may take, ms. */
export const propertyTimeout = 1000 * Math.max(120, propertyRuns.numRuns);

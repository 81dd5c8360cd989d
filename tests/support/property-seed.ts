/** One seed for all property tests of a run; PROPERTY_SEED replays another. */
export const propertySeed = process.env.PROPERTY_SEED === undefined ? 20261201 : Number(process.env.PROPERTY_SEED);

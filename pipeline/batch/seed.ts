/** Seed of the random numbers where none is given. */
export const SEED = 1;

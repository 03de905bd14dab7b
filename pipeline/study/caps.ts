/** What a study file may hold at most; each has its message. */
export const caps = {
  /** Characters of a study file or of a list of own correlations. */
  characters: 256_000,
  /** Maps and lists inside each other. */
  depth: 20,
  /** Values after aliases are written out. */
  values: 20_000,
  /** Characters of one text. */
  text: 5000,
  /** Faults that are listed; the rest is counted. */
  faults: 50,
} as const;

/** Shares of each source of uncertainty in the variance of something, largest first, summing to 1. */
export interface Budget {
  readonly of: string;
  readonly total: number;
  readonly shares: readonly {
    readonly source: string;
    readonly kind: 'random' | 'systematic' | 'scatter' | 'campaign';
    readonly share: number;
  }[];
}

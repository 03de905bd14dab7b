/** The list of a folder's inputs and results with their hashes. */
export const PROVENANCE = 'provenance.json';

/** What stands in it. */
export interface Provenance {
  readonly format: 1;
  readonly version: string;
  readonly node: string;
  readonly seed: number;
  readonly options: object;
  readonly inputs: readonly { readonly file: string; readonly sha256: string }[];
  readonly results: readonly { readonly file: string; readonly sha256: string }[];
  /** The study in one line, for a later run that finds nothing changed. */
  readonly summary: object;
}

/** Where in the user's files something stands. Lines and columns count from 1. */
export interface Place {
  readonly file: string;
  readonly line?: number;
  readonly column?: number;
  /** Dotted path of a key in a study file: `quantities.rotation_speed.unit`. */
  readonly key?: string;
  readonly trial?: string;
}

/** `study.yaml:14:11  quantities.rotation_speed.unit` */
export function formatPlace({ file, line, column, key, trial }: Place): string {
  const at = [file, line, column].filter((part) => part !== undefined).join(':');
  return [at, key, trial === undefined ? undefined : `trial ${trial}`].filter((part) => part !== undefined).join('  ');
}

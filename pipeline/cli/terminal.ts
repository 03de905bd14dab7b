/** Where a command speaks: results on standard output, messages on standard error. */
export interface Terminal {
  readonly out: (text: string) => void;
  readonly err: (text: string) => void;
  /** Standard error is a terminal: progress may be drawn. */
  readonly interactive: boolean;
  /** PILOTLAW_DEBUG is set: defects print their stack. */
  readonly debug: boolean;
}

export const processTerminal = (): Terminal => ({
  out: (text) => void process.stdout.write(text),
  err: (text) => void process.stderr.write(text),
  interactive: process.stderr.isTTY === true,
  debug: (process.env.PILOTLAW_DEBUG ?? '') !== '',
});

import { type ChildProcess, spawn } from 'node:child_process';
import { join } from 'node:path';

export const main = join(import.meta.dirname, '../../dist/pipeline/cli/main.js');

export interface Ended {
  readonly exit: number | null;
  readonly out: string;
  readonly err: string;
}

export interface Where {
  readonly cwd?: string;
  readonly env?: Readonly<Record<string, string>>;
  /** Called once, as soon as it runs. */
  readonly started?: (child: ChildProcess) => void;
}

/** The built program, to its end. */
export const pilotlaw = (args: readonly string[], { cwd, env, started }: Where = {}): Promise<Ended> =>
  new Promise((done) => {
    const child = spawn(process.execPath, [main, ...args], { cwd, env: { ...process.env, ...env } });
    let out = '';
    let err = '';
    child.stdout.on('data', (data) => {
      out += data;
    });
    child.stderr.on('data', (data) => {
      err += data;
    });
    child.on('close', (exit) => done({ exit, out, err }));
    started?.(child);
  });

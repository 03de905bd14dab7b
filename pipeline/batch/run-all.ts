import { Worker } from 'node:worker_threads';
import * as says from '../base/says/batch.ts';
import { type Outcome, outcomeOf, type Task } from './outcome.ts';

export interface Pace {
  /** Studies at the same time. */
  readonly jobs: number;
  /** ms after which a study is given up. */
  readonly timeLimit?: number;
  /** The program of a thread: takes a Task, answers with an Outcome. */
  readonly worker?: URL;
}

/** No study of this size of problem needs as long; what does, would not end. */
const TIME_LIMIT = 30 * 60_000; // ms

/** Only the built program has threads: Node 20 runs no TypeScript. From source one study runs after another. */
const builtWorker = import.meta.url.endsWith('.js') ? new URL('./study-worker.js', import.meta.url) : undefined;

/**
 * Runs every task, `jobs` at a time, each in a thread that can be stopped, and tells each outcome as it comes. A task that takes its thread down with it
 * (out of memory, without end) is one outcome like any other; a new thread goes on with the next.
 */
export async function runAll(tasks: readonly Task[], pace: Pace, tell: (k: number, outcome: Outcome) => void): Promise<void> {
  const worker = pace.worker ?? builtWorker;
  let next = 0;
  const lane = async (): Promise<void> => {
    const thread = worker === undefined ? undefined : new Thread(worker, pace.timeLimit ?? TIME_LIMIT);
    for (let k = next++; k < tasks.length; k = next++) tell(k, await (thread === undefined ? here(tasks[k]!) : thread.run(tasks[k]!)));
    await thread?.end();
  };
  await Promise.all(Array.from({ length: worker === undefined ? 1 : Math.min(pace.jobs, tasks.length) }, lane));
}

async function here({ study, ...options }: Task): Promise<Outcome> {
  try {
    const { runStudy } = await import('./run-study.ts');
    return { kind: 'done', summary: await runStudy(study, options) };
  } catch (error) {
    return outcomeOf(error);
  }
}

/** A worker that is replaced when it dies. */
class Thread {
  readonly #file: URL;
  readonly #timeLimit: number;
  #worker: Worker;

  constructor(file: URL, timeLimit: number) {
    this.#file = file;
    this.#timeLimit = timeLimit;
    this.#worker = started(file);
  }

  async run(task: Task): Promise<Outcome> {
    const outcome = await this.#answer(task);
    if (outcome.died) {
      await this.#worker.terminate();
      this.#worker = started(this.#file);
    }
    return outcome.is;
  }

  async end(): Promise<void> {
    await this.#worker.terminate();
  }

  #answer(task: Task): Promise<{ readonly is: Outcome; readonly died: boolean }> {
    const worker = this.#worker;
    return new Promise((answer) => {
      const settle = (is: Outcome, died: boolean): void => {
        clearTimeout(watch);
        worker.off('message', onMessage).off('error', onError).off('exit', onExit);
        answer({ is, died });
      };
      const onMessage = (is: Outcome): void => settle(is, false);
      const onError = (error: unknown): void => settle(deathOf(task, error), true);
      const onExit = (code: number): void => settle({ kind: 'defect', text: says.threadEnded(code) }, true);
      const watch = setTimeout(() => settle(refused(task, 'took-too-long', says.tookTooLong(this.#timeLimit)), true), this.#timeLimit);
      worker.on('message', onMessage).on('error', onError).on('exit', onExit);
      worker.postMessage(task);
    });
  }
}

/** Between two tasks nobody listens: a late error of a thread that is being replaced is told already. */
const started = (file: URL): Worker => new Worker(file).on('error', () => undefined);

function deathOf(task: Task, error: unknown): Outcome {
  const code = error instanceof Error && 'code' in error ? error.code : undefined;
  return code === 'ERR_WORKER_OUT_OF_MEMORY' ? refused(task, 'out-of-memory', says.outOfMemory()) : outcomeOf(error);
}

const refused = (task: Task, code: string, text: string): Outcome => ({
  kind: 'refused',
  messages: [{ code, text, place: { file: task.study } }],
  exit: 3,
});

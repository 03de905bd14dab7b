import { parentPort } from 'node:worker_threads';
import { outcomeOf, type Task } from './outcome.ts';

/** One study after another in a thread of its own; `ready` before the first, an outcome after each. */
parentPort!.on('message', async ({ study, ...options }: Task) => {
  try {
    const { runStudy } = await import('./run-study.ts');
    parentPort!.postMessage({ kind: 'done', summary: await runStudy(study, options) });
  } catch (error) {
    parentPort!.postMessage(outcomeOf(error));
  }
});

// A thread as the batch knows it, whose studies do what their names say.
import { parentPort } from 'node:worker_threads';

parentPort.on('message', ({ study }) => {
  if (study === 'never ends') for (;;);
  if (study === 'throws') throw new Error('thrown');
  if (study === 'leaves') process.exit(7);
  if (study === 'needs memory') for (const all = []; ; ) all.push(new Array(1e6).fill(Math.random()));
  setTimeout(() => parentPort.postMessage({ kind: 'done', summary: { study } }), study === 'slow' ? 100 : 0);
});

import { liveCalculator } from './calculator.ts';
import { controls } from './controls.ts';
import { pageData } from './inflate.ts';
import { liveLedger } from './ledger.ts';
import { livePictures } from './pictures.ts';
import { store } from './state.ts';
import { liveWalk } from './walk.ts';

/** Brings the page alive. Where anything fails the page stays what it was: complete, but still. */
async function live(): Promise<void> {
  const data = await pageData();
  const shared = store();
  controls(data, shared);
  liveLedger(shared);
  liveWalk(data, shared);
  liveCalculator(data);
  livePictures(data, shared);
  document.documentElement.dataset.live = '1';
}

void live();

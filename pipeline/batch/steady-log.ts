import { InputError } from '../base/input-error.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/trials.ts';
import type { Staged } from '../base/staged.ts';
import type { Plan } from '../plan/plan.ts';
import { parseAmount } from '../quantities/amount.ts';
import { isFault } from '../quantities/fault.ts';
import { quantities } from '../quantities/vocabulary.ts';
import type { SteadyEntry } from '../study/study.ts';
import { leaveWindowsOut } from '../trials/leave-windows-out.ts';
import type { LogSource } from '../trials/log-stream.ts';
import { readLog } from '../trials/log-table.ts';
import { findSteady, type SteadyTrials, steadyTrials } from '../trials/steady.ts';

/** Steady windows of the study's raw log as its trials. Throws InputError (exit 3) where there is none. */
export async function steadyWindowsOf(
  { study: { trials: declared }, columns }: Plan,
  { time, window, share, significance }: SteadyEntry,
  open: (file: string, place: Place) => LogSource,
): Promise<Staged<SteadyTrials>> {
  const length = parseAmount(window.is, quantities.time);
  if (isFault(length)) throw new InputError([{ code: length.code, text: length.text, place: window.place }]);
  const read = await readLog(open(declared.file.is, declared.file.place), {
    time: { column: time.is, place: time.place },
    columns: columns.map(({ key, column, index, unit, place }) => ({ key, column, place, settled: { index, unit } })),
    missing: declared.missing,
  });
  const options = { window: length.si, share, significance };
  const windows = findSteady(read.value, { ...options, place: window.place });
  if (windows.length === 0)
    throw new InputError(
      [
        { code: 'no-steady-window', text: says.noSteadyWindow(length.si, read.value.rows), place: { file: read.value.file } },
        ...read.notes,
      ],
      3,
    );
  const { value, notes } = steadyTrials(read.value, windows, options);
  return { value: leaveWindowsOut(value, declared.leaveOut), notes: [...read.notes, ...notes], refused: [] };
}

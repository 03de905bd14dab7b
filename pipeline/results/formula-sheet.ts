import { utils, type WorkSheet } from '@e965/xlsx';
import { evaluate } from '../algebra/evaluate.ts';
import { spreadsheetFormula } from '../algebra/spreadsheet.ts';
import * as says from '../base/says/results.ts';
import { guarded } from './guarded.ts';
import type { StudyResult } from './study-result.ts';

/** The chosen law with a cell for each parameter and group; the groups are the reader's to change. Groups start at the geometric middle of the trials. */
export function formulaSheet(result: StudyResult): WorkSheet {
  const fit = result.fits.find((one) => one.name === result.chosen)!;
  const { form } = fit;
  const rows: (string | number)[][] = [
    [says.sheetTitle(guarded(fit.name))],
    [fit.text],
    [],
    [says.sheetParameters(), '', says.sheetError()],
  ];
  const where = new Map<string, string>();
  const put = (name: string, cells: (string | number)[]): void => {
    rows.push(cells);
    where.set(name, `B${rows.length}`);
  };
  for (const { name, estimate, standardError } of fit.parameters)
    put(name, [guarded(name), estimate, Number.isFinite(standardError) ? standardError : '']);
  rows.push([], [says.sheetGroups(), '', says.sheetFrom(), says.sheetTo()]);
  const middle = Object.fromEntries(form.groups.map((name) => [name, middleOf(fit.ranges[name]!)]));
  for (const name of form.groups) put(name, [guarded(name), middle[name]!, ...fit.ranges[name]!]);
  rows.push([], [form.response, Number.NaN]);
  const at = `B${rows.length}`;
  const sheet = utils.aoa_to_sheet(rows);
  const formula = spreadsheetFormula(form.tree, (name) => where.get(name)!);
  const value = evaluate(form.tree, middle, fit.values);
  sheet[at] = formula === undefined ? { t: 's', v: says.sheetNoFormula() } : { t: 'n', f: formula, v: value };
  sheet['!cols'] = [{ wch: 24 }, { wch: 18 }, { wch: 18 }, { wch: 18 }];
  return sheet;
}

const middleOf = ([low, high]: readonly [number, number]): number => (low > 0 ? Math.sqrt(low * high) : (low + high) / 2);

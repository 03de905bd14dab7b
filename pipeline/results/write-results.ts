import type { ColumnTable } from 'arquero';
import { sha256 } from '../files/hash.ts';
import { replaceResults } from '../files/replace-results.ts';
import { lawPython } from './law-python.ts';
import { lawsJson } from './laws-json.ts';
import { PROVENANCE, type Provenance } from './provenance.ts';
import type { StudyResult } from './study-result.ts';
import { auditTable, plantTable, trialsTable } from './tables.ts';
import { workbook } from './workbook.ts';

/** One line end after the last row. */
export const csvOf = (table: ColumnTable): string => `${table.toCSV().trimEnd()}\n`;

/** Every result file but the report, by name. */
export function resultFiles(result: StudyResult): ReadonlyMap<string, string | Uint8Array> {
  const files = new Map<string, string | Uint8Array>([
    ['laws.json', lawsJson(result)],
    ['trials.csv', csvOf(trialsTable(result))],
  ]);
  const audited = auditTable(result);
  const plant = plantTable(result);
  if (audited !== undefined) files.set('audit.csv', csvOf(audited));
  if (plant !== undefined) files.set('plant.csv', csvOf(plant));
  files.set('results.xlsx', workbook(result));
  const fit = result.fits.find(({ name }) => name === result.chosen)!;
  const python = lawPython(fit, result.study.title, fit.text);
  if (python !== undefined) files.set('law.py', python);
  return files;
}

/**
 * Replaces the results in a folder. `provenance.json` holds the hash of every file and stands only beside exactly those, so that a mixture of two runs cannot
 * pass for a result; `summary` goes into it, for a later run that finds nothing changed. Files of the user's own in the folder are left alone.
 */
export function writeResults(folder: string, files: ReadonlyMap<string, string | Uint8Array>, result: StudyResult, summary: object): void {
  const { version, node, seed, files: inputs } = result.provenance;
  const results = [...files].map(([file, content]) => ({ file, sha256: sha256(content) })).sort((a, b) => (a.file < b.file ? -1 : 1));
  const provenance: Provenance = { format: 1, version, node, seed, options: result.options, inputs, results, summary };
  replaceResults(folder, new Map([...files, [PROVENANCE, `${JSON.stringify(provenance, null, 2)}\n`]]), PROVENANCE);
}

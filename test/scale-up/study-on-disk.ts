import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { computeStudy } from '../../pipeline/batch/run-study.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';

/** A study of these files, computed through the same door as the command line's. `study.yaml` is one of them. */
export async function studyOf(files: Readonly<Record<string, string>>): Promise<StudyResult> {
  const folder = mkdtempSync(join(tmpdir(), 'scale-up-'));
  try {
    for (const [name, text] of Object.entries(files)) writeFileSync(join(folder, name), text);
    return await computeStudy(join(folder, 'study.yaml'));
  } finally {
    rmSync(folder, { recursive: true });
  }
}

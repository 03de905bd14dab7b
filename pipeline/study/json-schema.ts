import { dirname, resolve } from 'node:path';
import { pathToFileURL } from 'node:url';
import { z } from 'zod';
import { makeFolder, replaceFile } from '../files/write.ts';
import { studySchema } from './study-schema.ts';

/** The JSON Schema (draft 2020-12) of a study file, for editors that check while one writes. */
export function studyJsonSchema(): object {
  const { $schema, ...rest } = z.toJSONSchema(studySchema, { reused: 'inline' });
  return { $schema, title: 'A study, format 1', ...rest };
}

/** Run as a program (part of the build): writes the schema to the path given, `dist/study.schema.json` without one. */
function main(path = 'dist/study.schema.json'): void {
  makeFolder(dirname(resolve(path)));
  replaceFile(resolve(path), `${JSON.stringify(studyJsonSchema(), null, 2)}\n`);
}

if (process.argv[1] !== undefined && import.meta.url === pathToFileURL(process.argv[1]).href) main(process.argv[2]);

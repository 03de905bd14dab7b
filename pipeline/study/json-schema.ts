import { z } from 'zod';
import { studySchema } from './study-schema.ts';

/** The JSON Schema (draft 2020-12) of a study file, for editors that check while one writes. */
export function studyJsonSchema(): object {
  const { $schema, ...rest } = z.toJSONSchema(studySchema, { reused: 'inline' });
  return { $schema, title: 'A study, format 1', ...rest };
}

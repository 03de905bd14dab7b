import { expect, test } from 'vitest';
import { studyJsonSchema } from '../../pipeline/study/json-schema.ts';

// What JSON Schema draft 2020-12 (json-schema.org) asks of such a document.
test('the schema names its draft, what is required, and refuses other keys', () => {
  const schema = studyJsonSchema() as {
    $schema: string;
    required: string[];
    additionalProperties: boolean;
    properties: Record<string, unknown>;
  };
  expect(schema.$schema).toBe('https://json-schema.org/draft/2020-12/schema');
  expect(schema.required).toEqual(['pilotlaw', 'title', 'transfer', 'trials', 'laws']);
  expect(schema.additionalProperties).toBe(false);
  expect(schema.properties.pilotlaw).toMatchObject({ const: 1 });
  expect(schema.properties.transfer).toMatchObject({ enum: ['heat', 'mass'] });
  expect(JSON.parse(JSON.stringify(schema))).toEqual(schema);
});

test('every reference in it leads to a definition', () => {
  const text = JSON.stringify(studyJsonSchema());
  const defined = new Set(Object.keys((JSON.parse(text) as { $defs?: object }).$defs ?? {}));
  for (const [, name] of text.matchAll(/"\$ref":"#\/\$defs\/([^"]+)"/g)) expect(defined.has(name!), name).toBe(true);
});

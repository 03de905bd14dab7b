import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { catalogueTable } from './catalogue-rows.ts';

// npm run catalogue-table: makes catalogue-table.md anew.

writeFileSync(join(import.meta.dirname, 'catalogue-table.md'), catalogueTable());

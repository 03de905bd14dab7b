import { writeFileSync } from 'node:fs';
import { join } from 'node:path';
import { headlineTable } from './headline-rows.ts';

// npm run headlines: makes headlines.md anew.

const write = async (): Promise<void> => writeFileSync(join(import.meta.dirname, 'headlines.md'), await headlineTable());
void write();

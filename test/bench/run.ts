import { commandLine } from './command-line.ts';

for (const line of commandLine()) console.log(line);

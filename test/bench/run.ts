import { commandLine } from './command-line.ts';
import { fitBench } from './fits.ts';
import { refitBench } from './refits.ts';
import { auditBench, wholeStudy } from './whole-study.ts';

for (const part of [commandLine, wholeStudy, auditBench, fitBench, refitBench]) for (const line of part()) console.log(line);

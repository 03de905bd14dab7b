import { didYouMean } from '../nearest.ts';

/** What the command line says. */
export const says = {
  defect: (text: string): string =>
    `This is a defect of pilotlaw, not of your files: ${text}\nPlease report it with the command you gave, the study file, and what the same command prints with PILOTLAW_DEBUG=1 set.`,

  about:
    'From tabulated pilot trials to a heat or mass transfer law, its audit against\npublished correlations, and plant cases with intervals.',
  epilogue: [
    'Exit codes: 0 all done; 2 the command line or a study file is wrong; 3 data that cannot be used;',
    '4 some of several studies failed; 1 a defect of pilotlaw.',
    'The numbers are input to a review by a qualified engineer; local codes and standards and',
    'licensed practice come first.',
  ].join('\n'),
  run: 'Compute studies: results and a report for each',
  check: 'Validate studies, explain what is given, derived, missing',
  begin: 'Write a commented study file from the headers of a table',
  correlations: 'List the published correlations, or show one in full',
  predict: 'Apply the law of a laws.json to a table of plant cases',
  nextTrials: 'Propose the trials that would narrow the plant prediction most',

  optionOut: 'Folder for the results (several studies: one folder each inside it)',
  optionJobs: 'Studies that run at the same time (default: one per core)',
  optionSeed: 'Seed of the random numbers',
  optionFresh: 'Compute anew even if nothing has changed',
  optionQuiet: 'No messages but faults',
  optionJson: 'Print results as JSON',
  optionFamily: 'Only this family of equipment, such as tube',
  optionGives: 'Only correlations that give this, such as Nu',
  optionSearch: 'Only correlations with this text in id, authors, title or use',
  optionPage: 'Write them to this file as one HTML page for reference',
  pageWritten: (entries: number, file: string): string => `${entries} ${entries === 1 ? 'correlation' : 'correlations'} written to ${file}`,
  optionAt: 'Evaluate there, such as "Re=6071, Pr=0.70"',
  optionCount: 'How many trials to propose',
  optionOutFile: 'File to write instead of standard output',
  optionConservative: 'Side on which the coefficient is dangerous: low (default) or high',
  notASide: (read: string): string => `--conservative takes low or high, not "${read}"`,
  tableWritten: (cases: number, file: string): string => `${cases} ${cases === 1 ? 'case' : 'cases'} predicted; ${file} is written`,
  noRig: (): string =>
    'the study has no rig section, so nothing may be proposed; say what a trial can set, such as rig: {rotation_speed: [100 rpm, 600 rpm]}',
  studyExists: (): string => 'this study file exists; --force overwrites it',
  begun: (file: string, questions: number): string =>
    questions === 0 ? `${file} is written` : `${file} is written; ${questions} ${questions === 1 ? 'question is' : 'questions are'} open:`,
  optionForce: 'Overwrite a file that exists',
  optionSheet: 'Sheet of a workbook',
  optionLaw: 'Name of the law (default: the one the study chose)',
  positionalStudy: 'study.yaml, or a folder that holds it',
  positionalTrials: 'Table of trials: .csv, .tsv, .txt or .xlsx',
  positionalId: 'Identifier, such as churchill-bernstein-1977',
  positionalLaws: 'results/laws.json of a study',
  positionalPlant: 'Table of plant cases: columns are quantities with units',
  optionHelp: 'Show this help, or that of a command',
  optionVersion: 'Show the version',

  noCommand: (known: readonly string[]): string => `give a command: ${known.join(', ')}; pilotlaw --help tells what they do`,
  unknownCommand: (name: string, known: readonly string[]): string =>
    `"${name}" is not a command; commands are ${known.join(', ')}${didYouMean(name, known)}`,
  unknownOption: (name: string, known: readonly string[]): string => {
    const meant = didYouMean(name, known);
    return `unknown option --${name}${meant === '' ? `; options here are ${known.map((one) => `--${one}`).join(', ')}` : meant.replace('"', '"--')}`;
  },
  argumentMissing: (name: string, usage: string): string => `${name} is missing; the command is: ${usage}`,
  tooManyArguments: (word: string, usage: string): string => `"${word}" is one argument too many; the command is: ${usage}`,
  notUnderstood: (text: string, usage: string): string => `${text}; the command is: ${usage}`,
  notANumber: (option: string, value: string, from: number, to: number): string =>
    `--${option}: "${value}" is not a whole number from ${from} to ${to}`,
  optionEmpty: (option: string): string => `--${option} is given without a value`,
  optionTakesNoValue: (option: string): string => `--${option} takes no value`,
  optionTwice: (option: string): string => `--${option} is given twice; give it once`,

  done: (law: string, folder: string, trials: { readonly read: number; readonly used: number }, warnings: number): string =>
    `${law}  (${trials.used} of ${trials.read} rows used, ${warnings === 0 ? 'no warnings' : `${warnings} warning${warnings === 1 ? '' : 's'}`}); results in ${folder}, open ${folder}/report.html`,
  sharedFolder: (folder: string, other: string): string =>
    `its results would go into "${folder}", as those of ${other}; run them apart, or let their folders have different names`,
  sharedNamedFolder: (folder: string, other: string): string =>
    `its results would go into "${folder}", as those of ${other}; give one of them another output.folder, or run them apart with --out`,
  unchanged: (law: string, folder: string): string =>
    `${law}  (unchanged, nothing computed); results in ${folder}, open ${folder}/report.html`,
  progress: (done: number, of: number, failed: number, left: string | undefined): string =>
    `${done} of ${of} studies${failed === 0 ? '' : `, ${failed} failed`}${left === undefined ? '' : `, about ${left} left`}`,
  indexWritten: (file: string): string => `All of them at a glance: ${file}`,
  failedStudies: (failed: number, of: number): string =>
    failed === of ? `all ${of} studies failed` : `${failed} of ${of} studies failed; the results of the others are written`,

  noCorrelation: (id: string, known: readonly string[]): string =>
    `no published correlation has the id "${id}"${didYouMean(id, known)}; pilotlaw correlations lists them all`,
  noneMatch: 'no published correlation matches; pilotlaw correlations without options lists them all',
  atNeedsId: '--at needs the id of one correlation',
  atNotRead: (part: string): string => `--at: "${part}" is not NAME=NUMBER, such as Re=6071`,
  atTwice: (name: string): string => `--at: ${name} is given twice`,
  atMissing: (names: readonly string[]): string => `--at: ${names.join(', ')} ${names.length === 1 ? 'is' : 'are'} needed too`,
  atUnknown: (name: string, known: readonly string[]): string =>
    `--at: ${name} does not stand in this correlation, which has ${known.join(', ')}${didYouMean(name, known)}`,
  atNoValue: (gives: string): string => `${gives} has no value there`,
  headDefinitions: 'definitions',
  headLimits: 'range',
  headReads: 'read as',
  headAccuracy: 'accuracy',
  headUse: 'use',
  headAnalogy: 'analogy',
  headSource: 'source',
  headChecked: 'checked',
  noLimits: 'no limits stated',
  analogyAllowed: 'the heat-mass analogy may be applied',
  analogyNot: 'not for the heat-mass analogy',
  fromMemory: ' (constants from memory)',
  quantityAs: (name: string, what: string, unit: string): string => `${name}: ${what}${unit === '1' ? '' : `, ${unit}`}`,
  checkedAt: (kind: string, at: string, gives: string, value: number, source: string, where: string): string =>
    `${kind}: ${gives} = ${value} at ${at} (${source}, ${where})`,
  standing: (inside: boolean | null): string =>
    inside === null ? 'not known, for a group in it is not given' : inside ? 'inside' : 'OUTSIDE',
  rangeStanding: (inside: boolean | null): string =>
    inside === null
      ? 'not all of its range can be looked at here'
      : inside
        ? 'inside the range its authors state'
        : 'OUTSIDE the range its authors state',
};

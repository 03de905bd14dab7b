const list = (names: readonly string[]): string => names.join(', ');

/** What a study file that was begun from a table says in its comments, and the questions it leaves open. One line each. */
export const says = {
  firstGuess: (file: string): string =>
    `A first guess from ${file.replace(/\s+/gu, ' ')}. Lines marked QUESTION are open: settle them, then run "pilotlaw check".`,
  question: (text: string): string => `QUESTION: ${text.replace(/\s+/gu, ' ')}`,
  title: (file: string): string => `Trials of ${file}`,
  whichTransfer: (): string => 'is it heat or mass that is transferred?',
  whichEquipment: (): string =>
    'which family of published correlations fits the equipment? tube annulus coil plate cylinder tube-bank sphere natural-convection packed-bed fluidised-bed bed-wall vessel suspended-solids gas-liquid wetted-wall packed-column rotating membrane plate-exchanger impinging-jet layer other',
  areReadings: (): string => 'some trial names stand in more than one row: are these rows readings of one trial, to be averaged?',
  areMarks: (marks: readonly string[]): string =>
    `do ${list(marks.map((mark) => JSON.stringify(mark)))} mark missing values? Rows that need them are refused`,
  uncertainties: (): string =>
    'Beside each quantity belong its standard uncertainties (k = 1): random: 0.1 K, systematic: 0.3 K, or accuracy: 1 % of 50 L/min. Without them a quantity counts as exact.',
  notUsed: (header: string): string => `not used: ${JSON.stringify(header)}`,
  whichRoute: (): string => 'how does a coefficient come from these readings? "pilotlaw check" lists what each route needs',
  routeLacks: (route: string, lacks: readonly string[]): string =>
    `${route} also needs ${list(lacks)}, as columns or as values under quantities: (diameter: 16 mm), unless they follow from others`,
  whichFluid: (): string => 'which fluid is it? Its properties follow from it, or are given as quantities',
  whichArrangement: (): string =>
    'how do the streams run? arrangement: counter, parallel, cross or well-stirred; duty: own, other, mean or weighted',
  whichStreams: (): string =>
    'which stream is the one whose coefficient is wanted? Its names stand bare, those of the second stream end in _other',
  whichBasis: (): string =>
    'do these lengths and velocities define the groups? Re: pipe, hydraulic, plate, particle, cylinder, tube-bank, impeller, film ...',
  whichLaw: (): string => 'which laws are to be fitted? This one is the plainest',
  whichResponse: (): string =>
    'what is to be described by what? No coefficient was recognised, so the last quantity stands against the first',
  unitAsked: (header: string, unit: string, words: string): string =>
    `${JSON.stringify(header)} may be the ${words}, in which unit? (SI: ${unit})`,
  wrongUnit: (header: string, unit: string): string =>
    `${JSON.stringify(header)}: ${JSON.stringify(unit)} is no unit I know; which one is it?`,
  onlyUnit: (header: string, words: string): string => `is ${JSON.stringify(header)} the ${words}? Only its unit says so`,
  unitFromName: (unit: string): string => `unit ${unit} read from the name: check it`,
  twoColumns: (key: string, header: string, other: string): string =>
    `both ${JSON.stringify(other)} and ${JSON.stringify(header)} look like ${key}: which one is it?`,
  sameHeader: (header: string): string => `${JSON.stringify(header)} stands above more than one column: give each a name of its own`,
  unitsDiffer: (header: string, unit: string, below: string): string =>
    `${JSON.stringify(header)} has the unit ${JSON.stringify(unit)}, and ${JSON.stringify(below)} stands below it: which one is right? Give it once`,
  conditionAsked: (header: string): string =>
    `${JSON.stringify(header)}: at which reference temperature and pressure does this gas volume count?`,
};

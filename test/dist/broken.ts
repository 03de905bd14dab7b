/** One broken study: what differs from a good one, and what the user must be told. */
export interface Broken {
  readonly what: string;
  /** Replaces text in the good study; a function may return a wholly different text. */
  readonly study?: (good: string) => string | Buffer;
  readonly trials?: (good: string) => string | Buffer;
  /** Further files in the folder. */
  readonly files?: Readonly<Record<string, string | Buffer>>;
  /** Exit code; 0 where the fault is a row's and the rest stands. */
  readonly exit: 0 | 2 | 3;
  /** What standard error (exit 2, 3) or the row's reason in trials.csv (exit 0) must match. */
  readonly says: RegExp;
}

export const goodStudy = `pilotlaw: 1
title: Rinse water warmed in a pipe
transfer: heat
equipment: tube
trials:
  file: trials.csv
  trial: run
quantities:
  mass_flow: {column: flow, unit: kg/s, random: 1 %}
  inlet_temperature: {column: "T_in [degC]", random: 0.1 K}
  outlet_temperature: {column: "T_out [degC]", random: 0.1 K}
  wall_temperature: {column: "T_wall [degC]", random: 0.1 K}
  diameter: 20 mm
  length: 2 m
fluid: {name: water, temperature: temperature}
coefficient: {route: log-mean-difference}
groups:
  Re: pipe
  Nu: pipe
laws:
  - Nu = C * Re^a * Pr^0.4
audit: none
`;

const runs = [
  ['r1', 0.05, 20, 45.1, 80],
  ['r2', 0.08, 20, 42.6, 80],
  ['r3', 0.1, 20, 41.8, 80],
  ['r4', 0.14, 20, 40.1, 80],
  ['r5', 0.2, 21, 39.2, 80],
  ['r6', 0.25, 21, 38.4, 80],
  ['r7', 0.3, 22, 38.3, 80],
  ['r8', 0.4, 22, 37.2, 80],
];
export const goodTrials = ['run,flow,T_in [degC],T_out [degC],T_wall [degC]', ...runs.map((run) => run.join(','))].join('\n').concat('\n');

const swap =
  (from: string | RegExp, to: string) =>
  (good: string): string => {
    const changed = good.replace(from, to);
    if (changed === good) throw new Error(`nothing to replace: ${from}`);
    return changed;
  };
const utf16 = (text: string): Buffer => Buffer.concat([Buffer.from([0xff, 0xfe]), Buffer.from(text, 'utf16le')]);

/** Studies that must be refused, and rows that must be. Places are file:line:column. */
export const broken: readonly Broken[] = [
  { what: 'unknown key', study: swap('equipment:', 'equipement:'), exit: 2, says: /study\.yaml:4:\d+.*equipement.*equipment/ },
  { what: 'unknown key deep down', study: swap('random: 1 %', 'randon: 1 %'), exit: 2, says: /study\.yaml:9:\d+.*randon.*random/ },
  { what: 'unknown unit', study: swap('unit: kg/s', 'unit: kgg/s'), exit: 2, says: /study\.yaml:9:\d+.*"kgg\/s"/ },
  { what: 'unit of another dimension', study: swap('unit: kg/s', 'unit: m'), exit: 2, says: /study\.yaml:9:\d+.*mass_flow.*"?m"?.*kg\/s/ },
  { what: 'value of another dimension', study: swap('diameter: 20 mm', 'diameter: 20 s'), exit: 2, says: /study\.yaml:13:\d+.*diameter/ },
  { what: 'value without a unit', study: swap('diameter: 20 mm', 'diameter: 20'), exit: 2, says: /study\.yaml:13:\d+.*diameter.*unit/ },
  { what: 'percentage of a temperature', study: swap('random: 0.1 K', 'random: 1 %'), exit: 2, says: /study\.yaml:10:\d+.*temperature/ },
  { what: 'tab in YAML', study: swap('  file: trials.csv', '\tfile: trials.csv'), exit: 2, says: /study\.yaml:6:\d+.*tab/i },
  { what: 'duplicate key', study: swap('title:', 'title: one\ntitle:'), exit: 2, says: /study\.yaml:3:\d+.*title/ },
  {
    what: 'alias bomb',
    study: (good) =>
      `${good}a: &a [x,x,x,x,x,x,x,x,x]\nb: &b [*a,*a,*a,*a,*a,*a,*a,*a,*a]\nc: &c [*b,*b,*b,*b,*b,*b,*b,*b,*b]\nd: &d [*c,*c,*c,*c,*c,*c,*c,*c,*c]\ne: [*d,*d,*d,*d,*d,*d,*d,*d,*d]\n`,
    exit: 2,
    says: /study\.yaml/,
  },
  {
    what: 'unknown alias',
    study: swap('title: Rinse water warmed in a pipe', 'title: *nowhere'),
    exit: 2,
    says: /study\.yaml:2:\d+.*nowhere/,
  },
  { what: 'wrong format version', study: swap('pilotlaw: 1', 'pilotlaw: 7'), exit: 2, says: /study\.yaml:1:\d+/ },
  { what: 'missing title', study: swap(/title:.*\n/, ''), exit: 2, says: /title/ },
  { what: 'missing laws', study: swap(/laws:\n.*\n/, ''), exit: 2, says: /laws/ },
  { what: 'empty study', study: () => '', exit: 2, says: /study\.yaml/ },
  { what: 'study that is a list', study: () => '- 1\n- 2\n', exit: 2, says: /study\.yaml/ },
  { what: 'binary study', study: () => Buffer.from([0, 1, 2, 255, 254, 0]), exit: 2, says: /study\.yaml/ },
  { what: 'transfer of a third kind', study: swap('transfer: heat', 'transfer: momentum'), exit: 2, says: /study\.yaml:3:\d+.*momentum/ },
  { what: 'unknown equipment', study: swap('equipment: tube', 'equipment: tubes'), exit: 2, says: /study\.yaml:4:\d+.*tubes.*tube/ },
  { what: 'path escape', study: swap('file: trials.csv', 'file: ../trials.csv'), exit: 2, says: /study\.yaml:6:\d+.*\.\.\/trials\.csv/ },
  { what: 'absolute path', study: swap('file: trials.csv', 'file: /etc/hostname'), exit: 2, says: /study\.yaml:6:\d+/ },
  { what: 'missing trial file', study: swap('file: trials.csv', 'file: trails.csv'), exit: 2, says: /study\.yaml:6:\d+.*trails\.csv/ },
  { what: 'column that is not there', study: swap('column: flow', 'column: Flow rate'), exit: 2, says: /study\.yaml:9:\d+.*Flow rate/ },
  { what: 'trial column that is not there', study: swap('trial: run', 'trial: runs'), exit: 2, says: /study\.yaml:7:\d+.*runs.*run/ },
  {
    what: 'unknown route',
    study: swap('route: log-mean-difference', 'route: log-mean-diference'),
    exit: 2,
    says: /study\.yaml:16:\d+.*log-mean-difference/,
  },
  { what: 'unknown basis', study: swap('Re: pipe', 'Re: pype'), exit: 2, says: /study\.yaml:18:\d+.*pype.*pipe/ },
  { what: 'unknown fluid', study: swap('name: water', 'name: watter'), exit: 2, says: /study\.yaml:15:\d+.*watter.*water/ },
  { what: 'misspelt group in a law', study: swap('Pr^0.4', 'Prr^0.4'), exit: 2, says: /study\.yaml:21:\d+.*Prr/ },
  { what: 'two parameters no data can tell apart', study: swap('C * Re^a', 'C * D * Re^a'), exit: 2, says: /study\.yaml:21:\d+.*C.*D/ },
  {
    what: 'law without parameter',
    study: swap('Nu = C * Re^a * Pr^0.4', 'Nu = 0.023 * Re^0.8 * Pr^0.4'),
    exit: 2,
    says: /study\.yaml:21:\d+.*parameter/,
  },
  { what: 'unbalanced law', study: swap('C * Re^a', 'C * (Re^a'), exit: 2, says: /study\.yaml:21:\d+/ },
  { what: 'law with code in it', study: swap('Nu = C * Re^a * Pr^0.4', 'Nu = process.exit(0)'), exit: 2, says: /study\.yaml:21:\d+/ },
  {
    what: 'twenty thousand parentheses',
    study: swap('Nu = C * Re^a * Pr^0.4', `Nu = ${'('.repeat(20000)}C${')'.repeat(20000)}`),
    exit: 2,
    says: /study\.yaml:21:\d+.*40,006 characters/,
  },
  {
    what: 'law of a thousand powers',
    study: swap('Nu = C * Re^a * Pr^0.4', `Nu = C * Re${'^a'.repeat(900)}`),
    exit: 2,
    says: /study\.yaml:21:\d+/,
  },
  {
    what: 'start outside bounds',
    study: swap('- Nu = C * Re^a * Pr^0.4', '- {form: "Nu = C * Re^a * Pr^0.4", start: {a: 2}, bounds: {a: [0, 1]}}'),
    exit: 2,
    says: /study\.yaml:21:\d+.*a/,
  },
  {
    what: 'start of a parameter that is not there',
    study: swap('- Nu = C * Re^a * Pr^0.4', '- {form: "Nu = C * Re^a * Pr^0.4", start: {b: 2}}'),
    exit: 2,
    says: /study\.yaml:21:\d+.*b/,
  },
  { what: 'what a law needs is not measured', study: swap(/ {2}wall_temperature:.*\n/, ''), exit: 2, says: /wall_temperature/ },
  {
    what: 'left-out trial that is not there',
    study: swap('  trial: run\n', '  trial: run\n  leave_out: [{trial: r99, reason: none}]\n'),
    exit: 2,
    says: /study\.yaml:8:\d+.*r99/,
  },
  {
    what: 'leaving out without a reason',
    study: swap('  trial: run\n', '  trial: run\n  leave_out: [{trial: r1}]\n'),
    exit: 2,
    says: /study\.yaml:8:\d+.*reason/,
  },
  {
    what: 'formula with unlike dimensions',
    study: swap('  length: 2 m\n', '  length: 2 m\n  odd: {formula: diameter + mass_flow}\n'),
    exit: 2,
    says: /study\.yaml:15:\d+.*odd/,
  },
  {
    what: 'formula with an unknown name',
    study: swap('  length: 2 m\n', '  length: 2 m\n  odd: {formula: diametr * 2}\n'),
    exit: 2,
    says: /study\.yaml:15:\d+.*diametr.*diameter/,
  },
  {
    what: 'formulas in a circle',
    study: swap('  length: 2 m\n', '  length: 2 m\n  odd: {formula: even * 2}\n  even: {formula: odd / 2}\n'),
    exit: 2,
    says: /study\.yaml:1[56]:\d+.*(odd|even)/,
  },
  {
    what: 'group formula with a dimension',
    study: swap('Re: pipe', 'Re: {formula: diameter * length}'),
    exit: 2,
    says: /study\.yaml:18:\d+.*Re/,
  },
  { what: 'negative uncertainty', study: swap('random: 1 %', 'random: -1 %'), exit: 2, says: /study\.yaml:9:\d+.*-1/ },
  { what: 'confidence of 95', study: (good) => `${good}fit: {confidence: 95}\n`, exit: 2, says: /study\.yaml:23:\d+.*95/ },
  { what: 'too many resamples', study: (good) => `${good}fit: {resamples: 100000000}\n`, exit: 2, says: /study\.yaml:23:\d+/ },
  {
    what: 'unknown correlation',
    study: swap('audit: none', 'audit: {against: [nobody-1900]}'),
    exit: 2,
    says: /study\.yaml:22:\d+.*nobody-1900/,
  },
  {
    what: 'two faults at once',
    study: (good) => swap('Re: pipe', 'Re: pype')(swap('unit: kg/s', 'unit: kgg/s')(good)),
    exit: 2,
    says: /kgg[\s\S]*pype/,
  },
  { what: 'empty table', trials: () => '', exit: 3, says: /trials\.csv/ },
  { what: 'header alone', trials: swap(/\n[\s\S]*/, '\n'), exit: 3, says: /trials\.csv/ },
  { what: 'unclosed quote', trials: swap('r4,', '"r4,'), exit: 3, says: /trials\.csv:5/ },
  { what: 'duplicate column', trials: swap('T_out [degC],T_wall', 'flow,T_wall'), exit: 2, says: /T_out|flow/ },
  { what: 'duplicate trial name', trials: swap('r3,', 'r2,'), exit: 3, says: /trials\.csv:4.*r2/ },
  { what: 'a field of 5 MB', trials: swap('r3,', `${'x'.repeat(5_000_000)},`), exit: 3, says: /trials\.csv:4/ },
  {
    what: 'invalid UTF-8',
    trials: (good) => Buffer.concat([Buffer.from(good), Buffer.from([0xc3, 0x28, 0x2c, 0x31, 0x0a])]),
    exit: 3,
    says: /trials\.csv/,
  },
  {
    what: 'random bytes as a workbook',
    study: swap('file: trials.csv', 'file: trials.xlsx'),
    files: { 'trials.xlsx': Buffer.from([1, 2, 3, 4, 5, 6, 7, 8]) },
    exit: 3,
    says: /trials\.xlsx/,
  },
  { what: 'too few trials', trials: (good) => good.split('\n').slice(0, 3).join('\n').concat('\n'), exit: 3, says: /trial/ },
  {
    what: 'one Reynolds number only',
    trials: (good) => [good.split('\n')[0]!, ...Array.from({ length: 8 }, (_, i) => `r${i},0.2,21,39.2,80`)].join('\n'),
    exit: 3,
    says: /study\.yaml:21:\d+.*cannot tell C, a apart/,
  },
  { what: 'no row that can be used', trials: swap(/,80\n/g, ',n.d.\n'), exit: 3, says: /trials\.csv/ },
  { what: 'ragged row', trials: swap('r3,0.1,20,41.8,80', 'r3,0.1,20,41.8'), exit: 0, says: /4 fields|4 of 5/ },
  { what: 'NUL in a row', trials: swap('r3,', 'r\u00003,'), exit: 0, says: /NUL/ },
  { what: 'spreadsheet error', trials: swap('r3,0.1,', 'r3,#DIV/0!,'), exit: 0, says: /#DIV\/0!/ },
  { what: 'overflow', trials: swap('r3,0.1,', 'r3,1e999,'), exit: 0, says: /1e999/ },
  { what: 'hexadecimal', trials: swap('r3,0.1,', 'r3,0x1F,'), exit: 0, says: /0x1F/ },
  { what: 'thousands separator', trials: swap('r3,0.1,', 'r3,"1,000",'), exit: 0, says: /1,000/ },
  { what: 'below the limit of detection', trials: swap('r3,0.1,', 'r3,<0.01,'), exit: 0, says: /<0\.01/ },
  { what: 'empty cell that is needed', trials: swap('r3,0.1,', 'r3,,'), exit: 0, says: /empty/ },
  { what: 'outlet warmer than the wall', trials: swap('41.8,80', '81,80'), exit: 0, says: /do not have one sign/ },
  { what: 'colder than absolute zero', trials: swap('r3,0.1,20', 'r3,0.1,-300'), exit: 0, says: /-300|zero/ },
  { what: 'formula-like trial name', trials: swap('r3,0.1,20,41.8,80', '"=1+1",0.1,20,,80'), exit: 0, says: /'=1\+1/ },
  { what: 'HTML-like trial name', trials: swap('r3,0.1,20,41.8,80', '<script>alert(1)</script>,0.1,20,,80'), exit: 0, says: /<script>/ },
  { what: 'UTF-16 table', trials: (good) => utf16(swap('r3,0.1,', 'r3,n.d.,')(good)), exit: 0, says: /n\.d\./ },
];

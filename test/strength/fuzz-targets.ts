import { utils, write } from '@e965/xlsx';
import fc from 'fast-check';
import { parseForm } from '../../pipeline/algebra/parse.ts';
import { formText } from '../../pipeline/algebra/print.ts';
import { InputError } from '../../pipeline/base/input-error.ts';
import { parseAmount } from '../../pipeline/quantities/amount.ts';
import { isFault } from '../../pipeline/quantities/fault.ts';
import { parseRange } from '../../pipeline/quantities/range.ts';
import { parseUnit, toSI } from '../../pipeline/quantities/unit.ts';
import { beginStudy } from '../../pipeline/study/begin.ts';
import { parseStudy } from '../../pipeline/study/parse-study.ts';
import { guessColumns } from '../../pipeline/trials/guess-columns.ts';
import { readTable } from '../../pipeline/trials/read-table.ts';
import { goodStudy, goodTrials } from '../dist/broken.ts';

type End = 'read' | 'refused';

/** One kind of input: what is thrown at it, and what must come of it. `run` throws where a promise is broken. */
export interface Target {
  readonly name: string;
  readonly inputs: fc.Arbitrary<string | Uint8Array>;
  readonly run: (input: string | Uint8Array) => End;
}

const must = (holds: boolean, what: string): void => {
  if (!holds) throw new Error(what);
};

/** Words that a kind of text is made of, in any order, with anything between. */
const salad = (words: readonly string[], most: number): fc.Arbitrary<string> =>
  fc
    .array(
      fc.oneof(
        { weight: 12, arbitrary: fc.constantFrom(...words) },
        { weight: 2, arbitrary: fc.string({ maxLength: 6 }) },
        { weight: 1, arbitrary: fc.string({ unit: 'binary', maxLength: 4 }) },
        { weight: 1, arbitrary: fc.double().map(String) },
      ),
      { maxLength: most },
    )
    .map((parts) => parts.join(''));

/** A sound text with some places changed: cut, doubled, replaced. */
const bent = (sound: readonly string[], words: readonly string[]): fc.Arbitrary<string> =>
  fc
    .tuple(
      fc.constantFrom(...sound),
      fc.array(
        fc.tuple(
          fc.double({ min: 0, max: 1, noNaN: true }),
          fc.nat(12),
          fc.oneof(fc.constantFrom(...words), fc.string({ maxLength: 8 }), fc.constant('')),
        ),
        {
          minLength: 1,
          maxLength: 5,
        },
      ),
    )
    .map(([text, changes]) =>
      changes.reduce((all, [share, length, put]) => {
        const at = Math.floor(share * all.length);
        return all.slice(0, at) + put + all.slice(at + length);
      }, text),
    );

/** What throws an InputError must say something, somewhere. */
function refusalOf(read: () => unknown): End {
  try {
    read();
    return 'read';
  } catch (error) {
    if (!(error instanceof InputError)) throw error;
    must(error.messages.length > 0, 'a refusal without a message');
    for (const { code, text, place } of error.messages) {
      must(/^[a-z][a-z0-9-]*$/u.test(code), `the code "${code}"`);
      must(text.trim() !== '' && !/undefined|\[object|NaN/u.test(text.replace(/"[^"]*"/gu, '')), `the text "${text}"`);
      must(place !== undefined && place.file !== '', `no place at "${text}"`);
    }
    return 'refused';
  }
}

const lawWords = [
  ...'()+-*/^=,. ',
  'Re',
  'Pr',
  'Sc',
  'Nu',
  'Sh',
  'C',
  'a',
  'b',
  'n',
  '1/3',
  '0.4',
  '2',
  '1e300',
  '1e-300',
  '0',
  'exp(',
  'ln(',
  'log10(',
  'sqrt(',
  'tanh(',
  'sin(',
  'atan(',
  'min(',
  'max(',
  'abs(',
  'pi',
  'Nu = ',
  'C * Re^a',
  'viscosity_ratio',
  '__proto__',
  'constructor',
  'Re²',
  'α',
  '·',
  '−',
];
const laws = [
  'Nu = C * Re^a * Pr^(1/3)',
  'Sh = 2 + C * Re^a * Sc^(1/3)',
  'Nu = max(3.66, C * Re^a * Pr^0.4)',
  'Nu = ((A * Re^a)^n + (B * Pr^b)^n)^(1/n)',
  'Nu = C * Re^a * exp(-b * Pr) + tanh(d * Re)',
];

const unitWords = [
  'm',
  'kg',
  's',
  'K',
  'degC',
  '°C',
  'Pa',
  'bar',
  'bar(g)',
  'rpm',
  '1/min',
  'L/min',
  'NL/min',
  'Nm3/h',
  'W/(m^2 K)',
  'kcal',
  'BTU',
  'ppm(mass)',
  '%',
  'cP',
  'mPa s',
  '/',
  '*',
  '^',
  '2',
  '-1',
  '²',
  '³',
  '(',
  ')',
  ' ',
  '·',
  'µ',
  'u',
  'k',
  'in',
  'ft',
  'gal',
  'min',
  'h',
  'mol',
  'uS/cm',
  '1',
  'psi(g)',
  'scfm',
  '__proto__',
];
const amounts = [
  '120 mm',
  '1.0e-9 m^2/s',
  '0.5 %',
  '1 % of 50 L/min',
  '400 to 600 rpm',
  '15 degC to 40 degC',
  '-3 K',
  '1,5 bar',
  '997 kg/m^3',
];

const yamlWords = [
  ...'{}[]:,&*!|>-#?%@`"\'',
  '\n',
  '\n  ',
  '\t',
  ': ',
  '- ',
  'pilotlaw: 1',
  'title: x',
  'transfer: heat',
  'trials:',
  'file: t.csv',
  'quantities:',
  'laws:',
  '- Nu = C * Re^a',
  '&a ',
  '*a',
  '<<: *a',
  '!!js/function ',
  'null',
  '~',
  '.nan',
  '.inf',
  '0x1F',
  '1e999',
  '__proto__: ',
  'constructor: ',
  '---\n',
  '...\n',
  'fit: {',
  'bounds: {a: [1, 0]}',
  '"\\u0000"',
  '%YAML 1.2\n',
];
const plantStudy = `${goodStudy.replace('audit: none\n', '')}audit: {against: applicable, tolerance: 20 %}
plant: {file: plant.csv, case: name, conservative: low, target: {heat_rate: 250 kW, driving_difference: 30 K, find: area}}
rig: {mass_flow: [0.1 kg/s, 0.4 kg/s], campaigns: new}
fit: {error: relative, resamples: 200, confidence: 0.9}
`;

const csvWords = [
  ',',
  ';',
  '\t',
  '"',
  '""',
  '\n',
  '\r\n',
  '\r',
  ' ',
  '1',
  '1.5',
  '1,5',
  '-9999',
  'NA',
  '#DIV/0!',
  '=1+1',
  'T [degC]',
  'Re',
  '1e999',
  '0x1F',
  '١',
  '\ufeff',
  '\0',
  'x'.repeat(300),
  '2024-01-01',
  '12:30',
  '1.234,5',
  "'",
  '|',
];

const bytesOf = (text: fc.Arbitrary<string>): fc.Arbitrary<Uint8Array> =>
  fc.oneof(
    { weight: 8, arbitrary: text.map((one) => Buffer.from(one, 'utf8')) },
    { weight: 1, arbitrary: text.map((one) => Buffer.concat([Buffer.from([0xff, 0xfe]), Buffer.from(one, 'utf16le')])) },
    { weight: 1, arbitrary: text.map((one) => Buffer.from(one, 'latin1')) },
    { weight: 1, arbitrary: fc.uint8Array({ maxLength: 300 }) },
  );

const workbookOf = (rows: readonly (readonly unknown[])[], compression: boolean): Uint8Array => {
  const book = utils.book_new();
  utils.book_append_sheet(book, utils.aoa_to_sheet(rows as unknown[][]), 'Trials');
  return new Uint8Array(write(book, { type: 'array', bookType: 'xlsx', compression }) as ArrayBuffer);
};
const sheet = [
  ['run', 'flow [kg/s]', 'T [degC]'],
  ['r1', 0.05, 20.5],
  ['r2', 0.08, '21'],
  ['r3', true, null],
];
const workbooks = [workbookOf(sheet, true), workbookOf(sheet, false)];

/** A sound workbook with bytes changed, cut or doubled: in what is stored plainly this reaches the XML behind the archive. */
const bentWorkbook: fc.Arbitrary<Uint8Array> = fc
  .tuple(
    fc.constantFrom(...workbooks),
    fc.array(
      fc.tuple(
        fc.double({ min: 0, max: 1, noNaN: true }),
        fc.oneof(
          fc.uint8Array({ maxLength: 4 }),
          fc.constantFrom(
            ...['<c', '</', 'A1', 'XFD1048576', '"', '&#0;', '999999999', 't="s"'].map((word) => new Uint8Array(Buffer.from(word))),
          ),
        ),
      ),
      { maxLength: 6 },
    ),
    fc.oneof({ weight: 9, arbitrary: fc.constant(1) }, { weight: 1, arbitrary: fc.double({ min: 0, max: 1, noNaN: true }) }),
  )
  .map(([sound, changes, share]) => {
    const bytes = new Uint8Array(sound);
    for (const [at, put] of changes) bytes.set(put, Math.max(0, Math.floor(at * (bytes.length - put.length))));
    return bytes.subarray(0, Math.ceil(share * bytes.length));
  });

function table(bytes: Uint8Array, file: string): End {
  return refusalOf(() => {
    const read = readTable(Buffer.from(bytes), { file });
    must(
      read.rows.every(({ cells }) => cells.length === read.header.length),
      'a row of another width than the header',
    );
    const begun = beginStudy(guessColumns(read));
    must(begun.yaml.startsWith('#'), 'a study without its first line');
    parseStudy(begun.yaml, 'study.yaml');
  });
}

export const targets: readonly Target[] = [
  {
    name: 'law text',
    inputs: fc.oneof(
      salad(lawWords, 40),
      salad(lawWords, 8).map((right) => `Nu = ${right}`),
      bent(laws, lawWords),
      fc.string({ unit: 'binary', maxLength: 80 }),
    ),
    run: (input) => {
      const parsed = parseForm(String(input), { known: ['Re', 'Pr', 'Sc', 'Nu', 'Sh', 'viscosity_ratio'], needsParameter: true });
      if ('faults' in parsed) {
        must(parsed.faults.length > 0, 'refused without a fault');
        for (const { text, at } of parsed.faults)
          must(text.trim() !== '' && at >= 0 && at <= String(input).length, `a fault at ${at}: ${text}`);
        return 'refused';
      }
      must(parsed.form.constants.length > 0, 'a law without a parameter');
      const again = parseForm(formText(parsed.form), {
        known: ['Re', 'Pr', 'Sc', 'Nu', 'Sh', 'viscosity_ratio'],
        parameters: parsed.form.constants,
        needsParameter: true,
      });
      must('form' in again, `printed as "${formText(parsed.form)}", which is refused`);
      return 'read';
    },
  },
  {
    name: 'units and amounts',
    inputs: fc.oneof(salad(unitWords, 10), bent(amounts, unitWords), fc.string({ unit: 'binary', maxLength: 30 })),
    run: (input) => {
      const text = String(input);
      const unit = parseUnit(text);
      for (const one of [unit, parseAmount(text), parseRange(text)])
        if (isFault(one)) must(one.text.trim() !== '', 'a fault without a text');
      if (isFault(unit)) return 'refused';
      must(Number.isFinite(toSI(1, unit)), `1 ${text} is ${toSI(1, unit)}`);
      return 'read';
    },
  },
  {
    name: 'study file',
    inputs: fc.oneof(salad(yamlWords, 40), bent([goodStudy, plantStudy], yamlWords), fc.string({ unit: 'binary', maxLength: 120 })),
    run: (input) => refusalOf(() => parseStudy(String(input), 'study.yaml')),
  },
  {
    name: 'text table',
    inputs: bytesOf(fc.oneof(salad(csvWords, 60), bent([goodTrials, goodTrials.replaceAll('.', ',').replaceAll(',T', ';T')], csvWords))),
    run: (input) => table(input as Uint8Array, 'trials.csv'),
  },
  { name: 'workbook', inputs: bentWorkbook, run: (input) => table(input as Uint8Array, 'trials.xlsx') },
];

import { placed, type Sample, workbook } from './sample.ts';

/** Tables as rigs, loggers and worksheets print them: invented, each with one habit of the trade (common practice, no source). Every value is checked in SI; nothing may come out wrong. */
export interface Case extends Sample {
  readonly rows: readonly (readonly [string, ...number[]])[];
  /** Parts of `line: reason`, one per row not used. */
  readonly out?: readonly string[];
  readonly notes?: readonly string[];
  readonly faults?: readonly string[];
}

const speed = { rotation_speed: 'N' } as const;
const run = { trials: { trial: placed('run') } } as const;

export const right: readonly Case[] = [
  {
    says: 'comma and points, units in square brackets',
    text: 'run,N [rpm],T [degC]\nR1,300,25.0\nR2,600,60\n',
    read: { rotation_speed: 'N', temperature: 'T' },
    ...run,
    rows: [
      ['R1', 5, 298.15],
      ['R2', 10, 333.15],
    ],
  },
  {
    says: 'German: semicolons and decimal commas',
    text: 'run;N [1/min];T [°C]\nR1;300;25,0\nR2;600,5;60,25\n',
    read: { rotation_speed: 'N', temperature: 'T' },
    ...run,
    rows: [
      ['R1', 5, 298.15],
      ['R2', 600.5 / 60, 333.4],
    ],
    notes: ['decimal-comma'],
  },
  {
    says: 'tabs and decimal commas',
    file: 'trials.tsv',
    text: 'run\tN (U/min)\nR1\t300,0\nR2\t90,5\n',
    read: speed,
    ...run,
    rows: [
      ['R1', 5],
      ['R2', 90.5 / 60],
    ],
    notes: ['decimal-comma'],
  },
  {
    says: 'semicolons and points',
    text: 'run;N [rpm]\nR1;300.0\nR2;90.6\n',
    read: speed,
    ...run,
    rows: [
      ['R1', 5],
      ['R2', 1.51],
    ],
  },
  {
    says: 'a byte-order mark and Windows line ends',
    bytes: Buffer.from('\uFEFFrun,N [rpm]\r\nR1,300\r\n'),
    read: speed,
    ...run,
    rows: [['R1', 5]],
  },
  {
    says: 'UTF-16 as a logger exports it',
    file: 'trials.txt',
    bytes: Buffer.from('\uFEFFrun\tT [°C]\r\nR1\t20,5\r\n', 'utf16le'),
    read: { temperature: 'T' },
    ...run,
    rows: [['R1', 293.65]],
    notes: ['decimal-comma'],
  },
  {
    says: 'quantity divided by unit (ISO 80000)',
    text: 'run,ṁ / kg h⁻¹,T/°C\nR1,3600,20\n',
    read: { mass_flow: 'ṁ', temperature: 'T' },
    ...run,
    rows: [['R1', 1, 293.15]],
  },
  {
    says: 'units in round brackets',
    text: 'run,Flow (L/min),T_in [°C]\nR1,60,20\n',
    read: { volume_flow: 'Flow', inlet_temperature: 'T_in' },
    ...run,
    rows: [['R1', 1e-3, 293.15]],
  },
  {
    says: 'a unit after the name',
    text: 'run,p bar(g),dp mbar\nR1,2,15\n',
    read: { pressure: 'p', own_drop: 'dp' },
    ...run,
    rows: [['R1', 2e5, 1500]],
  },
  {
    says: 'the whole header as the column',
    text: 'run,N [rpm],N [1/s]\nR1,300,7\n',
    read: { rotation_speed: 'N [1/s]' },
    ...run,
    rows: [['R1', 7]],
  },
  {
    says: 'a units row',
    text: 'run,N,T,d\n,rpm,°C,mm\nR1,300,20,5\n',
    read: { rotation_speed: 'N', temperature: 'T', diameter: 'd' },
    ...run,
    rows: [['R1', 5, 293.15, 0.005]],
  },
  {
    says: 'a units row in brackets with dashes',
    text: 'run;eps;T;h\n[-];[-];[°C];[W/m²K]\nR1;0,4;20,0;500\n',
    read: { voidage: 'eps', temperature: 'T', heat_transfer_coefficient: 'h' },
    ...run,
    rows: [['R1', 0.4, 293.15, 500]],
    notes: ['decimal-comma'],
  },
  {
    says: 'a title row above the header',
    text: 'Pilot trials, vessel 60 L, May\nrun,N [rpm],T [degC]\nR1,300,20\n',
    read: { rotation_speed: 'N', temperature: 'T' },
    ...run,
    rows: [['R1', 5, 293.15]],
    notes: ['title-rows'],
  },
  {
    says: 'a block of remarks above the header',
    text: 'Operator;A. Muster;;\nSensor;TT-1;;\n\nrun;N [rpm];T [°C];d [mm]\nR1;300;20,5;3,0\n',
    read: { rotation_speed: 'N', temperature: 'T', diameter: 'd' },
    ...run,
    rows: [['R1', 5, 293.65, 0.003]],
    notes: ['title-rows', 'decimal-comma'],
  },
  {
    says: 'blank lines between the rows',
    text: 'run,N [rpm]\n\nR1,300\n\n,\nR2,600\n',
    read: speed,
    ...run,
    rows: [
      ['R1', 5],
      ['R2', 10],
    ],
  },
  {
    says: 'quoted cells with commas and line breaks in them',
    text: 'run,remark,"N\n[rpm]"\n"R1, again","foam\nsettled",300\n',
    read: speed,
    ...run,
    rows: [['R1, again', 5]],
  },
  {
    says: 'exponents, signs and bare points',
    text: 'run,D [m2/s]\nR1,1.2e-9\nR2,+1.1E-09\nR3,.9e-9\n',
    read: { diffusivity: 'D' },
    ...run,
    rows: [
      ['R1', 1.2e-9],
      ['R2', 1.1e-9],
      ['R3', 0.9e-9],
    ],
  },
  { says: 'a power of ten in the unit', text: 'run,D [10⁻⁹ m²/s]\nR1,0.92\n', read: { diffusivity: 'D' }, ...run, rows: [['R1', 0.92e-9]] },
  {
    says: 'declared marks of missing values',
    text: 'run,N [rpm],T [degC]\nR1,300,NA\nR2,-9999.0,20\nR3,600,21\n',
    read: { rotation_speed: 'N', temperature: 'T' },
    trials: { trial: placed('run'), missing: ['NA', '-9999'] },
    rows: [['R3', 10, 294.15]],
    out: ['2: "T [degC]" is missing ("NA")', '3: "N [rpm]" is missing'],
  },
  {
    says: 'below the detection limit, not determined, and an error of the worksheet',
    text: 'run,c [g/L]\nR1,<0.01\nR2,n.d.\nR3,#DIV/0!\nR4,0.5\n',
    read: { bulk_concentration: 'c' },
    ...run,
    rows: [['R4', 0.5]],
    out: [
      '2: "c [g/L]": "<0.01" is no decimal number: it tells a limit',
      '3: "c [g/L]": "n.d." is no decimal number: it is text',
      '4: "c [g/L]": "#DIV/0!" is no decimal number: it is a worksheet\'s error',
    ],
  },
  {
    says: 'thousands separators are never guessed',
    text: 'run,Re\nR1,"1,234"\nR2,1234\n',
    read: { own_number: ['Re', '1'] },
    ...run,
    rows: [['R2', 1234]],
    out: ['2: "Re": "1,234"'],
  },
  {
    says: '1,234 alone with semicolons proves no decimal comma',
    text: 'run;Re\nR1;1,234\nR2;5,678\n',
    read: { own_number: ['Re', '1'] },
    ...run,
    rows: [],
    out: ['2: "Re": "1,234"', '3: "Re": "5,678"'],
  },
  {
    says: '1,234 beside 0,5 is a decimal',
    text: 'run;Re\nR1;1,234\nR2;0,5\n',
    read: { own_number: ['Re', '1'] },
    ...run,
    rows: [
      ['R1', 1.234],
      ['R2', 0.5],
    ],
    notes: ['decimal-comma'],
  },
  {
    says: 'a point among decimal commas',
    text: 'run;T [°C]\nR1;20,5\nR2;21,5\nR3;1.234\n',
    read: { temperature: 'T' },
    ...run,
    rows: [
      ['R1', 293.65],
      ['R2', 294.65],
    ],
    out: ['4: "T [°C]": "1.234"'],
    notes: ['decimal-comma'],
  },
  {
    says: 'a decimal comma in a file separated by commas makes a row too long',
    text: 'run,T [degC]\nR1,20,5\nR2,21\n',
    read: { temperature: 'T' },
    ...run,
    rows: [['R2', 294.15]],
    out: ['2: 3 fields, the header has 2'],
  },
  {
    says: 'a row cut short',
    text: 'run,N [rpm],T [degC]\nR1,300\nR2,300,20\n',
    read: { rotation_speed: 'N', temperature: 'T' },
    ...run,
    rows: [['R2', 5, 293.15]],
    out: ['2: 2 fields, the header has 3'],
  },
  {
    says: 'units beside the numbers',
    text: 'run,d [mm]\nR1,5 mm\nR2,5\n',
    read: { diameter: 'd' },
    ...run,
    rows: [['R2', 0.005]],
    out: ['2: "d [mm]": "5 mm" is no decimal number: a unit belongs into the header'],
  },
  {
    says: 'dates and times of day in a column of numbers',
    text: 'run,t [s]\nR1,12:30\nR2,2024-05-01\nR3,30\n',
    read: { time: 't' },
    ...run,
    rows: [['R3', 30]],
    out: ['2: "t [s]": "12:30" is no decimal number: it is a date', '3: "t [s]": "2024-05-01"'],
  },
  {
    says: 'hexadecimal, infinity and overflow',
    text: 'run,x\nR1,0x1F\nR2,inf\nR3,1e999\nR4,NaN\nR5,7\n',
    read: { own_number: ['x', '1'] },
    ...run,
    rows: [['R5', 7]],
    out: [
      '2: "x": "0x1F" is no decimal number: hexadecimal',
      '3: "x": "inf" is no decimal number: only finite',
      '4: "x": "1e999" is too large',
      '5: "x": "NaN"',
    ],
  },
  {
    says: 'degrees Fahrenheit and US gallons',
    text: 'run,T (F),flow (gpm)\nR1,212,10\n',
    read: { temperature: 'T', volume_flow: 'flow' },
    ...run,
    rows: [['R1', 373.15, 10 * 6.30901964e-5]],
  },
  {
    says: 'a temperature below absolute zero',
    text: 'run,T [degC]\nR1,-999\nR2,20\n',
    read: { temperature: 'T' },
    ...run,
    rows: [['R2', 293.15]],
    out: ['2: "T [degC]": "-999" lies at or below absolute zero'],
  },
  {
    says: 'three readings of a trial, one of them broken',
    text: 'run,N [rpm]\nR1,300\nR1,306\nR1,x\nR2,600\n',
    read: speed,
    trials: { trial: placed('run'), readings: placed('average') },
    rows: [
      ['R1', 5.05],
      ['R2', 10],
    ],
    out: ['4: "N [rpm]": "x"'],
  },
  {
    says: 'rows left out by name',
    text: 'run,N [rpm]\nR1,300\nR2,600\n',
    read: speed,
    trials: { trial: placed('run'), leaveOut: [{ trial: placed('R1'), reason: 'baffle came loose' }] },
    rows: [['R2', 10]],
    out: ['2: baffle came loose'],
  },
  {
    says: 'no trial column: rows are numbered',
    text: 'N [rpm]\n300\nx\n600\n',
    read: speed,
    rows: [
      ['1', 5],
      ['3', 10],
    ],
    out: ['3: "N [rpm]": "x"'],
  },
  {
    says: 'a NUL in a row',
    text: 'run,N [rpm]\nR1,3\u000000\nR2,600\n',
    read: speed,
    ...run,
    rows: [['R2', 10]],
    out: ['2: the row holds a NUL'],
  },
  {
    says: 'a workbook with a merged title and numbers as they are stored',
    file: 'trials.xlsx',
    bytes: workbook([['Trials in the 60 L vessel'], ['run', 'N [rpm]', 'c [g/L]'], ['R1', 300, 1e-7], ['R2', 90.6, 0.1]], (sheet) => {
      sheet['!merges'] = [{ s: { r: 0, c: 0 }, e: { r: 0, c: 2 } }];
    }),
    read: { rotation_speed: 'N', bulk_concentration: 'c' },
    ...run,
    rows: [
      ['R1', 5, 1e-7],
      ['R2', 1.51, 0.1],
    ],
    notes: ['title-rows'],
  },
  {
    says: 'a workbook with a campaign merged downwards and a hidden row',
    file: 'trials.xlsx',
    bytes: workbook(
      [
        ['week', 'run', 'N [rpm]'],
        ['A', 'R1', 300],
        [undefined, 'R2', 600],
        ['B', 'R3', 60],
      ],
      (sheet) => {
        sheet['!merges'] = [{ s: { r: 1, c: 0 }, e: { r: 2, c: 0 } }];
        sheet['!rows'] = [{}, {}, {}, { hidden: true }];
      },
    ),
    read: speed,
    trials: { trial: placed('run'), campaign: placed('week') },
    rows: [
      ['R1', 5],
      ['R2', 10],
      ['R3', 1],
    ],
    notes: ['merged-cells', 'hidden-rows'],
  },
  {
    says: 'a workbook with a date, a percentage, an error, a text number and a truth value among numbers',
    file: 'trials.xlsx',
    bytes: workbook([
      ['run', 'eps [%]'],
      ['R1', new Date(Date.UTC(2024, 4, 1))],
      ['R2', { t: 'n', v: 0.05, z: '0.0%' }],
      ['R3', { t: 'e', v: 7 }],
      ['R4', '0,4'],
      ['R5', true],
      ['R6', 40],
    ]),
    read: { voidage: 'eps' },
    ...run,
    rows: [['R6', 0.4]],
    out: [
      '2: "eps [%]": "2024-05-01" is no decimal number: it is a date',
      '3: "eps [%]": "5.0%" is no decimal number: a % sign',
      '4: "eps [%]": "#DIV/0!"',
      '5: "eps [%]": "0,4"',
      '6: "eps [%]": "TRUE"',
    ],
  },
  {
    says: 'a workbook whose formula has no stored value',
    file: 'trials.xlsx',
    bytes: workbook([
      ['run', 'N [rpm]'],
      ['R1', { t: 'n', f: '2*150' }],
      ['R2', { t: 'n', f: '2*300', v: 600 }],
    ]),
    read: speed,
    ...run,
    rows: [['R2', 10]],
    out: ['2: "N [rpm]": '],
  },
  {
    says: 'a named sheet of several',
    file: 'trials.xlsx',
    sheet: 'Trials',
    bytes: workbook(
      [
        ['run', 'N [rpm]'],
        ['R1', 300],
      ],
      (_, book) => {
        book.SheetNames.push('Notes');
        book.Sheets.Notes = { A1: { t: 's', v: 'x' }, '!ref': 'A1' };
      },
    ),
    read: speed,
    ...run,
    rows: [['R1', 5]],
  },
];

/** Tables whose column or unit is refused before a row is read. */
export const refused: readonly Case[] = [
  { says: 'a unit with a slip of the pen', text: 'run,N [rmp]\nR1,300\n', read: speed, ...run, rows: [], faults: ['did you mean "rpm"?'] },
  {
    says: 'a unit of another dimension',
    text: 'run,N [kg/h]\nR1,300\n',
    read: speed,
    ...run,
    rows: [],
    faults: ['no unit of rotation_speed'],
  },
  {
    says: 'ppm of nobody knows what',
    text: 'run,x [ppm]\nR1,300\n',
    read: { mass_fraction: 'x' },
    ...run,
    rows: [],
    faults: ['ppm(mass) or ppm(volume)'],
  },
  {
    says: 'a normal volume without its condition',
    text: 'run,Q [NL/min]\nR1,30\n',
    read: { volume_flow: 'Q' },
    ...run,
    rows: [],
    faults: ['0 degC, 101.325 kPa'],
  },
  {
    says: 'no such column',
    text: 'run,Nrpm [rpm]\nR1,300\n',
    read: speed,
    ...run,
    rows: [],
    faults: ['the columns are "run", "Nrpm [rpm]"'],
  },
  {
    says: 'two columns of one name',
    text: 'run,N [rpm],N [rpm]\nR1,300,310\n',
    read: speed,
    ...run,
    rows: [],
    faults: ['may mean 2 columns'],
  },
  {
    says: 'header and units row contradict',
    text: 'run,N [rpm],T\n,1/s,°C\nR1,300,20\n',
    read: speed,
    ...run,
    rows: [],
    faults: ['"rpm" in its header and "1/s" below it'],
  },
  {
    says: 'fields separated by bars',
    text: 'run | N [rpm]\nR1 | 300\n',
    read: speed,
    rows: [],
    faults: ['the columns are'],
    notes: ['one-column'],
  },
];

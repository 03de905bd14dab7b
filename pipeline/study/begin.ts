import { says } from '../base/says/begin.ts';

/** What a column of a table seems to be. */
export interface ColumnGuess {
  /** Header as it stands in the table. */
  readonly header: string;
  readonly is: 'trial' | 'campaign' | 'order' | 'quantity' | 'group' | 'number' | 'text';
  /** Name of the quantity or group. */
  readonly key?: string;
  /** To be written beside the column, where the header itself does not tell it. */
  readonly unit?: string;
  /** What must be settled before the guess may be used; its line is then written as a comment. */
  readonly question?: string;
  /** A number without a unit, so that it may stand in a law as it is. */
  readonly unitless?: true;
  /** Said beside a guess that is used. */
  readonly remark?: string;
}

/** A table as guessed. */
export interface BeginInput {
  /** Path of the table from the study file. */
  readonly file: string;
  readonly sheet?: string;
  readonly columns: readonly ColumnGuess[];
  /** Some trial names stand in more than one row. */
  readonly repeated: boolean;
  /** Texts in columns of numbers that look like marks of missing values. */
  readonly marks: readonly string[];
}

export interface Begun {
  /** A study file with comments; it parses, whatever the table. */
  readonly yaml: string;
  /** What the user must settle, in the order of the file. */
  readonly questions: readonly string[];
}

/** Plain text in double quotes, which YAML reads as JSON does. */
const quoted = (text: string): string => JSON.stringify(text);

/** A commented study file from guesses: guesses in doubt stand as comments with their question. */
export function beginStudy(input: BeginInput): Begun {
  const draft = new Draft();
  const keys = new Set(input.columns.flatMap(({ key, question }) => (key !== undefined && question === undefined ? [key] : [])));
  head(draft, input, keys);
  trials(draft, input);
  quantities(draft, input);
  const route = routeOf(keys);
  reduction(draft, route, keys);
  laws(draft, input, route, keys);
  return { yaml: `${draft.lines.join('\n')}\n`, questions: draft.questions };
}

class Draft {
  readonly lines: string[] = [];
  readonly questions: string[] = [];

  add(...lines: readonly string[]): void {
    this.lines.push(...lines);
  }

  ask(question: string, suggestion?: string): void {
    this.questions.push(question);
    this.lines.push(`# ${says.question(question)}`);
    if (suggestion !== undefined) this.lines.push(`#${suggestion}`);
  }
}

const transferOf = (keys: ReadonlySet<string>): 'heat' | 'mass' | undefined => {
  const some = (...names: readonly string[]): boolean => names.some((name) => keys.has(name));
  if (
    some(
      'mass_loss',
      'mass_rate',
      'saturation_concentration',
      'limiting_current',
      'volumetric_coefficient',
      'mass_transfer_coefficient',
      'Sh',
    )
  )
    return 'mass';
  if (
    some(
      'wall_temperature',
      'heat_rate',
      'heat_transfer_coefficient',
      'overall_coefficient',
      'outlet_temperature',
      'final_temperature',
      'Nu',
    )
  )
    return 'heat';
  return some('inlet_concentration', 'outlet_concentration') ? 'mass' : undefined;
};

function head(draft: Draft, { file }: BeginInput, keys: ReadonlySet<string>): void {
  const transfer = transferOf(keys);
  draft.add(`# ${says.firstGuess(file)}`, 'pilotlaw: 1', `title: ${quoted(says.title(file))}`);
  if (transfer === undefined) draft.ask(says.whichTransfer());
  draft.add(`transfer: ${transfer ?? 'heat'}`);
  draft.ask(says.whichEquipment());
  draft.add('equipment: other', '');
}

function trials(draft: Draft, { file, sheet, columns, repeated, marks }: BeginInput): void {
  draft.add('trials:', `  file: ${quoted(file)}`);
  if (sheet !== undefined) draft.add(`  sheet: ${quoted(sheet)}`);
  for (const is of ['trial', 'campaign', 'order'] as const) {
    const found = columns.find((column) => column.is === is);
    if (found !== undefined) draft.add(`  ${is}: ${quoted(found.header)}`);
  }
  if (repeated) {
    draft.add('  readings: average');
    draft.ask(says.areReadings());
  }
  if (marks.length > 0) {
    draft.ask(says.areMarks(marks));
    draft.add(`  missing: [${marks.map(quoted).join(', ')}]`);
  }
  draft.add('');
}

function quantities(draft: Draft, { columns }: BeginInput): void {
  const found = columns.filter(({ is }) => is === 'quantity');
  draft.add(`# ${says.uncertainties()}`, found.some(({ question }) => question === undefined) ? 'quantities:' : '# quantities:');
  for (const column of found) {
    const line = `  ${column.key}: {column: ${quoted(column.header)}${column.unit === undefined ? '' : `, unit: ${quoted(column.unit)}`}}`;
    if (column.question !== undefined) draft.ask(column.question, line);
    else draft.add(column.remark === undefined ? line : `${line} # ${column.remark}`);
  }
  if (found.some(({ key, question }) => question === undefined && key!.endsWith('_other'))) draft.ask(says.whichStreams());
  for (const { header, is } of columns) if (is === 'number' || is === 'text') draft.add(`# ${says.notUsed(header)}`);
  draft.add('');
}

interface RouteGuess {
  readonly name: string;
  /** What the route needs beside the columns. */
  readonly lacks: readonly string[];
  /** Settings with the question they leave. */
  readonly setting?: string;
}

/** Routes by the columns that mark them, the most telling first; then what else they need. */
const routes: readonly {
  readonly name: string;
  readonly marks: readonly string[];
  readonly needs: readonly string[];
  readonly setting?: string;
}[] = [
  {
    name: 'log-mean-difference',
    marks: ['inlet_temperature', 'outlet_temperature', 'inlet_temperature_other', 'outlet_temperature_other'],
    needs: ['area'],
    setting: 'arrangement: counter',
  },
  {
    name: 'pellet-dissolution',
    marks: ['mass_loss', 'initial_mass', 'time'],
    needs: ['particle_diameter', 'solid_density', 'saturation_concentration'],
  },
  { name: 'limiting-current', marks: ['limiting_current'], needs: ['area', 'electrons', 'bulk_concentration'] },
  { name: 'log-mean-difference', marks: ['inlet_temperature', 'outlet_temperature', 'wall_temperature'], needs: ['diameter', 'length'] },
  {
    name: 'log-mean-concentration',
    marks: ['inlet_concentration', 'outlet_concentration', 'saturation_concentration'],
    needs: ['diameter', 'length'],
  },
  {
    name: 'sphere-cooling',
    marks: ['initial_temperature', 'final_temperature', 'time'],
    needs: ['diameter', 'solid_density', 'solid_heat_capacity', 'solid_conductivity'],
  },
  { name: 'heat-rate', marks: ['heat_rate', 'wall_temperature'], needs: ['area', 'temperature'] },
  { name: 'measured', marks: ['heat_transfer_coefficient'], needs: [] },
  { name: 'measured', marks: ['mass_transfer_coefficient'], needs: [] },
  { name: 'measured', marks: ['volumetric_coefficient'], needs: [] },
];

function routeOf(keys: ReadonlySet<string>): RouteGuess | undefined {
  const found = routes.find(({ marks }) => marks.every((mark) => keys.has(mark)));
  return found === undefined
    ? undefined
    : { name: found.name, lacks: found.needs.filter((need) => !keys.has(need)), setting: found.setting };
}

function reduction(draft: Draft, route: RouteGuess | undefined, keys: ReadonlySet<string>): void {
  if (keys.has('Nu') || keys.has('Sh')) return;
  if (route === undefined) draft.ask(says.whichRoute(), 'coefficient: {route: log-mean-difference}');
  else draft.add(`coefficient: {route: ${route.name}${route.setting === undefined ? '' : `, ${route.setting}`}}`);
  if (route?.setting !== undefined) draft.ask(says.whichArrangement());
  if (route !== undefined && route.lacks.length > 0) draft.ask(says.routeLacks(route.name, route.lacks));
  const two = [...keys].some((key) => key.endsWith('_other'));
  draft.ask(
    says.whichFluid(),
    two
      ? 'fluid: {own: {name: water, temperature: temperature}, other: {name: water, temperature: temperature_other}}'
      : 'fluid: {name: water, temperature: temperature}',
  );
  draft.add('');
}

function laws(draft: Draft, { columns }: BeginInput, route: RouteGuess | undefined, keys: ReadonlySet<string>): void {
  const given = columns.filter(({ is, question }) => is === 'group' && question === undefined);
  const response = given.find(({ key }) => /^(?:Nu|Sh)/u.test(key!))?.key ?? responseOf(route, keys);
  const others = given.filter(({ key }) => key !== response);
  if (response !== undefined && given.length > 0) {
    draft.add('groups:', ...given.map(({ key, header }) => `  ${key}: {column: ${quoted(header)}}`), '');
    write(
      draft,
      response,
      others.map(({ key }) => key!),
    );
  } else if (response !== undefined && /^(?:Nu|Sh)$/u.test(response)) dimensionless(draft, response, keys);
  else if (response !== undefined)
    write(
      draft,
      response,
      drivers(columns)
        .filter((key) => key !== response)
        .slice(0, 2),
    );
  else plainNumbers(draft, columns);
}

const responseOf = (route: RouteGuess | undefined, keys: ReadonlySet<string>): string | undefined => {
  if (route === undefined) return undefined;
  const measured = ['heat_transfer_coefficient', 'mass_transfer_coefficient', 'volumetric_coefficient'].find((key) => keys.has(key));
  if (route.name === 'measured') return measured;
  if (route.setting !== undefined) return 'overall_coefficient';
  return transferOf(keys) === 'mass' ? 'Sh' : 'Nu';
};

function dimensionless(draft: Draft, response: string, keys: ReadonlySet<string>): void {
  const basis = keys.has('rotation_speed') ? 'impeller' : keys.has('particle_diameter') ? 'particle' : 'pipe';
  draft.ask(says.whichBasis());
  draft.add('groups:', `  Re: ${basis}`, `  ${response}: ${keys.has('particle_diameter') ? 'particle' : basis}`, '');
  draft.add('laws:', `  - ${quoted(`${response} = C * Re^a * ${response === 'Nu' ? 'Pr' : 'Sc'}^(1/3)`)}`);
}

/** Quantities that a coefficient may depend on. */
const drivers = (columns: readonly ColumnGuess[]): readonly string[] =>
  columns.flatMap(({ is, key, question }) =>
    is === 'quantity' && question === undefined && /velocity|flow|speed|power|diameter|depth/u.test(key!) ? [key!] : [],
  );

function write(draft: Draft, response: string, groups: readonly string[]): void {
  draft.ask(says.whichLaw());
  draft.add('laws:', `  - ${quoted(`${response} = C${groups.map((group, k) => ` * ${group}^${'abdegh'[k] ?? `x${k}`}`).join('')}`)}`);
}

/** No coefficient to be seen: the last of what may stand in a law against the first, as a start. */
function plainNumbers(draft: Draft, columns: readonly ColumnGuess[]): void {
  const named = columns.flatMap(({ header, is, key, question, unitless }, k): readonly { name: string; header?: string }[] => {
    if (unitless === true) return [{ name: `column_${k + 1}`, header }];
    if (question !== undefined || key === undefined) return [];
    return is === 'quantity' ? [{ name: key }] : [{ name: key, header }];
  });
  draft.ask(says.whichResponse());
  if (named.length === 0) {
    draft.add('laws:', '  - "Nu = C * Re^a"');
    return;
  }
  const groups = named.flatMap(({ name, header }) => (header === undefined ? [] : [`  ${name}: {column: ${quoted(header)}}`]));
  if (groups.length > 0) draft.add('groups:', ...groups, '');
  const response = named.at(-1)!.name;
  draft.add('laws:', `  - ${quoted(`${response} = C${named.length > 1 ? ` * ${named[0]!.name}^a` : ''}`)}`);
}

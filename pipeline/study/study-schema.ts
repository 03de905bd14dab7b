import { z } from 'zod';
import type { Family } from '../../correlations/correlation.ts';
import { says } from '../base/says/study.ts';
import { choice, either, fields, list, named, number, share, text, truth, whole, word } from './schema-parts.ts';

/** The families of published correlations that `equipment` may name. */
export const families = [
  'tube',
  'annulus',
  'coil',
  'plate',
  'cylinder',
  'tube-bank',
  'sphere',
  'natural-convection',
  'packed-bed',
  'fluidised-bed',
  'bed-wall',
  'vessel',
  'suspended-solids',
  'gas-liquid',
  'wetted-wall',
  'packed-column',
  'rotating',
  'membrane',
  'plate-exchanger',
  'impinging-jet',
  'layer',
  'other',
] as const satisfies readonly Family[];

const column = text('the name of a column of the table');
const spread = text('a standard uncertainty: 0.5 % or a value with its unit');

const quantityFields = fields(
  {
    column: column.optional(),
    value: text('a value with its unit, such as 120 mm').optional(),
    formula: text('a formula in quantities, such as pi * rotation_speed * impeller_diameter').optional(),
    unit: text('a unit, such as rpm').optional(),
    random: spread.optional(),
    systematic: spread.optional(),
    accuracy: text('a limit of error: 0.5 K or 1 % of 50 L/min').optional(),
    expanded: text('an expanded uncertainty, such as 0.2 K').optional(),
    k: number('a coverage factor above zero, such as 2', { from: 1e-6, to: 100 }).optional(),
    per: choice(['study', 'campaign'], 'whether a systematic shift is one for the study or one for each campaign').optional(),
    instrument: text('the name of the instrument; quantities with the same name share one shift').optional(),
    kind: choice(['reading', 'set'], 'a reading, or a set point about which the truth scatters').optional(),
  },
  'a value such as 120 mm, or a map with column, value or formula',
);
const quantity = either(text('a value with its unit'), quantityFields, 'a value such as 120 mm, or a map with column, value or formula');

const quantities = named(quantity, 'quantities by name');

const holder = text('the quantity that holds it, such as inlet_temperature');
const oneFluid = fields(
  {
    name: word('the name of a fluid').optional(),
    table: word('a file with properties').optional(),
    by: list(word('a column of the table of properties'), 'the one or two quantities that the table runs over', 2, 1).optional(),
    temperature: holder.optional(),
    pressure: holder.optional(),
    mass_fraction: holder.optional(),
    relative_humidity: holder.optional(),
  },
  'a fluid by name, or a table of properties',
);
const stream = either(word('the name of a fluid'), oneFluid, 'the name of a fluid, or a map with name or table');
const fluid = either(
  fields({ own: stream.optional(), other: stream.optional() }, 'own and other'),
  stream,
  'the name of a fluid, a map with name or table, or own and other for two streams',
);

const series = fields(
  {
    file: word('one long file with the logged curves').optional(),
    files: column.optional(),
    trial: column.optional(),
    time: column,
    value: column,
    window: z.tuple([text('a time'), text('a time')], { error: () => says.missing('a window such as [0 s, 120 s]') }).optional(),
  },
  'a map with file or files, time and value',
);
const routeMap = z
  .object({ route: word('a reduction route, such as log-mean-difference'), series: series.optional() })
  .catchall(text('a setting of the route'))
  .meta({ description: 'a map with route and its settings' });

const group = either(
  word('a basis, such as pipe'),
  fields(
    {
      basis: word('a basis, such as pipe').optional(),
      at: choice(['bulk', 'film', 'wall'], 'where the properties are taken').optional(),
      formula: text('a formula that comes out dimensionless').optional(),
      column: column.optional(),
      random: spread.optional(),
      systematic: spread.optional(),
    },
    'a map with basis, formula or column',
  ),
  'a basis such as pipe, or a map with basis, formula or column',
);

const bound = z.union([z.number(), z.enum(['.inf', '-.inf'])], { error: ({ input }) => says.notThis(input, 'a number, .inf or -.inf') });
const law = either(
  word('a law, such as Sh = C * Re^a'),
  fields(
    {
      name: text('a name for the law').optional(),
      form: word('a law, such as Sh = C * Re^a'),
      parameters: list(word('a parameter'), 'the parameters of the law', 30).optional(),
      start: named(number('a number to start from'), 'start values by parameter').optional(),
      bounds: named(
        z.tuple([bound, bound], { error: ({ input }) => says.notThis(input, 'a pair such as [0, 1]') }),
        'bounds by parameter, such as {a: [0, 1]}',
      ).optional(),
      in: named(word('a unit'), 'units by quantity, such as {velocity: ft/s}').optional(),
    },
    'a map with form',
  ),
  'a law such as Sh = C * Re^a, or a map with form',
);

const trials = fields(
  {
    file: word('the table of trials, such as trials.csv'),
    sheet: text('the name of a sheet').optional(),
    trial: column.optional(),
    campaign: column.optional(),
    readings: choice(['average'], 'rows that share a trial are averaged').optional(),
    setting: column.optional(),
    order: column.optional(),
    steady: fields(
      {
        time: text('the column of the log that holds the time'),
        window: text('the least length of a steady window, such as 5 min'),
        share: share('the share of samples about one level, from 50 % to 100 %, such as 90 %').optional(),
        significance: share('the significance of the test of one sample, from 0.0001 to 0.2, such as 0.01').optional(),
      },
      'a map with time and window',
    ).optional(),
    missing: list(text('a mark of a missing value'), 'marks of missing values, such as ["NA", "-9999"]', 50).optional(),
    leave_out: list(
      fields({ trial: text('the trial that is left out'), reason: text('the reason for leaving it out') }, 'a map with trial and reason'),
      'trials left out, each with trial and reason',
      5000,
    ).optional(),
  },
  'a map with file',
);

const fit = fields(
  {
    error: choice(['relative', 'absolute'], 'whether residuals are of the logarithms or of the values').optional(),
    weights: word('uncertainty, equal, or a column').optional(),
    scatter: choice(['estimate', 'none'], 'whether scatter beyond the stated uncertainties is estimated').optional(),
    campaign_effect: choice(['auto', 'none', 'intercept'], 'how campaigns differ').optional(),
    confidence: share('a confidence from 0.5 to 0.9999, such as 0.95').optional(),
    resamples: whole('a whole number of resamples from 0 to 100000', 0, 100_000).optional(),
    monte_carlo: truth('true or false').optional(),
  },
  'a map with error, weights, scatter, campaign_effect, confidence or resamples',
);

const audit = either(
  z.literal('none'),
  fields(
    {
      against: either(
        word('applicable, or an id'),
        list(word('an id of a published correlation'), 'ids of published correlations', 500, 1),
        'applicable, or ids of published correlations',
      ).optional(),
      analogy: truth('true or false').optional(),
      tolerance: share('a share from 1 % to 500 %, such as 20 %').optional(),
      own: word('a file with your own correlations').optional(),
    },
    'a map with against, analogy, tolerance or own',
  ),
  'none, or a map with against, analogy, tolerance or own',
);

const plant = either(
  word('a table of plant cases, such as plant.csv'),
  fields(
    {
      file: word('a table of plant cases, such as plant.csv').optional(),
      sheet: text('the name of a sheet').optional(),
      case: column.optional(),
      conservative: choice(['low', 'high'], 'the side on which the coefficient is dangerous').optional(),
      target: named(text('a value with its unit, or what is to be found'), 'what the unit must do, and find').optional(),
      quantities: quantities.optional(),
      fluid: fluid.optional(),
    },
    'a map with file or quantities',
  ),
  'a table of plant cases such as plant.csv, or a map with file or quantities',
);

const level = text('a value with its unit, such as 100 rpm');
const rigSetting = either(
  z.tuple([level, level], { error: ({ input }) => says.notThis(input, 'a range such as [100 rpm, 600 rpm]') }),
  fields(
    {
      from: level.optional(),
      to: level.optional(),
      levels: list(level, 'the levels that can be set', 200, 1).optional(),
      cost: number('what a change costs, relative to the others', { from: 0, to: 1e6 }).optional(),
    },
    'a map with from and to, or levels',
  ),
  'a range such as [100 rpm, 600 rpm], or a map with levels',
);
const rig = z
  .object({ campaigns: choice(['new', 'existing', 'either'], 'where next trials may be run').optional() })
  .catchall(rigSetting)
  .meta({ description: 'what next trials may set, by quantity' });

/** The study file, format 1. The JSON Schema that ships with the package is made from it. */
export const studySchema = fields(
  {
    pilotlaw: z
      .literal(1, { error: ({ input }) => (input === undefined ? says.missing('pilotlaw: 1') : says.format(input)) })
      .meta({ description: 'version of this format' }),
    title: text('a title for the study'),
    transfer: choice(['heat', 'mass'], 'what is transferred'),
    equipment: choice(families, 'the family of published correlations').optional(),
    invented: truth('true where the data are invented, as in a demo').optional(),
    trials: either(word('the table of trials, such as trials.csv'), trials, 'a table such as trials.csv, or a map with file'),
    quantities: quantities.optional(),
    fluid: fluid.optional(),
    coefficient: either(
      word('a reduction route'),
      routeMap,
      'a reduction route such as log-mean-difference, or a map with route',
    ).optional(),
    groups: named(group, 'groups by name, such as Re: pipe').optional(),
    laws: list(law, 'a list of laws, such as - Sh = C * Re^a', 50, 1),
    fit: fit.optional(),
    audit: audit.optional(),
    plant: plant.optional(),
    rig: rig.optional(),
    output: either(
      word('a folder'),
      fields(
        {
          folder: word('a folder for the results').optional(),
          assets: choice(['inline', 'shared'], 'where the script of the reports stands').optional(),
        },
        'a map with folder or assets',
      ),
      'a folder for the results, or a map with folder or assets',
    ).optional(),
  },
  'a map of keys: pilotlaw, title, transfer, trials, laws ...',
);

/** A list of a user's own published correlations (`audit.own`). */
export const ownCorrelationsSchema = list(
  fields(
    {
      id: word('a short name, such as smith-1987'),
      authors: text('the authors'),
      year: whole('a year', 1700, 2200),
      gives: word('what it gives: Nu, Sh, j_heat ...'),
      family: choice(families, 'the equipment it is for').optional(),
      title: text('a title').optional(),
      form: word('the correlation, such as Nu = 0.021 * Re^0.8 * Pr^0.4'),
      groups: named(word('a basis, such as pipe'), 'the basis of each group, such as {Re: pipe, Nu: pipe}').optional(),
      at: named(
        choice(['bulk', 'film', 'wall'], 'where properties are taken'),
        'where properties are taken, such as {Pr: film}',
      ).optional(),
      in: named(word('a unit'), 'units by quantity, such as {velocity: ft/s}').optional(),
      limits: list(word('a limit, such as 0.7 <= Pr <= 160'), 'limits, such as ["Re >= 1e4"]', 50).optional(),
      accuracy: text('the accuracy its authors state').optional(),
      reads: choice(['mean line', 'lower bound', 'upper bound'], 'how its line is to be read').optional(),
      source: text('the publication').optional(),
    },
    'a map with id, authors, year, gives and form',
  ),
  'a list of correlations',
  500,
  1,
);

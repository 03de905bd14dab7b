import { didYouMean } from '../nearest.ts';

export const unlikeDimensions = (a: string, b: string): string => `${a} and ${b} cannot be added or compared`;
export const exponentWithDimension = (dimension: string): string => `an exponent must be a number, this one has the unit ${dimension}`;
export const openExponent = (dimension: string): string =>
  `a quantity in ${dimension} can only be raised to a number that stands in the formula`;
export const functionOfDimension = (fn: string, dimension: string): string => `${fn} takes a number, this has the unit ${dimension}`;

export const noUnit = (name: string, unit: string): string =>
  `${name} needs a unit (in SI it is ${unit}): write it in the header as [${unit}], in a units row, or here as unit`;
export const wrongDimension = (name: string, read: string, right: string): string =>
  `"${read}" is no unit of ${name}, which is measured in ${right} or a multiple of it`;
export const unitOfNumber = (name: string, read: string): string => `${name} is a number without unit, "${read}" has one`;
export const formulaWrong = (name: string, text: string, wrong: string): string => `"${text}" for ${name}: ${wrong}`;
export const formulaDimension = (name: string, text: string, found: string, right: string): string =>
  `"${text}" comes out in ${found}, but ${name} is measured in ${right}`;
export const formulaCircle = (names: readonly string[]): string => `these formulas need each other in a circle: ${names.join(' -> ')}`;
export const textQuantity = (name: string): string =>
  `${name} is a text that is shown to the reader; it has no number, unit or uncertainty`;
export const notExact = (name: string): string =>
  `${name} is computed by a formula and takes its uncertainty from what stands in it; state the uncertainty there`;
export const ownName = (name: string, meant: string): string =>
  `"${name}" is taken as a quantity of your own; the program's own name that comes nearest is "${meant}"`;

export const unknownEquipment = (read: string, known: readonly string[]): string =>
  `"${read}" is no family of equipment known here${didYouMean(read, known)}; known are ${known.join(', ')}`;
export const unknownFluid = (read: string, known: readonly string[]): string =>
  `"${read}" is no fluid known here${didYouMean(read, known)}; known are ${known.join(', ')}, or give a table or the properties as quantities`;
export const unknownRoute = (read: string, known: readonly string[]): string =>
  `"${read}" is no reduction route${didYouMean(read, known)}; routes for this transfer are ${known.join(', ')}`;
export const routeOfOtherTransfer = (route: string, transfer: string): string =>
  `the route ${route} is one of ${transfer} transfer, and the study says transfer: ${transfer === 'heat' ? 'mass' : 'heat'}`;
export const unknownSetting = (route: string, key: string, known: readonly string[]): string =>
  `${route} has no setting "${key}"${didYouMean(key, known)}${known.length === 0 ? '' : `; it has ${known.join(', ')}`}`;
export const wrongSetting = (key: string, read: string, allowed: readonly string[]): string =>
  `"${read}" is no ${key}; it is one of ${allowed.join(', ')}`;
export const unknownBasis = (group: string, read: string, known: readonly string[]): string =>
  `"${read}" is no basis of ${group}${didYouMean(read, known)}; bases are ${known.join(', ')}`;
export const unknownGroup = (read: string, known: readonly string[]): string =>
  `"${read}" is no group known here${didYouMean(read, known)}; give it a formula or a column if it is your own`;
export const needsBasis = (group: string, known: readonly string[]): string =>
  `${group} can be meant on more than one length here; say which under groups, for example "${group}: ${known[0] ?? 'pipe'}"; bases are ${known.join(', ')}`;
export const groupDimension = (group: string, formula: string, found: string): string =>
  `${group} = ${formula} has the unit ${found}; a group must come out without one`;

export const cannotHave = (what: string, missing: readonly string[]): string =>
  `${what} cannot be computed: ${missing.length === 0 ? 'nothing gives it' : `${missing.join(' and ')} ${missing.length === 1 ? 'is' : 'are'} not given and cannot be derived from what is`}`;
export const orGive = (keys: readonly string[]): string =>
  ` (or give ${keys.join(' and ')} ${keys.length === 1 ? 'itself' : 'themselves'})`;
export const wayTo = (gives: string, formula: string, lacks: readonly string[]): string =>
  `${gives} by ${formula}${lacks.length === 0 ? '' : `, which lacks ${lacks.join(', ')}`}`;
export const noCoefficient = (response: string): string =>
  `${response} needs a coefficient: say by which route under "coefficient", or give ${response} as a column under "groups"`;
export const coefficientIsOverall = (gives: string, response: string): string =>
  `this route gives ${gives}, which never enters ${response}; say "then: series-resistance" to take the other resistances out of it (or give interfacial_area for a volumetric coefficient), or write the law for ${gives} itself`;
export const unitForWhat = (name: string): string => `"in" names ${name}, which does not stand in the law`;
export const unitOfGroup = (name: string): string => `${name} is a group and has no unit; "in" is for quantities`;
export const startForWhat = (name: string, law: string, known: readonly string[]): string =>
  `${law} has no parameter "${name}"${didYouMean(name, known)}`;
export const responsesDiffer = (responses: readonly string[]): string =>
  `all laws of a study must give the same response to be compared; these give ${responses.join(', ')}`;
export const unknownCorrelation = (read: string, known: readonly string[]): string =>
  `"${read}" is no published correlation in the catalogue${didYouMean(read, known)}; "pilotlaw correlations" lists them`;

export const valueStated = (key: string): string => `${key} is given; the program would otherwise derive it, and takes the given value`;
export const onTrust = (name: string): string =>
  `${name} is a column of yours: published correlations are compared on the assumption that it is defined as they define it`;
export const ambientAssumed = (key: string): string =>
  `${key} is read as a gauge pressure and ambient_pressure is not given: 101.325 kPa is added.`;
export const idealGasVolume = (key: string, temperature: number, pressure: number): string =>
  `${key} is read at a reference condition of ${temperature} K and ${pressure / 1000} kPa and turned to the actual volume as an ideal gas.`;
export const twoKinds = (first: string, unit: string, second: string, other: string): string =>
  `${first} is in ${unit} and ${second} in ${other}: concentrations of one study are all by mass or all by amount of substance`;
export const unknownResponse = (name: string, known: readonly string[]): string =>
  `"${name}" is neither a group nor a quantity known here${didYouMean(name, known)}`;
export const noSuchCondition = (name: string, meant: string | undefined): string =>
  `the fluid's condition is to be taken from "${name}", which is neither given nor can be derived${meant === undefined ? '' : `; did you mean "${meant}"?`}`;
export const correlationLacks = (name: string, definition: string, roots: readonly string[]): string =>
  `${name} (${definition})${roots.length === 0 ? '' : `, for which ${roots.join(' and ')} ${roots.length === 1 ? 'is' : 'are'} missing`}`;
export const unreadableSetting = (key: string, read: string, wanted: string): string => `"${read}" cannot be read as ${key}: ${wanted}`;
export const lawWithoutSide = (response: string): string =>
  `other-side-plot fits a law of one side to overall coefficients; ${response} is none: write the law for Nu or heat_transfer_coefficient`;
export const otherSideAlone = (key: string): string =>
  `${key} cannot be had from other-side-plot, whose law is fitted through overall coefficients; leave ${key} out and use the law of the own side by hand`;
export const sideConductance = (formula: string): string =>
  `conductance of the own side for a response of 1, on the outer area: ${formula}`;
export const steadyAndSeries = (): string =>
  'steady windows of a log are trials at rest, coefficient.series reads trials that change with time; use one of them';
export const curveAndColumn = (key: string): string => `${key} comes from the logged curve and is given here too; leave one of them out`;
export const giveTheCurve = (route: string): string => `${route} can read a logged curve: say where it stands under coefficient.series`;
export const routeWithoutCurve = (route: string, able: readonly string[]): string =>
  `the route ${route} takes no logged curve; routes that do are ${able.join(', ')}`;

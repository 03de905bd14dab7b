import { call } from '../algebra/build.ts';
import { derivative } from '../algebra/derivative.ts';
import { pythonExpression } from '../algebra/python.ts';
import * as says from '../base/says/results.ts';
import type { Predictable } from '../regression/predict-ln.ts';

const list = (values: readonly number[]): string => `[${values.map(numberText).join(', ')}]`;
const matrix = (rows: readonly (readonly number[])[]): string => `[${rows.map(list).join(', ')}]`;
const numberText = (value: number): string => (Number.isFinite(value) ? String(value) : 'math.nan');
const text = (value: string): string => JSON.stringify(value);
const dictionary = (entries: readonly (readonly [string, string])[]): string =>
  `{${entries.map(([name, value]) => `${text(name)}: ${value}`).join(', ')}}`;

/**
 * A law as a small Python module of the standard library alone: `value(at)` and `predict(at)` with both intervals, by the formulas of `predict`.
 * Undefined for a law with an implicit friction factor.
 */
export function lawPython(fit: Predictable, title: string, formula: string): string | undefined {
  const { form, free, components } = fit;
  const variable = (name: string): string =>
    form.groups.includes(name) ? `x[${form.groups.indexOf(name)}]` : `p[${form.constants.indexOf(name)}]`;
  const h = fit.scale === 'relative' ? call('ln', form.tree) : form.tree;
  const tree = pythonExpression(form.tree, variable);
  const slopes = form.constants.map((name) => (free.includes(name) ? pythonExpression(derivative(h, name), variable) : '0.0'));
  if (tree === undefined || slopes.some((one) => one === undefined)) return undefined;
  const component = (name: string): number => components.values[components.names.indexOf(name)] ?? 0;
  return `${says.pythonHead(commentText(title), commentText(formula))}
import math

GROUPS = [${form.groups.map(text).join(', ')}]
RANGES = ${dictionary(form.groups.map((name) => [name, `(${fit.ranges[name]!.map(numberText).join(', ')})`]))}
PARAMETERS = ${dictionary(form.constants.map((name) => [name, numberText(fit.values[name]!)]))}
CONFIDENCE = ${fit.confidence}
RELATIVE = ${fit.scale === 'relative' ? 'True' : 'False'}
PHI = ${matrix(fit.covarianceRandom)}
SHIFTS = ${dictionary(Object.entries(fit.shifts).map(([source, shift]) => [source, list(shift)]))}
CAMPAIGN, SCATTER = ${numberText(component('campaign'))}, ${numberText(component('scatter'))}
COMPONENT_COVARIANCE = ${matrix(components.covariance)}
PHI_SLOPES = [${components.derivatives.map(matrix).join(', ')}]
MOST_FREEDOM = ${numberText(fit.residualDegreesOfFreedom)}


def value(at):
    """The law at a dictionary of group values."""
    x = [float(at[name]) for name in GROUPS]
    p = list(PARAMETERS.values())
    return ${tree}


def inside(at):
    """Whether every group lies in the range that was tried."""
    return all(low <= at[name] <= high for name, (low, high) in RANGES.items())


def predict(at, confidence=CONFIDENCE, factor=1.0, plant_shifts=None):
    """(value, law_lower, law_upper, lower, upper) of the response times factor.

    law_*: interval of the law; lower, upper: the true coefficient of a new campaign. plant_shifts: what one standard uncertainty
    of a source moves ln(response times factor) by at the plant itself (the product, for an absolute law), beside its shift of the law.
    """
    x = [float(at[name]) for name in GROUPS]
    p = list(PARAMETERS.values())
    w = [${slopes.join(', ')}]
    scale = 1.0 if RELATIVE else factor
    w = [scale * one for one in w]
    centre = math.log(value(at)) + math.log(factor) if RELATIVE else value(at) * factor
    plant = plant_shifts or {}
    names = list(SHIFTS) + [name for name in plant if name not in SHIFTS]
    known = sum((_dot(w, SHIFTS.get(name, [0.0] * len(w))) + plant.get(name, 0.0)) ** 2 for name in names)
    law = _quadratic(w, PHI)
    rest = (CAMPAIGN + SCATTER) * scale**2
    slopes = [_quadratic(w, one) for one in PHI_SLOPES]
    ends = _ends(centre, law, slopes, known, confidence)
    both = _ends(centre, law + rest, [one + scale**2 for one in slopes], known, confidence)
    return (math.exp(centre) if RELATIVE else centre, *ends, *both)


def _ends(centre, random, slopes, known, confidence):
    total = random + known
    if not total > 0:
        half = 0.0
    else:
        half = student_quantile((1 + confidence) / 2, _freedom(random, slopes, total)) * math.sqrt(total)
    ends = (centre - half, centre + half)
    return tuple(math.exp(one) for one in ends) if RELATIVE else ends


def _freedom(random, slopes, total):
    """Satterthwaite, then Welch-Satterthwaite for the known part."""
    if not random > 0:
        return math.inf
    spread = _quadratic(slopes, COMPONENT_COVARIANCE)
    nu = 2 * random**2 / spread if spread > 0 else math.inf
    return max(1.0, min(MOST_FREEDOM, nu)) * (total / random) ** 2


def _dot(a, b):
    return sum(x * y for x, y in zip(a, b))


def _quadratic(w, m):
    return sum(a * _dot(row, w) for a, row in zip(w, m))


def student_quantile(p, nu):
    """Student's quantile for p > 1/2 and any nu > 0, by bisection of its tail."""
    if math.isinf(nu):
        return _bisect(lambda t: math.erfc(t / math.sqrt(2)) / 2, 1 - p)
    return _bisect(lambda t: _incomplete_beta(nu / 2, 0.5, nu / (nu + t * t)) / 2, 1 - p)


def _bisect(tail, wanted):
    low, high = 0.0, 1.0
    while tail(high) > wanted:
        low, high = high, 2 * high
    for _ in range(200):
        middle = (low + high) / 2
        low, high = (middle, high) if tail(middle) > wanted else (low, middle)
    return (low + high) / 2


def _incomplete_beta(a, b, x):
    """Regularised incomplete beta function by its continued fraction (DLMF 8.17.22)."""
    if x <= 0.0 or x >= 1.0:
        return 0.0 if x <= 0.0 else 1.0
    if x > (a + 1) / (a + b + 2):
        return 1.0 - _incomplete_beta(b, a, 1 - x)
    front = math.exp(math.lgamma(a + b) - math.lgamma(a) - math.lgamma(b) + a * math.log(x) + b * math.log1p(-x))
    c, d = 1.0, 1 / (1 - (a + b) * x / (a + 1))
    fraction = d
    for m in range(1, 10000):
        even = m * (b - m) * x / ((a + 2 * m - 1) * (a + 2 * m))
        odd = -(a + m) * (a + b + m) * x / ((a + 2 * m) * (a + 2 * m + 1))
        before = fraction
        for step in (even, odd):
            d = 1 / (1 + step * d)
            c = 1 + step / c
            fraction *= c * d
        if abs(fraction - before) < 1e-16 * abs(fraction):
            break
    return front * fraction / a
`;
}

/** Text that cannot leave a Python docstring. */
const commentText = (one: string): string => one.replace(/[\\"]/gu, "'").replace(/[\r\n]+/gu, ' ');

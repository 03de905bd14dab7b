import { add, bands, constant, group, mul, num, pow } from '../algebra/build.ts';
import type { Expr, Form } from '../algebra/form.ts';
import { says } from '../base/says/reduction.ts';
import type { Key, Rule } from '../rules/rule.ts';
import { logMeanDifference } from './log-mean-difference.ts';
import type { Route, RouteContext, Settings } from './route.ts';
import { plainContext } from './route.ts';
import { seriesResistanceRules, sideOf } from './series-resistance.ts';

/** Names that an embedded law uses beside its own. */
const otherSideNames = {
  response: 'U',
  scale: 'side_conductance',
  campaign: 'campaign_number',
  resistance: 'other_side_resistance',
} as const;

export type OtherSideNames = typeof otherSideNames;

/** Number of a trial's campaign, from 1; an input that the observations supply. */
export const campaignNumberKey: Key = 'campaign_number';

/** A law of one side written as a law of the overall coefficient, with what its names mean and the rules for what is new in it. */
export interface OtherSideLaw {
  readonly form: Form;
  readonly groups: Readonly<Record<string, Key>>;
  readonly rules: readonly Rule[];
  /** Names of the resistances, one for each campaign, in m^2 K/W on the outer area. */
  readonly resistances: readonly string[];
  readonly names: OtherSideNames;
  /** The own side is inside the tube: its area is the inner one. */
  readonly inside: boolean;
}

/**
 * 1/U = R_campaign + 1/(scale law), all on the outer area: the law of one side with one constant resistance per campaign for all else, after Wilson 1915. It is
 * fitted to U in one step; what it finds for R never goes back into a reduction, so it cannot be refitted on its own output.
 * `response` is the key of the law's response: `Nu@BASIS[,film|wall]` or `heat_transfer_coefficient`. Undefined for any other response.
 */
export function otherSideLaw(
  law: { readonly form: Form; readonly groups: Readonly<Record<string, Key>> },
  campaigns: number,
  settings: Settings = {},
  context: RouteContext = plainContext,
): OtherSideLaw | undefined {
  const scale = scaleRule(law.groups[law.form.response]!, settings, context);
  if (scale === undefined) return undefined;
  const { response, scale: scaleName, campaign, resistance } = otherSideNames;
  const resistances = Array.from({ length: campaigns }, (_, k) => (campaigns === 1 ? resistance : `${resistance}_${k + 1}`));
  const tree = inverse(add(chosen(resistances), inverse(mul(group(scaleName), law.form.tree))));
  const extra = campaigns === 1 ? [scaleName] : [campaign, scaleName];
  const { [law.form.response]: _, ...own } = law.groups;
  return {
    form: { response, tree, groups: [...extra, ...law.form.groups], constants: [...resistances, ...law.form.constants] },
    groups: {
      ...own,
      [response]: 'overall_coefficient',
      [scaleName]: scale.gives,
      ...(campaigns === 1 ? {} : { [campaign]: campaignNumberKey }),
    },
    rules: [scale],
    resistances,
    names: otherSideNames,
    inside: sideOf(settings, context) === 'inside',
  };
}

const inverse = (a: Expr): Expr => pow(a, num(-1));

/** The resistance of a trial's own campaign. */
const chosen = (names: readonly string[]): Expr =>
  names.length === 1
    ? constant(names[0]!)
    : bands(
        group(otherSideNames.campaign),
        names.slice(1).map((_, k) => k + 1.5),
        names.map(constant),
      );

/** Conductance of the own side on the outer area for a response of 1: lambda/L for Nu, 1 for h; inside a tube times d_i/d_o. */
function scaleRule(response: Key, settings: Settings, context: RouteContext): Rule | undefined {
  const inside = sideOf(settings, context) === 'inside';
  const per = (ratio: number): number => (inside ? 1 / ratio : 1);
  const source = 'definition';
  if (response === 'heat_transfer_coefficient')
    return { gives: 'side_conductance', from: ['area_ratio'], of: (ratio) => per(ratio!), formula: inside ? 'd_i/d_o' : '1', source };
  const found = /^Nu@([a-z-]+)(?:,(film|wall))?$/.exec(response);
  if (found === null || found[1] === 'film') return undefined;
  const at = found[2] === undefined ? '' : `@${found[2]}`;
  return {
    gives: `side_conductance@${response.slice(3)}`,
    from: [`thermal_conductivity${at}`, `characteristic_length@${found[1]}`, 'area_ratio'],
    of: (lambda, L, ratio) => (lambda! / L!) * per(ratio!),
    formula: inside ? '(lambda/L) d_i/d_o' : 'lambda/L',
    source,
  };
}

const twoStreams = (settings: Settings): Settings => ({ ...settings, arrangement: settings.arrangement ?? 'counter' });

/**
 * Overall coefficients whose other resistances are constant within a campaign, split by the law itself. Gives U, measured or by duty and log-mean difference of two
 * streams; the law is embedded by `otherSideLaw` and fitted to U by regression, resistances and law together.
 */
export const otherSidePlot: Route = {
  ...logMeanDifference,
  name: 'other-side-plot',
  title: 'Law of one side and one constant resistance per campaign, fitted together to overall coefficients',
  formula: '1/U = R_campaign + 1/h, on the outer area',
  source: 'Wilson 1915',
  settings: {
    arrangement: {
      ...logMeanDifference.settings.arrangement!,
      allowed: ['counter', 'parallel', 'cross', 'well-stirred'],
      default: 'counter',
    },
    duty: logMeanDifference.settings.duty!,
    balance: logMeanDifference.settings.balance!,
    loses: logMeanDifference.settings.loses!,
    side: { says: 'where the side of the law is: inside the tube, or outside', allowed: ['inside', 'outside'] },
  },
  result: () => 'U',
  gives: () => 'overall_coefficient',
  needs: (settings) => logMeanDifference.needs(twoStreams(settings)),
  rules: (settings, context = plainContext) => [
    ...logMeanDifference.rules(twoStreams(settings), context),
    ...seriesResistanceRules(settings, context).filter(({ gives }) => gives === 'area_ratio'),
  ],
  caution: says.otherSideConstant,
};

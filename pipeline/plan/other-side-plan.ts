import type { Form } from '../algebra/form.ts';
import * as says from '../base/says/plan.ts';
import { campaignNumberKey, type OtherSideNames, otherSideLaw, otherSidePlot } from '../reduction/other-side-plot.ts';
import type { Input, Key, Rule } from '../rules/rule.ts';
import type { Study } from '../study/study.ts';
import { nameColumns } from '../trials/name-columns.ts';
import type { Table } from '../trials/table.ts';
import type { CoefficientPlan } from './coefficient-plan.ts';
import type { Faults } from './faults.ts';
import type { Naming, Plan, PlannedLaw } from './plan.ts';

/** A law of one side as the study writes it, behind a planned law of the overall coefficient. */
export interface OwnSide {
  readonly form: Form;
  readonly groups: Readonly<Record<string, Key>>;
  readonly names: OtherSideNames;
  /** One for each campaign. */
  readonly resistances: readonly string[];
  readonly inside: boolean;
}

/** Laws of the overall coefficient made from those of one side, with one resistance for each campaign. */
export interface OtherSide {
  readonly embed: (campaigns: number) => readonly PlannedLaw[];
  readonly rules: readonly Rule[];
  readonly inputs: readonly Input[];
  readonly namings: readonly Naming[];
}

/** Undefined where the route is another one. A law that has no side, and what cannot be had of such a study, are faults. */
export function planOtherSide(
  study: Study,
  coefficient: CoefficientPlan | undefined,
  laws: readonly PlannedLaw[],
  faults: Faults,
): OtherSide | undefined {
  if (coefficient?.route !== otherSidePlot) return undefined;
  const { settings, context } = coefficient;
  const embedded = (law: PlannedLaw, campaigns: number) => otherSideLaw(law, campaigns, settings, context);
  for (const law of laws) if (embedded(law, 2) === undefined) faults.add('no-side', says.lawWithoutSide(law.form.response), law.place);
  if (study.plant !== undefined)
    faults.add('no-plant', says.otherSideAlone('plant'), study.plant.file?.place ?? laws[0]?.place ?? coefficient.place);
  if (study.rig !== undefined) faults.add('no-rig', says.otherSideAlone('rig'), study.rig.place);
  const embed = (campaigns: number): readonly PlannedLaw[] =>
    laws.flatMap((law): readonly PlannedLaw[] => {
      const whole = embedded(law, campaigns);
      if (whole === undefined) return [];
      const { form, groups, resistances, names, inside } = whole;
      const positive = Object.fromEntries(resistances.map((name) => [name, [0, Number.POSITIVE_INFINITY] as const]));
      return [
        {
          ...law,
          form,
          groups,
          bounds: { ...positive, ...law.bounds },
          own: { form: law.form, groups: law.groups, names, resistances, inside },
        },
      ];
    });
  const rules = laws.flatMap((law) => embedded(law, 1)?.rules ?? []);
  return {
    embed,
    rules,
    inputs: [{ key: campaignNumberKey, label: 'campaign' }],
    namings: rules.map(({ gives, formula }) => ({
      name: 'side_conductance',
      key: gives,
      symbol: 's',
      unit: 'W/(m^2 K)',
      text: says.sideConductance(formula),
      source: 'definition',
    })),
  };
}

/** Campaigns that the table names; a campaign of which nothing can be used is taken out later by `withCampaigns`. */
export function campaignsNamed(table: Table, declared: Study['trials']): number {
  const { campaign } = nameColumns(table, declared).columns;
  if (campaign === undefined) return 1;
  return Math.max(1, new Set(table.rows.map(({ cells }) => (cells[campaign] ?? '').trim()).filter((name) => name !== '')).size);
}

/** The plan for as many campaigns as have trials that can be used. */
export const withCampaigns = (plan: Plan, campaigns: number): Plan =>
  plan.otherSide === undefined ? plan : { ...plan, laws: plan.otherSide.embed(campaigns) };

import * as says from '../base/says/results.ts';
import type { Plan } from '../plan/plan.ts';
import { quantityOf } from '../quantities/vocabulary.ts';
import type { Input, Spread } from '../rules/rule.ts';
import type { StudyResult } from './study-result.ts';

/** How it was computed: rules in force, inputs with their uncertainty, references, statements on the method. */
export function methodOf(plan: Plan, statements: readonly string[], references: readonly string[]): StudyResult['method'] {
  const { recipe } = plan;
  const columns = new Map(plan.columns.map((column) => [column.key, column]));
  const rules = recipe.steps.map(({ rule }) => ({ gives: rule.gives, formula: rule.formula, source: rule.source }));
  const inputs = recipe.inputs
    .filter((input) => !input.key.startsWith('factor: '))
    .map((input) => {
      const column = columns.get(input.key);
      const unit = quantityOf(input.key.split(' (')[0]!)?.unit ?? '';
      const from =
        column === undefined ? says.constantInput(input.constant ?? Number.NaN, unit) : says.columnInput(column.column, column.unit.text);
      return {
        key: input.key,
        from,
        random: randomText(input, unit),
        systematic: (input.systematic ?? [])
          .map(({ spread, source, per }) => says.systematicInput(spreadText(spread, unit), source, per))
          .join('; '),
      };
    });
  const models = recipe.inputs
    .filter((input) => input.key.startsWith('factor: '))
    .map((input) => ({ key: input.label, from: says.modelInput(), random: '', systematic: spreadText(input.systematic![0]!.spread, '') }));
  return {
    rules,
    inputs: [...inputs, ...models],
    references: [...new Set([...rules.map((rule) => rule.source), ...references])].filter((one) => /\d{4}/.test(one)).sort(),
    statements,
  };
}

const randomText = (input: Input, unit: string): string =>
  input.random === undefined ? '' : input.set === true ? says.setPoint(spreadText(input.random, unit)) : spreadText(input.random, unit);

const spreadText = (spread: Spread, unit: string): string =>
  'share' in spread ? says.shareSpread(spread.share) : says.absoluteSpread(spread.si, unit);

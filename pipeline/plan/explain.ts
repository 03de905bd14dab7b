import * as says from '../base/says/explain.ts';
import type { Plan } from './plan.ts';

/** What `check` prints: what is given, what is derived from what, which correlations are comparable, what they lack. `file` is the study file as it was named. */
export function explain(plan: Plan, file: string): string {
  const { recipe, laws, candidates, columns } = plan;
  const byKey = new Map(columns.map((column) => [column.key, column]));
  const given = recipe.inputs.filter((input) => !input.key.startsWith('factor: '));
  const lines = [
    says.title(plan.study.title, file),
    says.heading('given'),
    ...given.map((input) => {
      const column = byKey.get(input.key);
      if (plan.curve?.gives.includes(input.key)) return says.fromCurve(input.key, plan.study.coefficient!.series!.value.is);
      return says.given(
        input.key,
        column?.column,
        column?.unit.text,
        input.constant,
        (input.random === undefined ? 0 : 1) + (input.systematic?.length ?? 0),
      );
    }),
    ...Object.entries(plan.texts).map(([key, text]) => says.text(key, text)),
    says.heading('derived'),
    ...recipe.steps.map(({ rule }) => says.derived(rule.gives, rule.formula, rule.from, rule.source)),
    says.heading('laws'),
    ...laws.map((law) => says.law(law.name, law.form.response, law.form.groups, law.form.constants, law.groups)),
    ...(candidates.length === 0 ? [] : [says.heading('published correlations')]),
    ...candidates.map((one) => says.candidate(one.correlation.id, one.basis, one.lacks)),
    ...(plan.notes.length === 0 ? [] : [says.heading('notes'), ...plan.notes.map((note) => says.note(note.text))]),
  ];
  return `${lines.join('\n')}\n`;
}

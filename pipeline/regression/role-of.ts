import type { Fit } from './fit.ts';

/** What a parameter does in its law: the exponent of a group, an offset standing alone in a sum, or something else. */
export function roleOf({ form }: Pick<Fit, 'form'>, name: string): { readonly kind: 'exponent' | 'offset' | 'other'; readonly of: string } {
  let found: { kind: 'exponent' | 'offset' | 'other'; of: string } = { kind: 'other', of: '' };
  const walk = (e: Fit['form']['tree'], inSum: boolean): void => {
    if (e.op === 'constant' && e.name === name && inSum) found = { kind: 'offset', of: '' };
    if (e.op === '^' && e.of[1].op === 'constant' && e.of[1].name === name && e.of[0].op === 'group')
      found = { kind: 'exponent', of: e.of[0].name };
    if (e.op === 'number' || e.op === 'group' || e.op === 'constant') return;
    for (const part of e.of) walk(part, e.op === '+');
    if (e.op === 'bands') walk(e.on, false);
  };
  walk(form.tree, true);
  return found;
}

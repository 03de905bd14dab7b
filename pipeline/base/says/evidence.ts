const two = (value: number): string => (Number.isFinite(value) ? String(Number(value.toPrecision(2))) : 'open');
const factor = (value: number): string => String(Number(value.toPrecision(3)));

export const theory = (
  parameter: { readonly name: string; readonly estimate: number; readonly lower: number; readonly upper: number },
  group: string,
  text: string,
  compatible: boolean,
): string => {
  const what = group === '' ? `offset ${parameter.name}` : `exponent ${parameter.name} of ${group}`;
  return `${what} = ${two(parameter.estimate)} (${two(parameter.lower)} to ${two(parameter.upper)}) is ${compatible ? 'compatible' : 'not compatible'} with ${text}`;
};
export const entangled = (law: string, parameters: readonly string[], index: number): string =>
  `In ${law} the trials tell ${parameters.join(' and ')} only together (condition index ${Math.round(index)}): each alone is less certain than the law itself.`;
export const range = (group: string, span: number, scale: 'relative' | 'absolute'): string =>
  scale === 'relative' ? `${group} spans a factor of ${factor(span)}.` : `${group} spans ${factor(span)}.`;
export const narrow = (law: string, group: string, parameter: string, span: number): string =>
  `${group} spans only a factor of ${factor(span)} in the trials: in ${law} its exponent ${parameter} is hardly measured. Hold it at a published value, or run trials that vary ${group}.`;

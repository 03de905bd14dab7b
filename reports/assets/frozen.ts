/** Numbers that JSON cannot hold, as objects that no text of a user can imitate. */
const odd = new Map<number, string>([
  [Number.POSITIVE_INFINITY, 'inf'],
  [Number.NEGATIVE_INFINITY, '-inf'],
]);

/** JSON in which NaN and infinities survive. */
export const freeze = (value: unknown): string =>
  JSON.stringify(value, (_, one: unknown) =>
    typeof one !== 'number' || Number.isFinite(one) ? one : { $number: Number.isNaN(one) ? 'nan' : odd.get(one)! },
  );

/** The value that `freeze` wrote. */
export const thaw = (text: string): unknown =>
  JSON.parse(text, (_, one: unknown) => {
    if (one === null || typeof one !== 'object' || !('$number' in one)) return one;
    if (one.$number === 'inf') return Number.POSITIVE_INFINITY;
    return one.$number === '-inf' ? Number.NEGATIVE_INFINITY : Number.NaN;
  });

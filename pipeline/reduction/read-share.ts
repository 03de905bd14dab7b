/** `25 %` or `0.25` as a share of 1; NaN for anything else. */
export function readShare(text: string): number {
  const found = /^\s*(\d+(?:\.\d+)?)\s*(%?)\s*$/.exec(text);
  return found === null ? Number.NaN : Number(found[1]) / (found[2] === '%' ? 100 : 1);
}

import type { CST } from 'yaml';

type Token = CST.Token;

/** How deep maps and lists stand in each other, found without recursion: composing a deep text first would exhaust the process. */
export function nestingDepth(tokens: readonly Token[]): number {
  let deepest = 0;
  const open: { readonly token: Token; readonly depth: number }[] = tokens.map((token) => ({ token, depth: 0 }));
  for (let next = open.pop(); next !== undefined; next = open.pop()) {
    const { token, depth } = next;
    deepest = Math.max(deepest, depth);
    if (token.type === 'document' && token.value !== undefined) open.push({ token: token.value, depth });
    if ('items' in token) {
      for (const { key, value } of token.items as readonly { readonly key?: Token | null; readonly value?: Token }[]) {
        if (key != null) open.push({ token: key, depth: depth + 1 });
        if (value !== undefined) open.push({ token: value, depth: depth + 1 });
      }
    }
  }
  return deepest;
}

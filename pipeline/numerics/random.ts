/** A stream of random numbers, the same for the same seed on every machine. */
export interface Random {
  /** In [0, 1), 53 bits. */
  uniform(): number;
  /** Standard normal, by the polar method (Marsaglia and Bray 1964). */
  normal(): number;
  /** Whole number in [0, n). */
  integer(n: number): number;
}

/** xoshiro128** (Blackman and Vigna 2021), its state filled by splitmix32 from the seed. */
export function seeded(seed: number): Random {
  const state = new Uint32Array(4);
  let s = seed >>> 0;
  for (let k = 0; k < 4; k++) {
    s = (s + 0x9e3779b9) >>> 0;
    let z = s;
    z = Math.imul(z ^ (z >>> 16), 0x85ebca6b);
    z = Math.imul(z ^ (z >>> 13), 0xc2b2ae35);
    state[k] = (z ^ (z >>> 16)) >>> 0;
  }
  const rotate = (x: number, k: number): number => ((x << k) | (x >>> (32 - k))) >>> 0;
  const next = (): number => {
    const [a, b, c, d] = [state[0]!, state[1]!, state[2]!, state[3]!];
    const result = Math.imul(rotate(Math.imul(b, 5), 7), 9) >>> 0;
    state[2] = c ^ a;
    state[3] = d ^ b;
    state[1] = b ^ state[2]!;
    state[0] = a ^ state[3]!;
    state[2] = state[2]! ^ (b << 9);
    state[3] = rotate(state[3]!, 11);
    return result;
  };
  const uniform = (): number => ((next() >>> 5) * 67108864 + (next() >>> 6)) / 9007199254740992;
  let spare: number | undefined;
  const normal = (): number => {
    if (spare !== undefined) {
      const kept = spare;
      spare = undefined;
      return kept;
    }
    for (;;) {
      const u = 2 * uniform() - 1;
      const v = 2 * uniform() - 1;
      const r = u * u + v * v;
      if (r >= 1 || r === 0) continue;
      const scale = Math.sqrt((-2 * Math.log(r)) / r);
      spare = v * scale;
      return u * scale;
    }
  };
  return { uniform, normal, integer: (n) => Math.floor(uniform() * n) };
}

/** A seed for a named part of a run, so that parts do not share one stream and their order does not matter. FNV-1a over the label. */
export function seedFor(seed: number, label: string): number {
  let h = (2166136261 ^ seed) >>> 0;
  for (let i = 0; i < label.length; i++) h = Math.imul(h ^ label.charCodeAt(i), 16777619) >>> 0;
  return h;
}

/** What a unit is counted from or of, where that matters. */
export type Reference =
  /** A pressure above ambient. */
  | { readonly kind: 'gauge' }
  /** A difference of two pressures. */
  | { readonly kind: 'differential' }
  /** A gas volume at a reference condition, K and Pa; undefined where the text does not state it. */
  | { readonly kind: 'normal'; readonly temperature?: number; readonly pressure?: number }
  /** A share of the whole's mass, volume or amount. */
  | { readonly kind: 'share'; readonly of: 'mass' | 'volume' | 'amount' };

const pressures =
  '(?:[kMhmd]?Pa|m?bar|Bar|BAR|k?psi|PSI|k(?:gf|p)/cm(?:2|\\^2)|atm|at|[Tt]orr|mmHg|inHg|(?:in|mm|cm|m|ft)(?:H2O|WC|WS)|N/m(?:2|\\^2))';
const gauge = new RegExp(
  `^(${pressures})(?:[ _]?\\((g|gauge|ü|ue|a|abs|absolute|d|diff|differential)\\)|[ _]?(gauge|abs\\.?|absolute|diff|g|ü|ue|a|d))$`,
  'u',
);

/** `bar(g)`, `barg`, `bar abs`, `psia`, `psid`, `barü`: the pressure unit and what it is counted from. */
export function gaugeOf(text: string): { readonly base: string; readonly reference?: Reference } | undefined {
  const found = gauge.exec(text);
  if (found === null) return undefined;
  const from = (found[2] ?? found[3])![0]!;
  const base = found[1]!;
  if (from === 'a') return { base };
  return { base, reference: { kind: from === 'd' ? 'differential' : 'gauge' } };
}

/** `NL/min (0 degC, 101.325 kPa)`, `Nm3/h at 0 degC, 1 atm` */
export function conditionOf(text: string): { readonly base: string; readonly temperature: string; readonly pressure: string } | undefined {
  const found = /^(.+?) ?(?:\(|at )([^(),;]+)[,;] ?([^(),;]+?)\)?$/u.exec(text);
  if (found === null) return undefined;
  return { base: found[1]!, temperature: found[2]!.trim(), pressure: found[3]!.trim() };
}

interface Share {
  readonly over: number;
  readonly reference: Reference;
}

const share = (over: number, of: 'mass' | 'volume' | 'amount'): Share => ({ over, reference: { kind: 'share', of } });

/** Spellings with spaces, dots and hyphens left out, in lower case. */
const shares: Readonly<Record<string, Share>> = Object.fromEntries([
  ...['ppm(mass)', 'ppm(m)', 'ppm(w)', 'ppm(w/w)', 'ppmw', 'ppmm', 'wppm'].map((name) => [name, share(1e6, 'mass')] as const),
  ...['ppm(volume)', 'ppm(v)', 'ppm(vol)', 'ppm(v/v)', 'ppmv', 'vppm', 'volppm'].map((name) => [name, share(1e6, 'volume')] as const),
  ...['ppm(mol)', 'ppm(amount)', 'molppm', 'ppm(mol/mol)'].map((name) => [name, share(1e6, 'amount')] as const),
  ...['ppb(mass)', 'ppb(w)', 'ppbw'].map((name) => [name, share(1e9, 'mass')] as const),
  ...['ppb(volume)', 'ppb(v)', 'ppbv'].map((name) => [name, share(1e9, 'volume')] as const),
  ...['wt%', '%wt', 'w%', '%(w/w)', '%w/w', '%(m/m)', '%m/m', 'm%', 'ma%', 'mass%', '%(mass)', 'gew%', '%(wt)', '%mass'].map(
    (name) => [name, share(100, 'mass')] as const,
  ),
  ...['vol%', '%vol', 'v%', '%(v/v)', '%v/v', '%(volume)', '%(vol)'].map((name) => [name, share(100, 'volume')] as const),
  ...['mol%', '%mol', '%(mol)', '%(mol/mol)', '%(amount)'].map((name) => [name, share(100, 'amount')] as const),
]);

const humidity = new Set(['%rh', '%r.h.', '%rf', '%relf', '%r.f.', '%(rh)']);

/** `wt%`, `Vol.-%`, `ppm(mass)`, `% RH`: a share of the whole, factor as a divisor. */
export function shareOf(text: string): { readonly over: number; readonly reference?: Reference } | undefined {
  const key = text.toLowerCase().replace(/[ .-]/gu, '');
  if (humidity.has(key)) return { over: 100 };
  return Object.hasOwn(shares, key) ? shares[key] : undefined;
}

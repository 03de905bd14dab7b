import type { FitData, FitOptions } from './fit.ts';

/** How campaigns enter a fit, decided by their number and the study's setting alone, never by a test on the data. */
export type CampaignEffect =
  /** Several campaigns, one variance between them. */
  | 'random'
  /** Two campaigns under `auto`: a fixed shift between them, none known for a third. */
  | 'fixed'
  /** One campaign, or the study says none. */
  | 'none'
  /** As many campaigns as trials: their variance cannot be told from the scatter. */
  | 'inseparable';

export function campaignEffectOf(data: FitData, options: FitOptions): CampaignEffect {
  const sizes = campaignSizes(data);
  const count = sizes.length;
  if (options.campaignEffect === 'none' || count < 2) return 'none';
  if (options.campaignEffect === 'auto' && count === 2) return 'fixed';
  return options.scatter === 'estimate' && sizes.every((size) => size === 1) ? 'inseparable' : 'random';
}

/** Trials in each campaign that has any. */
export function campaignSizes(data: FitData): readonly number[] {
  const sizes = new Map<number, number>();
  for (const campaign of data.campaign) sizes.set(campaign, (sizes.get(campaign) ?? 0) + 1);
  return [...sizes.values()];
}

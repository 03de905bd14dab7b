import type { Refusal } from '../base/message.ts';

/** What became of one row read; rows read = used + left out + refused. */
export interface LedgerEntry {
  readonly trial: string;
  readonly campaign: string;
  readonly file: string;
  readonly line: number;
  /** Rows that this entry stands for, from `line` on; 1 where left out. */
  readonly rows?: number;
  readonly status: 'used' | 'left out' | 'refused';
  /** In words; empty for a plain used row. */
  readonly reason: string;
}

/** The ledger after all stages: rows of a trial that a later stage refused are refused with its reason, the first one told. */
export function foldLedger(entries: readonly LedgerEntry[], refused: readonly Refusal[]): readonly LedgerEntry[] {
  const reasons = new Map<string, string>();
  for (const { trial, text } of refused) if (!reasons.has(trial)) reasons.set(trial, text);
  return entries.map((entry) => {
    const reason = entry.status === 'used' ? reasons.get(entry.trial) : undefined;
    return reason === undefined ? entry : { ...entry, status: 'refused', reason };
  });
}

export interface LedgerSums {
  readonly read: number;
  readonly used: number;
  readonly leftOut: number;
  readonly refused: number;
}

export function sumLedger(entries: readonly LedgerEntry[]): LedgerSums {
  const of = (status: LedgerEntry['status']): number => entries.filter((entry) => entry.status === status).reduce(rowsOf, 0);
  return { read: entries.reduce(rowsOf, 0), used: of('used'), leftOut: of('left out'), refused: of('refused') };
}

const rowsOf = (sum: number, { rows = 1 }: LedgerEntry): number => sum + rows;

import type { LedgerRow, StudyResult } from '../../pipeline/results/study-result.ts';
import { type Child, html, type Markup } from '../html.ts';
import { chosenFit } from '../law-text.ts';
import { siUnit, walkOf } from '../live-data.ts';
import { percent, plainNumber } from '../numbers.ts';
import * as says from '../says/sections.ts';
import { type Column, columns, table } from '../table.ts';
import { prettyUnit } from '../units.ts';
import { notesOf, section } from './section.ts';
import { walkMarkup } from './walk.ts';

/** Which trials count? */
export function trials(result: StudyResult): Markup {
  const { ledger } = result;
  const adds = ledger.read === ledger.used + ledger.leftOut + ledger.refused;
  const whole = ledger.leftOut + ledger.refused === 0 ? ` ${says.nothingLeft()}` : '';
  return section(
    'trials',
    `${says.ledgerSum(ledger)}${adds ? whole : ` ${says.ledgerMismatch()}`}`,
    html`${excluded(result)}
${notesOf(result, 'trials')}
<div class="live" hidden id="ledger-tools"><label for="ledger-search">Search the ledger <input id="ledger-search" type="search" autocomplete="off"></label> <span id="ledger-count" role="status"></span></div>
${fullLedger(result)}
${readings(result)}
<div id="walk">${walk(result)}</div>`,
  );
}

/** Rows that did not count, with their reasons, before the long table. */
function excluded({ ledger }: StudyResult): Markup | false {
  const rows = ledger.rows.filter((row) => row.status !== 'used');
  return (
    rows.length > 0 &&
    table(
      'Left out or refused, and why',
      columns('trial', 'campaign', '#line', 'status', 'reason'),
      rows.map((row) => [row.trial, row.campaign, row.line, row.status, row.reason]),
    )
  );
}

const named = (name: string, unit: string): string => (unit === '1' || unit === '' ? name : `${name} in ${prettyUnit(unit)}`);

function fullLedger(result: StudyResult): Markup {
  const index = new Map(result.trials.map((trial, k) => [trial.trial, k]));
  const fit = chosenFit(result);
  const { coefficient } = result;
  const heads: readonly Column[] = [
    ...columns('trial', 'campaign', '#line', 'status', '~reason or remark'),
    ...(coefficient === null ? [] : [{ head: named(coefficient.symbol, coefficient.unit), numeric: true }]),
    ...result.columns.map((one) => ({ head: named(one.name, one.unit), numeric: true })),
    { head: `u of ${result.response.name}`, numeric: true },
    { head: `fitted ${result.response.name}`, numeric: true },
    { head: 'studentised residual', numeric: true },
  ];
  const rows = result.ledger.rows.map((row) => {
    const k = row.status === 'used' ? index.get(row.trial) : undefined;
    const trial = k === undefined ? undefined : result.trials[k];
    const own = trial !== undefined && trial.line === row.line;
    return [
      nameCell(row, own ? k : undefined),
      row.campaign,
      row.line,
      row.status,
      [row.reason, ...(own ? trial.notes : [])].filter((text) => text !== '').join('; '),
      ...(coefficient === null ? [] : [numberOf(trial?.coefficient)]),
      ...result.columns.map((_, c) => numberOf(trial?.values[c])),
      trial === undefined ? '' : percent(trial.uLn[0] ?? Number.NaN),
      numberOf(k === undefined ? undefined : fit?.diagnostics.fitted[k]),
      k === undefined || fit === undefined ? '' : plainNumber(fit.diagnostics.studentised[k] ?? Number.NaN, 2),
    ];
  });
  return table(
    'The ledger: every row read, in the order of the file; u is one standard uncertainty, random part',
    heads,
    rows,
    html` id="ledger"`,
  );
}

const numberOf = (value: number | undefined): string => (value === undefined ? '' : plainNumber(value));

/** The name of a trial; one that was used can be picked once scripts run. */
const nameCell = (row: LedgerRow, k: number | undefined): Child =>
  k === undefined ? row.trial : html`<span data-row="${k}">${row.trial}</span>`;

/** What was read in each trial, in SI, for those who check a number by hand. */
function readings(result: StudyResult): Markup | false {
  const keys = [...new Set(result.trials.flatMap((trial) => Object.keys(trial.raw)))];
  if (keys.length === 0) return false;
  return html`<details><summary>Readings of every trial</summary>${table(
    `Readings of every trial, in SI units`,
    [
      { head: 'trial' },
      { head: 'readings averaged', numeric: true },
      ...keys.map((key) => ({ head: named(key, siUnit(key)), numeric: true })),
    ],
    result.trials.map((trial) => [
      trial.trial,
      trial.readings,
      ...keys.map((key) => (trial.raw[key] === undefined ? '' : plainNumber(trial.raw[key], 5))),
    ]),
  )}</details>`;
}

/** The whole way from readings to groups for one trial: the first, where the reader has not picked another. */
function walk({ trials: all }: StudyResult): Markup | false {
  const one = all[0];
  return one !== undefined && one.trace.length > 0 && walkMarkup(walkOf(one));
}

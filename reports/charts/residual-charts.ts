import type { Fit } from '../../pipeline/regression/fit.ts';
import type { StudyResult } from '../../pipeline/results/study-result.ts';
import { config, palette, SCHEMA, type Spec } from './palette.ts';

/** Measured against fitted, with the line of equality. */
export function parityChart(result: StudyResult, fit: Fit, response: string): Spec {
  const column = result.columns.findIndex((one) => one.key === result.response.key);
  const values = result.trials.map((trial, i) => ({
    trial: trial.trial,
    fitted: fit.diagnostics.fitted[i]!,
    measured: trial.values[column]!,
  }));
  const log = fit.scale === 'relative';
  const all = values.flatMap((one) => [one.fitted, one.measured]).filter((one) => Number.isFinite(one) && (!log || one > 0));
  const [low, high] = [Math.min(...all), Math.max(...all)];
  const scale = {
    type: log ? 'log' : 'linear',
    nice: false,
    zero: false,
    domain: log ? [low / 1.1, high * 1.1] : [low - 0.05 * (high - low), high + 0.05 * (high - low)],
  };
  const at = (field: string, title: string) => ({
    field,
    type: 'quantitative',
    scale: log ? { type: 'log', nice: false, domain: scale.domain } : scale,
    title,
    axis: { tickCount: 5, format: '~g' },
  });
  const ends = scale.domain.map((v) => ({ fitted: v, measured: v }));
  return {
    $schema: SCHEMA,
    width: 380,
    height: 320,
    config,
    layer: [
      {
        data: { values: ends },
        mark: { type: 'line', color: palette.faint },
        encoding: { x: at('fitted', `fitted ${response}`), y: at('measured', `measured ${response}`) },
      },
      {
        data: { values },
        mark: { type: 'point', filled: true, color: palette.ink, size: 34, opacity: 1 },
        encoding: { x: at('fitted', `fitted ${response}`), y: at('measured', `measured ${response}`) },
      },
    ],
  };
}

/** Studentised residuals against the fitted value, with the lines of two standard deviations. */
export function residualChart(_result: StudyResult, fit: Fit, log: boolean): Spec {
  const values = fit.diagnostics.studentised
    .map((r, i) => ({ r, fitted: fit.diagnostics.fitted[i]! }))
    .filter((one) => Number.isFinite(one.r) && Number.isFinite(one.fitted));
  const x = {
    field: 'fitted',
    type: 'quantitative',
    scale: log ? { type: 'log', nice: false } : { zero: false },
    title: `fitted ${fit.form.response}`,
    axis: { tickCount: 5, format: '~g' },
  };
  const y = { field: 'r', type: 'quantitative', title: 'studentised residual' };
  return {
    $schema: SCHEMA,
    width: 380,
    height: 240,
    config,
    layer: [
      { data: { values: [{ r: -2 }, { r: 0 }, { r: 2 }] }, mark: { type: 'rule', color: palette.faint }, encoding: { y } },
      { data: { values }, mark: { type: 'point', filled: true, color: palette.ink, size: 34, opacity: 1 }, encoding: { x, y } },
    ],
  };
}

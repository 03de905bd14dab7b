import type { Message } from '../base/message.ts';
import { says } from '../base/says/trials.ts';
import type { Unit } from '../quantities/unit.ts';
import type { Curve } from '../reduction/series/series.ts';
import { Growing } from './growing.ts';

/** A logged curve of one trial, cut to its window. */
export interface LoggedCurve extends Curve {
  readonly trial: string;
  readonly file: string;
  /** Line of its first sample. */
  readonly line: number;
  /** Samples read before the window was cut. */
  readonly samples: number;
  /** Unit that its values were logged in. */
  readonly unit: Unit;
}

/** Collects the samples of one trial as they come. */
export class CurveBuilder {
  private readonly times = new Growing();
  private readonly values = new Growing();
  private last = Number.NEGATIVE_INFINITY;
  private readonly first: number;
  private backwards: number | undefined;
  private readonly trial: string;
  private readonly file: string;

  constructor(trial: string, file: string, line: number) {
    this.trial = trial;
    this.file = file;
    this.first = line;
  }

  add(time: number, value: number, line: number): void {
    if (time < this.last) this.backwards ??= line;
    this.last = time;
    this.times.push(time);
    this.values.push(value);
  }

  /** The curve within [from, to], s; `fromStart` lets time begin at its first sample. A reason where it is none. */
  curve(window: readonly [number, number] | undefined, fromStart: boolean, unit: Unit): LoggedCurve | Message {
    const place = { file: this.file, line: this.backwards ?? this.first, trial: this.trial };
    if (this.backwards !== undefined) return { code: 'time-backwards', text: says.timeBackwards(this.trial, this.backwards), place };
    const zero = fromStart ? this.times.at(0) : 0;
    const time = this.times.toArray().map((t) => t - zero);
    const [from, to] = [
      lowerIndex(time, window?.[0] ?? Number.NEGATIVE_INFINITY),
      upperIndex(time, window?.[1] ?? Number.POSITIVE_INFINITY),
    ];
    if (to - from < 3)
      return { code: 'curve-too-short', text: says.curveTooShort(this.trial, Math.max(0, to - from), this.times.length), place };
    return {
      trial: this.trial,
      file: this.file,
      line: this.first,
      samples: time.length,
      unit,
      time: time.slice(from, to),
      value: this.values.toArray().slice(from, to),
    };
  }
}

/** First index with time >= t; times ascend. */
const lowerIndex = (time: Float64Array, t: number): number => {
  const k = time.findIndex((x) => x >= t);
  return k < 0 ? time.length : k;
};

/** First index with time > t. */
const upperIndex = (time: Float64Array, t: number): number => {
  const k = time.findIndex((x) => x > t);
  return k < 0 ? time.length : k;
};

import { InputError } from '../base/input-error.ts';
import type { Message } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/study.ts';
import { caps } from './caps.ts';

/** Collects what is wrong, so that all faults of a file are told together. */
export interface Faults {
  readonly add: (code: string, text: string, place: Place) => void;
  readonly all: () => readonly Message[];
}

export function faults(first: readonly Message[] = []): Faults {
  const found = [...first];
  return { add: (code, text, place) => void found.push({ code, text, place }), all: () => found };
}

/** Throws all faults in the order of the file, each place once, the first `caps.faults` of them written out. */
export function throwIfAny(messages: readonly Message[]): void {
  if (messages.length === 0) return;
  const sorted = [...messages].sort(
    (a, b) => (a.place?.line ?? 0) - (b.place?.line ?? 0) || (a.place?.column ?? 0) - (b.place?.column ?? 0),
  );
  const more = sorted.length - caps.faults;
  const last = sorted[0]!.place;
  throw new InputError(
    more > 0
      ? [...sorted.slice(0, caps.faults), { code: 'more-faults', text: says.andMore(more), place: { file: last?.file ?? '' } }]
      : sorted,
  );
}

/** Faults of a later reading join those of an earlier one, except where the earlier one already found the same part of the file broken. */
export function withoutEchoes(earlier: readonly Message[], later: readonly Message[]): readonly Message[] {
  const broken = earlier.map(({ place }) => place?.key ?? '');
  const echoes = (key: string): boolean =>
    broken.some(
      (other) =>
        other === key ||
        other.startsWith(`${key}.`) ||
        other.startsWith(`${key}[`) ||
        key.startsWith(`${other}.`) ||
        key.startsWith(`${other}[`),
    );
  return [...earlier, ...later.filter(({ place }) => !echoes(place?.key ?? ''))];
}

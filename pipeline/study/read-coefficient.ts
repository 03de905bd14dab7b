import { says } from '../base/says/study.ts';
import type { Faults } from './faults.ts';
import { given } from './given.ts';
import { checkPath } from './paths.ts';
import type { SeriesEntry, Study } from './study.ts';
import type { Tree } from './tree.ts';
import { child, entriesOf, itemsOf, placed, textAt } from './view.ts';

/** The reduction route with its settings as written; what they mean is the route's own matter. */
export function readCoefficient(tree: Tree | undefined, faults: Faults): Study['coefficient'] {
  if (tree === undefined) return undefined;
  if (tree.kind === 'scalar') return { route: placed(tree), settings: {}, place: tree.place };
  const series = child(tree, 'series');
  const settings = Object.fromEntries(
    entriesOf(tree).flatMap(({ key, value }) => (key === 'route' || key === 'series' ? [] : [[key, placed(value)]])),
  );
  return given({
    route: textAt(tree, 'route') ?? { is: '', place: tree.place },
    settings,
    series: series && readSeries(series, faults),
    place: tree.place,
  });
}

function readSeries(tree: Tree, faults: Faults): SeriesEntry {
  const nothing = { is: '', place: tree.place };
  const window = itemsOf(child(tree, 'window')).map(placed);
  const file = textAt(tree, 'file');
  const files = textAt(tree, 'files');
  const origins = [file && 'file', files && 'files'].filter((key) => key !== undefined);
  if (origins.length !== 1) faults.add('one-of', says.oneOf(['file', 'files'], origins), tree.place);
  if (file !== undefined && textAt(tree, 'trial') === undefined)
    faults.add('needs', says.needs('file', 'trial, the column that names the trial'), file.place);
  checkPath(file, faults);
  return given({
    file,
    files,
    trial: textAt(tree, 'trial'),
    time: textAt(tree, 'time') ?? nothing,
    value: textAt(tree, 'value') ?? nothing,
    window: window.length === 2 ? ([window[0]!, window[1]!] as const) : undefined,
  });
}

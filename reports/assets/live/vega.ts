import { transforms } from 'vega-dataflow';
import * as encoders from 'vega-encode';
import { expressionInterpreter } from 'vega-interpreter';
import { parse } from 'vega-parser';
import { textMetrics } from 'vega-scenegraph';
import * as basic from 'vega-transforms';
import { extend } from 'vega-util';
import { View } from 'vega-view';
import { bound, mark, overlap, render, viewlayout } from 'vega-view-transforms';
import { measureText } from '../../charts/text-width.ts';

extend(transforms, basic, { bound, mark, overlap, render, viewlayout }, encoders);
textMetrics.width = measureText;

export type Tell = (event: MouseEvent, item: { readonly datum?: Record<string, unknown> } | null, value: unknown) => void;

/** A live picture: interpreted expressions, no eval; nothing is ever loaded. */
export function liveView(spec: object, container: HTMLElement, tell: Tell): View {
  const view = new View(parse(spec, undefined, { ast: true }), {
    renderer: 'svg',
    container,
    hover: true,
    expr: expressionInterpreter,
    logLevel: 1,
  });
  view.tooltip((_handler, event, item, value) => tell(event, item, value));
  return view;
}

export type { View };

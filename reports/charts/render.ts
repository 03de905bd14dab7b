import * as vega from 'vega';
import { compile, type TopLevelSpec } from 'vega-lite';
import { inPageColours, type Spec } from './palette.ts';
import { slimmed } from './slim-svg.ts';
import { measureText } from './text-width.ts';

/** Exported by vega, missing from its types. */
const metrics = (vega as unknown as { readonly textMetrics: { width: typeof measureText } }).textMetrics;

/** A picture drawn: static SVG for the page, and the compiled Vega specification with which it comes alive; colours as variables of the page. */
export interface Drawn {
  readonly svg: string;
  readonly live: unknown;
}

/** Throws where the compiler warns: a chart with a warning is a defect. */
export async function draw(spec: Spec, name: string): Promise<Drawn> {
  const warnings: string[] = [];
  const warn = (...texts: readonly unknown[]): typeof logger => {
    warnings.push(texts.join(' '));
    return logger;
  };
  const silent = (): typeof logger => logger;
  const logger = { level: silent, warn, info: silent, debug: silent, error: warn } as unknown as vega.LoggerInterface;
  const compiled = compile(spec as unknown as TopLevelSpec, { logger });
  metrics.width = measureText;
  const view = new vega.View(vega.parse(compiled.spec), { renderer: 'none', logger });
  const svg = await view.toSVG();
  view.finalize();
  if (warnings.length > 0) throw new Error(`chart ${name}: ${warnings.join('; ')}`);
  return {
    svg: inPageColours(slimmed(svg)).replace(/<svg /, '<svg role="presentation" focusable="false" '),
    live: JSON.parse(inPageColours(JSON.stringify(compiled.spec))),
  };
}

/** Numbering of gradients and clips starts anew for each report, so that the same result gives the same bytes. */
export const startReport = (): void => vega.resetSVGDefIds();

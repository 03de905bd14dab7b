/**
 * The same picture in fewer bytes: numbers at a tenth of a pixel, no attributes that say what is the default, dots as circles and error bars as one path.
 * Only what Vega's own writer puts out is touched, and no text.
 */
export function slimmed(svg: string): string {
  return svg
    .replace(/<(?:path|line|rect|g|text)\b[^>]*>/g, slimTag)
    .replace(/<path class="(?:background|foreground)"[^>]*\/>/g, '')
    .replace(/<g class="mark-symbol[^"]*"[^>]*>(?:<path [^>]*\/>)+<\/g>/g, dotGroup)
    .replace(/<g class="mark-rule[^"]*"[^>]*>(?:<line [^>]*\/>)+<\/g>/g, lineGroup);
}

const inert = [
  ' xmlns:xlink="http://www.w3.org/1999/xlink"',
  ' version="1.1"',
  ' aria-hidden="true"',
  ' pointer-events="none"',
  ' opacity="1"',
  ' fill-opacity="1"',
  ' font-weight="normal"',
  ' role="graphics-object"',
  ' aria-roledescription="group mark container"',
];

const slimTag = (tag: string): string =>
  inert
    .reduce((text, one) => text.replace(one, ''), tag)
    .replace(/ (d|transform|x|y|x2|y2|width|height|x1|y1)="([^"]*)"/g, (_, name, value) => ` ${name}="${shortNumbers(value)}"`);

const shortNumbers = (text: string): string =>
  text.replace(/-?\d*\.\d\d+(?:e[-+]?\d+)?/g, (number) => String(Math.round(Number(number) * 10) / 10 || 0));

/** Circles of one style: position each, the rest said once. */
function dotGroup(group: string): string {
  const dots = [...group.matchAll(/<path ([^>]*)\/>/g)].map((found) => dotOf(found[1]!));
  const first = dots[0];
  if (first === undefined || dots.some((dot) => dot === undefined || dot.rest !== first.rest)) return group;
  return `<g${first.rest}>${dots.map((dot) => `<circle cx="${dot!.x}" cy="${dot!.y}" r="${dot!.r}"/>`).join('')}</g>`;
}

function dotOf(attributes: string): { readonly x: string; readonly y: string; readonly r: string; readonly rest: string } | undefined {
  const place = /transform="translate\(([^,]+),([^)]+)\)"/.exec(attributes);
  const circle = /d="M([\d.]+),0A\1,\1,0,1,1,-\1,0A\1,\1,0,1,1,\1,0"/.exec(attributes);
  if (place === null || circle === null) return undefined;
  const rest = attributes.replace(place[0], '').replace(circle[0], '').replace(/\s+/g, ' ').trim();
  return { x: place[1]!, y: place[2]!, r: circle[1]!, rest: rest === '' ? '' : ` ${rest}` };
}

/** Lines of one style as one path. */
function lineGroup(group: string): string {
  const lines = [...group.matchAll(/<line ([^>]*)\/>/g)].map((found) => lineOf(found[1]!));
  const first = lines[0];
  if (first === undefined || lines.some((line) => line === undefined || line.rest !== first.rest)) return group;
  return `<path${first.rest} d="${lines.map((line) => line!.path).join('')}"/>`;
}

function lineOf(attributes: string): { readonly path: string; readonly rest: string } | undefined {
  const found = /transform="translate\(([^,]+),([^)]+)\)" x2="([^"]+)" y2="([^"]+)"/.exec(attributes);
  if (found === null) return undefined;
  const rest = attributes.replace(found[0], '').replace(/\s+/g, ' ').trim();
  return { path: `M${found[1]} ${found[2]}l${found[3]} ${found[4]}`, rest: rest === '' ? '' : ` ${rest}` };
}

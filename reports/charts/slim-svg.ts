/**
 * The same picture in fewer bytes: numbers at a tenth of a pixel, no attribute that says what is the default, what all children of a group share said once,
 * dots of one style as one path of round ends, lines of one style as one path. Only what Vega's own writer puts out is touched, and no text.
 */
export function slimmed(svg: string): string {
  return svg
    .replace(/<(?:path|line|rect|g|text|svg)\b[^>]*>/g, slimTag)
    .replace(/<path class="(?:background|foreground)"[^>]*\/>/g, '')
    .replace(/<g class="mark-symbol[^"]*"([^>]*)>((?:<path [^>]*\/>)+)<\/g>/g, (whole, of, inside) => dots(inside, of) ?? whole)
    .replace(/<g class="mark-rule[^"]*"([^>]*)>((?:<line [^>]*\/>)+)<\/g>/g, (whole, of, inside) => lines(inside, of) ?? whole)
    .replace(/<g class="mark-text[^"]*"([^>]*)>((?:<text [^>]*>[^<]*<\/text>)+)<\/g>/g, (_, of, inside) => texts(inside, of))
    .replace(/<(g|path|rect) class="[^"]*"/g, '<$1')
    .replace(/<svg /, '<svg font-family="system-ui, sans-serif" font-size="12" ');
}

/** Defaults of the format, what the picture's root says once, and what is said to assistive programs in the page's own words instead. */
const inert = [
  ' xmlns="http://www.w3.org/2000/svg"',
  ' xmlns:xlink="http://www.w3.org/1999/xlink"',
  ' version="1.1"',
  ' aria-hidden="true"',
  ' pointer-events="none"',
  ' opacity="1"',
  ' fill-opacity="1"',
  ' stroke-width="1"',
  ' stroke-miterlimit="4"',
  ' font-weight="normal"',
  ' font-family="system-ui, sans-serif"',
  ' font-size="12px"',
  ' role="graphics-object"',
  ' aria-roledescription="group mark container"',
];

const slimTag = (tag: string): string =>
  inert
    .reduce((text, one) => text.replace(one, ''), tag)
    .replace(/ (d|transform|x|y|x2|y2|width|height|x1|y1)="([^"]*)"/g, (_, name, value) => ` ${name}="${shortNumbers(value)}"`);

const shortNumbers = (text: string): string =>
  text.replace(/-?\d*\.\d\d+(?:e[-+]?\d+)?/g, (number) => String(Math.round(Number(number) * 10) / 10 || 0));

const attribute = (name: string, value: string | undefined): string => (value === undefined ? '' : ` ${name}="${value}"`);

const attributesOf = (tag: string): Map<string, string> =>
  new Map([...tag.matchAll(/([\w-]+)="([^"]*)"/g)].map((found) => [found[1]!, found[2]!]));

const without = (all: ReadonlyMap<string, string>, ...names: readonly string[]): string =>
  [...all]
    .filter(([name]) => !names.includes(name))
    .map(([name, value]) => attribute(name, value))
    .join('');

/** Filled circles of one style as one path: each a line of no length with round ends. Undefined where they differ. */
function dots(inside: string, of: string): string | undefined {
  const parts = [...inside.matchAll(/<path ([^>]*)\/>/g)].map((found) => attributesOf(found[1]!));
  const radius = (one: Map<string, string>): string | undefined =>
    /^M([\d.]+),0A\1,\1,0,1,1,-\1,0A\1,\1,0,1,1,\1,0$/.exec(one.get('d') ?? '')?.[1];
  const [first] = parts;
  const [r, fill] = [radius(first!), first!.get('fill')];
  if (r === undefined || fill === undefined || first!.has('stroke')) return undefined;
  const alike = parts.every((one) => radius(one) === r && without(one, 'd', 'transform') === without(first!, 'd', 'transform'));
  const places = parts.map((one) => placeOf(one.get('transform')));
  if (!alike || places.includes(undefined)) return undefined;
  const path = places.map((place) => `M${place![0]} ${place![1]}h0`).join('');
  return `<path${of}${without(first!, 'd', 'transform', 'fill')} stroke="${fill}" stroke-width="${2 * Number(r)}" stroke-linecap="round" d="${path}"/>`;
}

/** Straight lines of one style as one path. Undefined where they differ. */
function lines(inside: string, of: string): string | undefined {
  const parts = [...inside.matchAll(/<line ([^>]*)\/>/g)].map((found) => attributesOf(found[1]!));
  const own = ['transform', 'x2', 'y2'];
  const style = without(parts[0]!, ...own);
  const places = parts.map((one) => placeOf(one.get('transform')));
  if (places.includes(undefined) || parts.some((one) => without(one, ...own) !== style)) return undefined;
  const path = parts.map((one, k) => `M${places[k]![0]} ${places[k]![1]}${step(one.get('x2'), one.get('y2'))}`).join('');
  return `<path${of}${style} d="${path}"/>`;
}

const step = (x = '0', y = '0'): string => (y === '0' ? `h${x}` : x === '0' ? `v${y}` : `l${x} ${y}`);

/** Texts keep what is their own; what all share stands on the group. */
function texts(inside: string, of: string): string {
  const parts = [...inside.matchAll(/<text ([^>]*)>([^<]*)<\/text>/g)]
    .map((found) => ({ own: attributesOf(found[1]!), text: found[2]! }))
    .filter((one) => one.text !== '');
  if (parts.length === 0) return '';
  const shared = new Map(
    [...parts[0]!.own].filter(([name, value]) => name !== 'transform' && parts.every(({ own }) => own.get(name) === value)),
  );
  const each = parts.map(({ own, text }) => {
    const place = placeOf(own.get('transform'));
    const at = place === undefined ? attribute('transform', own.get('transform')) : ` x="${place[0]}" y="${place[1]}"`;
    return `<text${at}${without(own, 'transform', ...shared.keys())}>${text}</text>`;
  });
  return `<g${of}${without(shared)}>${each.join('')}</g>`;
}

/** x and y of a plain shift. */
function placeOf(transform: string | undefined): readonly [string, string] | undefined {
  const found = /^translate\(([^,]+),([^)]+)\)$/.exec(transform ?? '');
  return found === null ? undefined : [found[1]!, found[2]!];
}

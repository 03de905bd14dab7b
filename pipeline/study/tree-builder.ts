import { isAlias, isMap, isScalar, isSeq, type LineCounter, type Node, type YAMLMap } from 'yaml';
import type { Message } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/study.ts';
import { caps } from './caps.ts';
import type { MapTree, ScalarTree, Tree } from './tree.ts';

/** Place of a character offset. */
export const placeAt = (file: string, lines: LineCounter, offset: number): Place => {
  const { line, col } = lines.linePos(offset);
  return { file, line: Math.max(1, line), column: Math.max(1, col) };
};

// What an editor does not show and no text needs; tab and line feed may stand.
const isControl = (character: string): boolean => (character < ' ' && character !== '\t' && character !== '\n') || character === '\u007f';

/** Turns the parser's nodes into a tree; what is wrong with a part is kept in `faults`, the part then reads as nothing. */
export class TreeBuilder {
  readonly faults: Message[] = [];
  private readonly file: string;
  private readonly lines: LineCounter;
  private readonly open = new Set<Node>();
  private readonly anchors = new Map<string, Node>();
  private values = 0;
  private aliases = 0;

  constructor(file: string, lines: LineCounter) {
    this.file = file;
    this.lines = lines;
  }

  /** `above` is the place of what holds the node, for nodes that are not there. */
  build(node: Node | null | undefined, path: string, above?: Place): Tree {
    const at = this.place(node, path, above);
    this.values += 1;
    if (this.values === caps.values + 1) return this.broken('too-many-values', says.tooManyValues(caps.values), at);
    if (node === null || node === undefined || this.values > caps.values) return { kind: 'scalar', value: null, text: '', place: at };
    if (this.open.has(node)) return this.broken('alias-of-itself', says.aliasOfItself, at);
    if (this.aliases === 0 && !isAlias(node) && node.anchor !== undefined) this.anchors.set(node.anchor, node);
    this.open.add(node);
    const tree = this.ofKind(node, path, at);
    this.open.delete(node);
    return tree;
  }

  private ofKind(node: Node, path: string, at: Place): Tree {
    if (isAlias(node)) return this.alias(node.source, path, at);
    if (isSeq(node))
      return { kind: 'list', items: node.items.map((item, k) => this.build(item as Node, `${path}[${k + 1}]`, at)), place: at };
    if (isMap(node)) return { kind: 'map', entries: this.entries(node, path, at), place: at };
    if (isScalar(node)) return this.scalar(node.value, node.source, at);
    return this.broken('yaml', says.notYaml('a node of no known kind'), at);
  }

  private alias(name: string, path: string, at: Place): Tree {
    const meant = this.anchors.get(name);
    if (meant === undefined) return this.broken('unknown-alias', says.unknownAlias(name), at);
    this.aliases += 1;
    const written = this.build(meant, path);
    this.aliases -= 1;
    return { ...written, place: at };
  }

  private entries(node: YAMLMap, path: string, at: Place): MapTree['entries'] {
    const seen = new Set<string>();
    return node.items.flatMap((pair) => {
      const keyNode = pair.key as Node | null;
      const keyPlace = this.place(keyNode, path, at);
      if (!isScalar(keyNode)) {
        this.broken('key-not-text', says.keyNotText, keyPlace);
        return [];
      }
      const key = typeof keyNode.value === 'string' ? keyNode.value : (keyNode.source ?? String(keyNode.value));
      const place = { ...keyPlace, key: path === '' ? key : `${path}.${key}` };
      if (key === '__proto__') this.broken('key-not-allowed', says.keyNotAllowed(key), place);
      if (seen.has(key)) this.broken('key-twice', says.keyTwice(key), place);
      seen.add(key);
      return [{ key, place, value: this.build(pair.value as Node | null, place.key, place) }];
    });
  }

  private scalar(value: unknown, source: string | undefined, place: Place): ScalarTree {
    const text = typeof value === 'string' ? value : (source ?? (value === null ? '' : String(value)));
    if (text.length > caps.text) return this.broken('text-too-long', says.textTooLong(text.length, caps.text), place);
    if (typeof value === 'boolean' || value === null) return { kind: 'scalar', value, text, place };
    if (typeof value === 'number' && Number.isFinite(value)) return { kind: 'scalar', value, text, place };
    if ([...text].some(isControl)) return this.broken('control-character', says.controlCharacter, place);
    return { kind: 'scalar', value: text, text, place };
  }

  private place(node: Node | null | undefined, path: string, above?: Place): Place {
    if (node?.range == null && above !== undefined) return { ...above, key: path };
    return { ...placeAt(this.file, this.lines, node?.range?.[0] ?? 0), ...(path === '' ? {} : { key: path }) };
  }

  private broken(code: string, text: string, place: Place): ScalarTree {
    this.faults.push({ code, text, place });
    return { kind: 'scalar', value: null, text: '', place };
  }
}

import {
  Composer,
  type Document,
  isAlias,
  isMap,
  isScalar,
  isSeq,
  LineCounter,
  type Node,
  Parser,
  type YAMLError,
  type YAMLMap,
} from 'yaml';
import type { Message } from '../base/message.ts';
import type { Place } from '../base/place.ts';
import { says } from '../base/says/study.ts';
import { caps } from './caps.ts';
import { nestingDepth } from './nesting.ts';

/** A YAML value with the place of every part; aliases written out, keys unique, depth and number of values capped. */
export type Tree = ScalarTree | ListTree | MapTree;

export interface ScalarTree {
  readonly kind: 'scalar';
  readonly value: string | number | boolean | null;
  /** Characters as written: `0.40` and `007` keep their zeros. */
  readonly text: string;
  readonly place: Place;
}

export interface ListTree {
  readonly kind: 'list';
  readonly items: readonly Tree[];
  readonly place: Place;
}

export interface MapTree {
  readonly kind: 'map';
  readonly entries: readonly { readonly key: string; readonly place: Place; readonly value: Tree }[];
  readonly place: Place;
}

/** Syntax only. `tree` is absent where the text is no YAML; faults beside a tree are such that the rest can still be read. Never throws. */
export function readTree(text: string, file: string): { readonly tree?: Tree; readonly faults: readonly Message[] } {
  const lines = new LineCounter();
  const fault = (code: string, says: string, offset = 0): Message => ({ code, text: says, place: placeAt(file, lines, offset) });
  if (text.length > caps.characters) return { faults: [fault('study-too-large', says.tooLarge(text.length, caps.characters))] };
  const tokens = [...new Parser(lines.addNewLine).parse(text)];
  if (nestingDepth(tokens) > caps.depth) return { faults: [fault('too-deep', says.tooDeep(caps.depth))] };
  const documents = [...new Composer({ uniqueKeys: false, prettyErrors: false }).compose(tokens)];
  const document = documents[0];
  if (document === undefined) return { faults: [fault('empty-study', says.emptyFile)] };
  const syntax = documents.flatMap(({ errors }) => errors).map((error) => fault('yaml', yamlSays(error), error.pos[0]));
  if (syntax.length > 0) return { faults: syntax };
  if (documents.length > 1) return { faults: [fault('two-documents', says.twoDocuments, documents[1]!.range[0])] };
  if (document.contents === null) return { faults: [fault('empty-study', says.emptyFile)] };
  const tags = document.warnings.map((warning) => fault('yaml-tag', says.tag(warning.message), warning.pos[0]));
  const walked = writeOut(document, file, lines);
  return { tree: walked.tree, faults: [...tags, ...walked.faults] };
}

const placeAt = (file: string, lines: LineCounter, offset: number): Place => {
  const { line, col } = lines.linePos(offset);
  return { file, line: Math.max(1, line), column: Math.max(1, col) };
};

/** The parser's own sentence, except where it does not say what would be right. */
function yamlSays({ code, message }: YAMLError): string {
  if (code === 'TAB_AS_INDENT') return says.tab;
  return says.notYaml(message.split('\n')[0]!);
}

function writeOut(document: Document, file: string, lines: LineCounter): { readonly tree: Tree; readonly faults: readonly Message[] } {
  const faults: Message[] = [];
  const open = new Set<Node>();
  const anchors = new Map<string, Node>();
  let values = 0;
  let aliases = 0;

  const place = (node: Node | null | undefined, path: string, or?: Place): Place => {
    if (node?.range == null && or !== undefined) return { ...or, key: path };
    return { ...placeAt(file, lines, node?.range?.[0] ?? 0), ...(path === '' ? {} : { key: path }) };
  };
  const nothing = (at: Place): ScalarTree => ({ kind: 'scalar', value: null, text: '', place: at });
  const broken = (code: string, text: string, at: Place): ScalarTree => {
    faults.push({ code, text, place: at });
    return nothing(at);
  };

  const walk = (node: Node | null | undefined, path: string, or?: Place): Tree => {
    const at = place(node, path, or);
    values += 1;
    if (values > caps.values)
      return values === caps.values + 1 ? broken('too-many-values', says.tooManyValues(caps.values), at) : nothing(at);
    if (node === null || node === undefined) return nothing(at);
    if (open.has(node)) return broken('alias-of-itself', says.aliasOfItself, at);
    if (aliases === 0 && !isAlias(node) && node.anchor !== undefined) anchors.set(node.anchor, node);
    open.add(node);
    const tree = walkKind(node, path, at);
    open.delete(node);
    return tree;
  };

  const walkKind = (node: Node, path: string, at: Place): Tree => {
    if (isAlias(node)) {
      const meant = anchors.get(node.source);
      if (meant === undefined) return broken('unknown-alias', says.unknownAlias(node.source), at);
      aliases += 1;
      const written = walk(meant, path);
      aliases -= 1;
      return { ...written, place: at };
    }
    if (isSeq(node)) return { kind: 'list', items: node.items.map((item, k) => walk(item as Node, `${path}[${k + 1}]`, at)), place: at };
    if (isMap(node)) return { kind: 'map', entries: walkEntries(node, path, at), place: at };
    if (isScalar(node)) return scalar(node.value, node.source, at);
    return nothing(at);
  };

  const walkEntries = (node: YAMLMap, path: string, at: Place): MapTree['entries'] => {
    const seen = new Set<string>();
    return node.items.flatMap((pair) => {
      const keyNode = pair.key as Node | null;
      const keyPlace = place(keyNode, path, at);
      if (!isScalar(keyNode)) {
        broken('key-not-text', says.keyNotText, keyPlace);
        return [];
      }
      const key = typeof keyNode.value === 'string' ? keyNode.value : (keyNode.source ?? String(keyNode.value));
      const inner = path === '' ? key : `${path}.${key}`;
      const keyAt = { ...keyPlace, key: inner };
      if (key === '__proto__') broken('key-not-allowed', says.keyNotAllowed(key), keyAt);
      if (seen.has(key)) broken('key-twice', says.keyTwice(key), keyAt);
      seen.add(key);
      return [{ key, place: keyAt, value: walk(pair.value as Node | null, inner, keyAt) }];
    });
  };

  const scalar = (value: unknown, source: string | undefined, at: Place): ScalarTree => {
    const text = typeof value === 'string' ? value : (source ?? (value === null ? '' : String(value)));
    if (text.length > caps.text) return broken('text-too-long', says.textTooLong(text.length, caps.text), at);
    if (typeof value === 'number')
      return Number.isFinite(value) ? { kind: 'scalar', value, text, place: at } : { kind: 'scalar', value: text, text, place: at };
    if (typeof value === 'boolean' || value === null) return { kind: 'scalar', value, text, place: at };
    // biome-ignore lint/suspicious/noControlCharactersInRegex: these are what is looked for
    if (/[\u0000-\u0008\u000b-\u001f\u007f]/.test(text)) return broken('control-character', says.controlCharacter, at);
    return { kind: 'scalar', value: text, text, place: at };
  };

  const tree = walk(document.contents as Node | null, '');
  return { tree, faults };
}

/** The value without places, for the schema. */
export function plain(tree: Tree): unknown {
  if (tree.kind === 'scalar') return tree.value;
  if (tree.kind === 'list') return tree.items.map(plain);
  return Object.fromEntries(tree.entries.map(({ key, value }) => [key, plain(value)]));
}

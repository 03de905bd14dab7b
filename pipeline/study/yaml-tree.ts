import { Composer, type Document, LineCounter, Parser, type YAMLError } from 'yaml';
import type { Message } from '../base/message.ts';
import { says } from '../base/says/study.ts';
import { caps } from './caps.ts';
import { nestingDepth } from './nesting.ts';
import type { Tree } from './tree.ts';
import { placeAt, TreeBuilder } from './tree-builder.ts';

/** `tree` is absent where the text is no YAML; faults beside a tree are such that the rest can still be read. */
export interface ReadTree {
  readonly tree?: Tree;
  readonly faults: readonly Message[];
}

/** Syntax only. Size and depth are looked at before the parser sees them: a deep text would exhaust the process. Never throws. */
export function readTree(text: string, file: string): ReadTree {
  const lines = new LineCounter();
  const fault = (code: string, sentence: string, offset = 0): Message => ({ code, text: sentence, place: placeAt(file, lines, offset) });
  if (text.length > caps.characters) return { faults: [fault('study-too-large', says.tooLarge(text.length, caps.characters))] };
  const tokens = [...new Parser(lines.addNewLine).parse(text)];
  if (nestingDepth(tokens) > caps.depth) return { faults: [fault('too-deep', says.tooDeep(caps.depth))] };
  const documents = [...new Composer({ uniqueKeys: false, prettyErrors: false }).compose(tokens)];
  const syntax = documents.flatMap(({ errors }) => errors).map((error) => fault('yaml', yamlSays(error), error.pos[0]));
  if (syntax.length > 0) return { faults: syntax };
  const [document, second] = documents;
  if (document === undefined || document.contents === null) return { faults: [fault('empty-study', says.emptyFile)] };
  if (second !== undefined) return { faults: [fault('two-documents', says.twoDocuments, second.range[0])] };
  return treeOf(document, file, lines);
}

function treeOf(document: Document.Parsed, file: string, lines: LineCounter): ReadTree {
  const tags = document.warnings.map(({ message, pos }) => ({
    code: 'yaml-tag',
    text: says.tag(short(message)),
    place: placeAt(file, lines, pos[0]),
  }));
  const builder = new TreeBuilder(file, lines);
  const tree = builder.build(document.contents, '');
  return { tree, faults: [...tags, ...builder.faults] };
}

/** The parser's own sentence, except where it does not say what would be right. */
function yamlSays({ code, message }: YAMLError): string {
  return code === 'TAB_AS_INDENT' ? says.tab : says.notYaml(short(message));
}

const short = (message: string): string => {
  const line = message.split('\n')[0]!;
  return line.length > 200 ? `${line.slice(0, 200)}...` : line;
};

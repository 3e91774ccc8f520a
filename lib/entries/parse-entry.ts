import matter from 'gray-matter';
import { isMap, isSeq, LineCounter, parseDocument, visit, type Document } from 'yaml';
import { citationFaults } from './citations';
import { entrySchema, type FrontMatter } from './schema';

/** Limits on one file; each refusal names the line. */
export const MAX_BYTES = 64 * 1024;
export const MAX_LINE_LENGTH = 2_000;
export const MAX_YAML_DEPTH = 8;
export const MAX_QUOTE_DEPTH = 20;

export type Fault = { line: number; field: string; message: string };
export type ParsedEntry = { frontMatter: FrontMatter; body: string };
export type Parsed = { ok: true; entry: ParsedEntry } | { ok: false; faults: Fault[] };

const CONTROL =
  /[\u0000-\u0008\u000b-\u001f\u007f-\u009f\u200b-\u200f\u202a-\u202e\u2060-\u2069\ufeff]|[\ud800-\udbff](?![\udc00-\udfff])|(?<![\ud800-\udbff])[\udc00-\udfff]/;

const deny = () => {
  throw new Error('front matter must be YAML');
};
const DENIED = { javascript: deny, js: deny, json: deny, coffee: deny, coffeescript: deny, cson: deny, toml: deny };

const fault = (line: number, field: string, message: string): Fault => ({ line, field, message });

/** What can be told from the raw text, before any parser sees it. */
function rawFaults(text: string): Fault[] {
  if (Buffer.byteLength(text) > MAX_BYTES) return [fault(1, 'file', `is larger than ${MAX_BYTES} bytes`)];
  if (!text.startsWith('---\n')) return [fault(1, 'file', 'must begin with a line of three hyphens, then YAML')];
  const lines = text.split('\n');
  const faults: Fault[] = [];
  lines.forEach((line, index) => {
    const control = CONTROL.exec(line);
    if (control)
      faults.push(
        fault(
          index + 1,
          'text',
          `holds the character U+${control[0].codePointAt(0)?.toString(16).padStart(4, '0')}, which is not allowed`,
        ),
      );
    if (line.length > MAX_LINE_LENGTH)
      faults.push(fault(index + 1, 'text', `is longer than ${MAX_LINE_LENGTH} characters`));
    if (/^[ \t>]*/.exec(line)![0].replace(/[^>]/g, '').length > MAX_QUOTE_DEPTH || /^ {60,}|^\t{15,}/.test(line))
      faults.push(fault(index + 1, 'text', 'is nested too deeply'));
  });
  return faults.slice(0, 20);
}

function yamlFaults(document: Document, counter: LineCounter): Fault[] {
  const at = (offset = 0) => counter.linePos(offset).line + 1;
  if (document.errors.length)
    return document.errors
      .slice(0, 20)
      .map((error) => fault(at(error.pos[0]), 'front matter', error.message.split('\n')[0]!));
  const faults: Fault[] = [];
  visit(document, {
    Alias: (_, node) => void faults.push(fault(at(node.range?.[0]), 'front matter', 'aliases are not allowed')),
    Node: (_, node, path) => {
      if ('anchor' in node && node.anchor)
        faults.push(fault(at(node.range?.[0]), 'front matter', 'anchors are not allowed'));
      if (node.tag && !/^tag:yaml.org,2002:(str|map|seq)$/.test(node.tag))
        faults.push(fault(at(node.range?.[0]), 'front matter', 'tags are not allowed'));
      if (path.filter((step) => isMap(step) || isSeq(step)).length > MAX_YAML_DEPTH)
        faults.push(fault(at(node.range?.[0]), 'front matter', 'is nested too deeply'));
    },
    Pair: (_, pair) => {
      const key = (pair.key as { value?: unknown; range?: number[] }) ?? {};
      if (['__proto__', 'constructor', 'prototype', '<<'].includes(String(key.value)))
        faults.push(fault(at(key.range?.[0]), String(key.value), 'is not a field'));
    },
  });
  return faults.slice(0, 20);
}

function lineOf(document: Document, counter: LineCounter, path: PropertyKey[]): number {
  for (let length = path.length; length > 0; length -= 1) {
    const node = document.getIn(path.slice(0, length), true) as { range?: number[] } | undefined;
    if (node?.range) return counter.linePos(node.range[0]!).line + 1;
  }
  return 1;
}

/** Brackets opened deeper than an entry needs: refused before the parser recurses into them. */
const isNestedFlow = (yaml: string) => {
  let depth = 0;
  for (const character of yaml) {
    if (character === '[' || character === '{') depth += 1;
    if (character === ']' || character === '}') depth -= 1;
    if (depth > 40) return true;
  }
  return false;
};

/**
 * Reads one Markdown file with YAML front matter.
 * All YAML scalars are read as text (failsafe schema) and converted by the entry schema, so that `0127` or `1:30` never
 * turns into a number by itself. Never throws: every fault names its line and field.
 */
export function parseEntry(text: string): Parsed {
  const raw = rawFaults(text);
  if (raw.length) return { ok: false, faults: raw };
  const counter = new LineCounter();
  let document: Document | undefined;
  let body = '';
  try {
    const end = text.indexOf('\n---', 3);
    if (end < 0) return { ok: false, faults: [fault(1, 'front matter', 'has no closing line of three hyphens')] };
    if (isNestedFlow(text.slice(0, end)))
      return { ok: false, faults: [fault(2, 'front matter', 'is nested too deeply')] };
    const yaml = (source: string) => {
      document = parseDocument(source.replace(/^\n/, ''), {
        schema: 'failsafe',
        lineCounter: counter,
        uniqueKeys: true,
        strict: true,
      });
      return {};
    };
    body = matter(text, { language: 'yaml', engines: { ...DENIED, yaml } }).content;
  } catch (error) {
    return {
      ok: false,
      faults: [
        fault(1, 'front matter', error instanceof RangeError ? 'is nested too deeply' : (error as Error).message),
      ],
    };
  }
  if (!document) return { ok: false, faults: [fault(1, 'front matter', 'is empty')] };
  const faults = yamlFaults(document, counter);
  if (faults.length) return { ok: false, faults };
  const result = entrySchema.safeParse(document.toJS({ maxAliasCount: 0 }));
  if (!result.success)
    return {
      ok: false,
      faults: result.error.issues
        .slice(0, 20)
        .map((issue) =>
          fault(lineOf(document!, counter, issue.path), issue.path.join('.') || 'front matter', issue.message),
        ),
    };
  const unlisted = citationFaults(result.data, body);
  if (unlisted.length)
    return {
      ok: false,
      faults: unlisted.map((message) => fault(lineOf(document!, counter, ['sources']), 'sources', message)),
    };
  return { ok: true, entry: { frontMatter: result.data, body } };
}

import type { Location } from 'vscode-languageserver-protocol';
import type { Subject } from './subject.ts';

/** From an alias, `*beam`, to the value that its anchor names; undefined everywhere else. */
export function definition({ analysis, uri, toRange, text }: Subject, offset: number): Location | undefined {
  const node = analysis.design.nodeAt(offset);
  if (node === undefined) return undefined;
  const { value, written } = node;
  const isAlias = text[value.start] === '*' && (value.start !== written.start || value.end !== written.end);
  if (!isAlias || offset < value.start || offset > value.end) return mergeTarget(text, offset, uri, toRange);
  return { uri, range: toRange({ start: written.start, end: written.end }) };
}

const LONGEST_LINE = 1000;
/** A merge's line, or one item of a merge of several sections. */
const MERGE = /(?:^|[\s{,])["']?<<["']?\s*:|^\s*-\s+\*/;
const ALIAS = /\*([^\s,[\]{}]+)/g;

/** A merge, `<<: *beam`, leaves no node of its own: its anchor is found by name, the last one above it. */
function mergeTarget(text: string, offset: number, uri: string, toRange: Subject['toRange']): Location | undefined {
  const lineStart = text.lastIndexOf('\n', offset - 1) + 1;
  const lineEnd = text.indexOf('\n', offset);
  const line = text.slice(lineStart, lineEnd < 0 ? text.length : lineEnd);
  if (!MERGE.test(line)) return undefined;
  for (const { index, 0: whole, 1: name = '' } of line.matchAll(ALIAS)) {
    const start = lineStart + index;
    if (offset < start || offset > start + whole.length) continue;
    const anchor = lastAnchor(text.slice(0, start), name);
    return anchor === undefined ? undefined : { uri, range: toRange({ start: anchor, end: anchor + name.length + 1 }) };
  }
  return undefined;
}

function lastAnchor(above: string, name: string): number | undefined {
  for (let at = above.lastIndexOf(`&${name}`); at >= 0; at = at === 0 ? -1 : above.lastIndexOf(`&${name}`, at - 1)) {
    const next = above[at + name.length + 1] ?? ' ';
    if (/[\s,[\]{}]/.test(next) && /[\s:[{,-]/.test(above[at - 1] ?? ' ') && !inComment(above, at)) return at;
  }
  return undefined;
}

/** Looks back no further than any line that is read, so that one of a million characters costs no more. */
function inComment(text: string, at: number): boolean {
  const near = text.slice(Math.max(0, at - LONGEST_LINE), at);
  return /(?:^|\s)#/.test(near.slice(near.lastIndexOf('\n') + 1));
}

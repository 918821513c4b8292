import type { Node, Scalar } from 'yaml';
import type { TextRange } from '../report/problem.ts';
import { tighten, withoutNote } from './lines.ts';
import type { TreeNode } from './tree.ts';

const LONGEST_UNDERLINE = 200;

/** What stands in front of a value, and how it was reached. */
export interface Place {
  readonly path: string;
  readonly depth: number;
  readonly key: TextRange | undefined;
  /** The alias that led here, if one did. */
  readonly alias: TextRange | undefined;
  /** Inside something reached by alias. */
  readonly expanding: boolean;
}

export function leafNode(text: string, node: Scalar, place: Place): TreeNode {
  const source = node.source ?? '';
  const range = rangeOf(node);
  const written = range.end > range.start ? range : underline(text, node, place);
  const isNull = node.value === null && node.type === 'PLAIN';
  const quotes = node.type === 'QUOTE_DOUBLE' || node.type === 'QUOTE_SINGLE' ? 1 : 0;
  const mappable =
    quotes === 1 || node.type === 'PLAIN' ? written.end - written.start - 2 * quotes === source.length : false;
  const value = place.alias ?? (spansLines(text, written) ? underline(text, node, place) : written);
  const made = branchNode(place, value, written, isNull ? 'null' : 'scalar', isNull ? null : plainValue(node, source));
  made.text = source;
  if (mappable) made.textStart = written.start + quotes;
  return made;
}

/** A key with nothing behind it, or (`broken`) with something that can't be followed. */
export function emptyNode(place: Place, key: TextRange, kind: 'null' | 'broken'): TreeNode {
  const made = branchNode(place, key, key, kind, null);
  made.text = '';
  return made;
}

type Draft = { -readonly [Key in keyof TreeNode]: TreeNode[Key] };

export function branchNode(
  place: Place,
  value: TextRange,
  written: TextRange,
  kind: TreeNode['kind'],
  data: unknown,
): Draft {
  const { path, key } = place;
  const last = place.alias ?? written;
  const start = key === undefined ? last.start : key.start;
  const end = key === undefined ? last.end : Math.max(last.end, key.end);
  // Every node has the same fields in the same order: thousands are made for each keystroke.
  return {
    path,
    kind,
    key,
    value,
    extent: { start, end },
    written,
    merged: false,
    text: undefined,
    textStart: undefined,
    entries: undefined,
    items: undefined,
    data,
  };
}

function plainValue(node: Scalar, text: string): unknown {
  const { value } = node;
  if (typeof value === 'number') return Number.isFinite(value) ? value : text;
  return typeof value === 'boolean' || typeof value === 'string' ? value : text;
}

function spansLines(text: string, range: TextRange): boolean {
  for (let at = range.start; at < range.end; at++) if (text.charCodeAt(at) === 10) return true;
  return false;
}

/** The alias, the key, or the first line of the value, whichever there is first. */
export function underline(text: string, node: Node, place: Place): TextRange {
  const shown = place.alias ?? place.key;
  if (shown !== undefined) return shown;
  const { start, end } = rangeOf(node);
  return withoutNote(text, tighten(text, start, Math.min(end, start + LONGEST_UNDERLINE)));
}

export function rangeOf(node: Node): TextRange {
  const { range } = node;
  return range ? { start: range[0], end: range[1] } : { start: 0, end: 0 };
}

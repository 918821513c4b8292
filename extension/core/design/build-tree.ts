import { type Document, isAlias, isMap, isScalar, isSeq, type Node, type Scalar, type YAMLMap } from 'yaml';
import type { TextRange } from '../report/problem.ts';
import type { Findings } from './finding.ts';
import { tighten } from './lines.ts';
import type { TreeNode } from './tree.ts';
import { MAX_DEPTH } from './yaml.ts';

/** Values in one design, aliases expanded, and those that come from aliases; a large real one has some 1,000. */
export const MAX_NODES = 20_000;
export const MAX_EXPANDED = 2_000;
const LONGEST_UNDERLINE = 200;

/** What stands in front of a value, and how it was reached. */
interface Place {
  readonly path: string;
  readonly depth: number;
  readonly key?: TextRange;
  /** The alias that led here, if one did. */
  readonly alias?: TextRange;
  readonly merged: boolean;
  /** Inside something reached by alias. */
  readonly expanding: boolean;
}

interface Walk {
  readonly text: string;
  readonly findings: Findings;
  readonly anchors: Map<string, Node>;
  /** Nodes on the way down to the present one. */
  readonly open: Set<Node>;
  nodes: number;
  expanded: number;
}

/** The document as a tree of own nodes. What can't be followed (cycles, unknown aliases, too much) is reported and left out. */
export function buildTree(text: string, document: Document.Parsed, findings: Findings): TreeNode | undefined {
  const walk: Walk = { text, findings, anchors: new Map(), open: new Set(), nodes: 0, expanded: 0 };
  const place: Place = { path: '', depth: 0, merged: false, expanding: false };
  return document.contents === null ? undefined : build(walk, document.contents, place);
}

function build(walk: Walk, node: Node, place: Place): TreeNode | undefined {
  if (!admits(walk, node, place)) return undefined;
  if (isAlias(node)) {
    const target = follow(walk, node, place.path);
    const alias = rangeOf(node);
    return target && build(walk, target, { ...place, alias: place.alias ?? alias, expanding: true });
  }
  if ('anchor' in node && typeof node.anchor === 'string' && !place.expanding) walk.anchors.set(node.anchor, node);
  if (isScalar(node)) return leaf(walk, node, place);
  walk.open.add(node);
  let built: TreeNode | undefined;
  if (isMap(node)) {
    const entries = new Map<string, TreeNode>();
    readEntries(walk, node, place, entries);
    built = section(walk, node, place, entries);
  } else if (isSeq(node)) {
    built = list(walk, node, place);
  }
  walk.open.delete(node);
  return built;
}

/** Counts a node against the bounds; one problem where one is reached. */
function admits(walk: Walk, node: Node, place: Place): boolean {
  if (place.expanding && ++walk.expanded > MAX_EXPANDED) {
    if (walk.expanded === MAX_EXPANDED + 1) {
      const message = `Aliases expand to more than ${MAX_EXPANDED} values here; the rest is not read.`;
      walk.findings.add('alias-expansion', place.path, place.alias ?? underline(walk, node, place), message);
    }
    return false;
  }
  if (++walk.nodes > MAX_NODES) {
    if (walk.nodes === MAX_NODES + 1) {
      const message = `More than ${MAX_NODES} values: what follows is not read.`;
      walk.findings.add('file-too-large', place.path, underline(walk, node, place), message);
    }
    return false;
  }
  if (place.depth <= MAX_DEPTH) return true;
  const message = `Aliases nest values more than ${MAX_DEPTH} levels deep here.`;
  walk.findings.add('nested-too-deep', place.path, place.alias ?? underline(walk, node, place), message);
  return false;
}

function follow(walk: Walk, alias: Node & { source: string }, path: string): Node | undefined {
  const target = walk.anchors.get(alias.source);
  if (target === undefined) {
    const message = `No anchor \`&${alias.source.slice(0, 40)}\` stands before this alias.`;
    walk.findings.add('bad-alias', path, rangeOf(alias), message);
  } else if (walk.open.has(target)) {
    walk.findings.add('bad-alias', path, rangeOf(alias), 'This alias stands inside the very value that it repeats.');
    return undefined;
  }
  return target;
}

function leaf(walk: Walk, node: Scalar, place: Place): TreeNode {
  const text = node.source ?? '';
  const written = node.range && node.range[1] > node.range[0] ? rangeOf(node) : underline(walk, node, place);
  const isNull = node.value === null && node.type === 'PLAIN';
  const quotes = node.type === 'QUOTE_DOUBLE' || node.type === 'QUOTE_SINGLE' ? 1 : 0;
  const mappable = written.end - written.start - 2 * quotes === text.length && !node.type?.startsWith('BLOCK');
  const severalLines = walk.text.slice(written.start, written.end).includes('\n');
  const value = place.alias ?? (severalLines ? underline(walk, node, place) : written);
  return {
    ...common(place, value, written),
    kind: isNull ? 'null' : 'scalar',
    text,
    ...(mappable ? { textStart: written.start + quotes } : {}),
    data: isNull ? null : plainValue(node, text),
  };
}

function plainValue(node: Scalar, text: string): unknown {
  const { value } = node;
  if (typeof value === 'number') return Number.isFinite(value) ? value : text;
  return typeof value === 'boolean' || typeof value === 'string' ? value : text;
}

function section(walk: Walk, node: Node, place: Place, entries: Map<string, TreeNode>): TreeNode {
  const data: Record<string, unknown> = Object.create(null);
  for (const [key, child] of entries) data[key] = child.data;
  return { ...common(place, underline(walk, node, place), rangeOf(node)), kind: 'map', entries, data };
}

function list(walk: Walk, node: Node & { items: unknown[] }, place: Place): TreeNode {
  const items: TreeNode[] = [];
  for (const item of node.items) {
    const inner = {
      path: `${place.path}[${items.length}]`,
      depth: place.depth + 1,
      merged: false,
      expanding: place.expanding,
    };
    const child = isNode(item) ? build(walk, item, inner) : undefined;
    if (child !== undefined) items.push(child);
    if (walk.nodes > MAX_NODES || walk.expanded > MAX_EXPANDED) break;
  }
  const data = items.map((item) => item.data);
  return { ...common(place, underline(walk, node, place), rangeOf(node)), kind: 'list', items, data };
}

function readEntries(walk: Walk, node: YAMLMap, place: Place, entries: Map<string, TreeNode>): void {
  const merges: Node[] = [];
  for (const pair of node.items) {
    if (walk.nodes > MAX_NODES || walk.expanded > MAX_EXPANDED) break;
    if (!isScalar(pair.key) || typeof pair.key.source !== 'string') {
      if (isNode(pair.key)) reportKey(walk, pair.key, place.path);
      continue;
    }
    const name = pair.key.source;
    const key = rangeOf(pair.key);
    if (typeof pair.key.anchor === 'string' && !place.expanding) walk.anchors.set(pair.key.anchor, pair.key);
    if (name === '<<' && pair.key.type === 'PLAIN') {
      if (isNode(pair.value)) merges.push(pair.value);
      continue;
    }
    const path = place.path === '' ? name : `${place.path}.${name}`;
    if (name === '' || entries.has(name)) {
      const message =
        name === ''
          ? 'A key is missing before this `:`.'
          : `\`${clip(name)}\` stands twice in this section; the first is used.`;
      const range = tighten(walk.text, key.start, key.end);
      walk.findings.add(name === '' ? 'yaml-syntax' : 'duplicate-key', path, range, message);
      continue;
    }
    const inner = { path, depth: place.depth + 1, key, merged: false, expanding: place.expanding };
    const child = isNode(pair.value) ? build(walk, pair.value, inner) : nothing(inner, key, 'null');
    entries.set(name, child ?? nothing(inner, key, 'broken'));
  }
  for (const source of merges) merge(walk, source, place, entries);
}

/** `<<`: what the section does not say itself comes from the sections named, the first named first. */
function merge(walk: Walk, source: Node, place: Place, entries: Map<string, TreeNode>): void {
  const target = isAlias(source) ? follow(walk, source, place.path) : source;
  if (target === undefined) return;
  if (isSeq(target) && !isAlias(source)) {
    for (const item of target.items) if (isNode(item) && !isSeq(item)) merge(walk, item, place, entries);
    return;
  }
  if (!isMap(target)) {
    const range = tighten(walk.text, rangeOf(source).start, rangeOf(source).end);
    walk.findings.add('bad-alias', place.path, range, '`<<` merges a section, or a list of sections, given by alias.');
    return;
  }
  const alias = isAlias(source) ? rangeOf(source) : undefined;
  const inner = { ...place, depth: place.depth + 1, expanding: true, ...(alias ? { alias } : {}) };
  if (!admits(walk, target, inner)) return;
  walk.open.add(target);
  const merged = new Map<string, TreeNode>();
  readEntries(walk, target, inner, merged);
  walk.open.delete(target);
  for (const [name, child] of merged) if (!entries.has(name)) entries.set(name, { ...child, merged: true });
}

function reportKey(walk: Walk, key: Node, path: string): void {
  const range = tighten(walk.text, rangeOf(key).start, rangeOf(key).end);
  walk.findings.add('yaml-syntax', path, range, 'A key must be plain text, written out.');
}

function nothing(place: Place, key: TextRange, kind: 'null' | 'broken'): TreeNode {
  return { ...common(place, key, key), kind, text: '', data: null };
}

function common(place: Place, value: TextRange, written: TextRange) {
  const { path, key, merged } = place;
  const last = place.alias ?? (place.expanding ? value : written);
  const extent = { start: key?.start ?? last.start, end: Math.max(last.end, key?.end ?? 0) };
  return { path, merged, value, written, extent, ...(key === undefined ? {} : { key }) };
}

/** The alias, the key, or the first line of the value, whichever there is first. */
function underline(walk: Walk, node: Node, place: Place): TextRange {
  const shown = place.alias ?? place.key;
  if (shown !== undefined) return shown;
  const { start, end } = rangeOf(node);
  return tighten(walk.text, start, Math.min(end, start + LONGEST_UNDERLINE));
}

function rangeOf(node: Node): TextRange {
  return { start: node.range?.[0] ?? 0, end: node.range?.[1] ?? 0 };
}

function isNode(value: unknown): value is Node {
  return isScalar(value) || isMap(value) || isSeq(value) || isAlias(value);
}

function clip(name: string): string {
  return name.length > 40 ? `${name.slice(0, 39)}…` : name;
}

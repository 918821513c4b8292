import { type Document, isAlias, isMap, isNode, isScalar, isSeq, type Node, type Scalar, type YAMLMap } from 'yaml';
import type { ReadingCode } from './codes.ts';
import type { Findings } from './finding.ts';
import { tighten } from './lines.ts';
import { branchNode, emptyNode, leafNode, type Place, rangeOf, underline } from './make-node.ts';
import { MAX_DEPTH } from './tokens.ts';
import type { TreeNode } from './tree.ts';
import { clip } from './wording.ts';

/** Values in one design, aliases expanded, and those that come from aliases; a design of 300 lines has some 350. */
export const MAX_NODES = 20_000;
export const MAX_EXPANDED = 2_000;

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
  const place: Place = { path: '', depth: 0, key: undefined, alias: undefined, expanding: false };
  return document.contents === null ? undefined : build(walk, document.contents, place);
}

function build(walk: Walk, node: Node, place: Place): TreeNode | undefined {
  if (!admits(walk, node, place)) return undefined;
  if (isAlias(node)) {
    const target = follow(walk, node, place.path);
    return target && build(walk, target, { ...place, alias: place.alias ?? rangeOf(node), expanding: true });
  }
  if (isScalar(node)) {
    keepAnchor(walk, node, place);
    return leafNode(walk.text, node, place);
  }
  if (!isMap(node) && !isSeq(node)) return undefined;
  keepAnchor(walk, node, place);
  walk.open.add(node);
  const made = branchNode(place, underline(walk.text, node, place), rangeOf(node), isMap(node) ? 'map' : 'list', null);
  if (isMap(node)) {
    const entries = new Map<string, TreeNode>();
    readEntries(walk, node, place, entries);
    made.entries = entries;
    made.data = dataOf(entries);
  } else {
    made.items = readItems(walk, node.items, place);
    made.data = made.items.map((item) => item.data);
  }
  walk.open.delete(node);
  return made;
}

function keepAnchor(walk: Walk, node: Node & { anchor?: string | undefined }, place: Place): void {
  if (node.anchor !== undefined && !place.expanding) walk.anchors.set(node.anchor, node);
}

/** Counts a node against the bounds; one problem where one is reached. */
function admits(walk: Walk, node: Node, place: Place): boolean {
  let refusal: [code: ReadingCode, message: string] | undefined;
  if (place.expanding && ++walk.expanded > MAX_EXPANDED) {
    refusal = ['alias-expansion', `Aliases expand to more than ${MAX_EXPANDED} values; the rest is not read.`];
  } else if (++walk.nodes > MAX_NODES) {
    refusal = ['file-too-large', `More than ${MAX_NODES} values: what follows is not read.`];
  } else if (place.depth > MAX_DEPTH) {
    refusal = ['nested-too-deep', `Aliases nest values more than ${MAX_DEPTH} levels deep.`];
  }
  if (refusal === undefined) return true;
  walk.findings.add(refusal[0], place.path, underline(walk.text, node, place), refusal[1]);
  return false;
}

function isSpent(walk: Walk): boolean {
  return walk.nodes > MAX_NODES || walk.expanded > MAX_EXPANDED;
}

function follow(walk: Walk, alias: Node & { source: string }, path: string): Node | undefined {
  const target = walk.anchors.get(alias.source);
  if (target !== undefined && !walk.open.has(target)) return target;
  const message =
    target === undefined
      ? `No anchor \`&${clip(alias.source)}\` stands before this alias.`
      : 'This alias stands inside the very value that it repeats.';
  walk.findings.add('bad-alias', path, rangeOf(alias), message);
  return undefined;
}

function dataOf(entries: ReadonlyMap<string, TreeNode>): Record<string, unknown> {
  const data: Record<string, unknown> = {};
  for (const [key, child] of entries) {
    if (key !== '__proto__') data[key] = child.data;
    else Object.defineProperty(data, key, { value: child.data, enumerable: true });
  }
  return data;
}

function readItems(walk: Walk, nodes: readonly unknown[], place: Place): TreeNode[] {
  const items: TreeNode[] = [];
  for (const node of nodes) {
    if (isSpent(walk)) break;
    const path = `${place.path}[${items.length}]`;
    const inner = { path, depth: place.depth + 1, key: undefined, alias: undefined, expanding: place.expanding };
    const item = isNode(node) ? build(walk, node, inner) : undefined;
    if (item !== undefined) items.push(item);
  }
  return items;
}

function readEntries(walk: Walk, node: YAMLMap, place: Place, entries: Map<string, TreeNode>): void {
  const merges: Node[] = [];
  for (const { key, value } of node.items) {
    if (isSpent(walk)) break;
    if (!isScalar(key) || typeof key.source !== 'string' || key.source === '') {
      if (isNode(key)) reportKey(walk, key, place.path);
    } else if (key.source === '<<' && key.type === 'PLAIN') {
      if (isNode(value)) merges.push(value);
    } else {
      readEntry(walk, key, key.source, value, place, entries);
    }
  }
  for (const source of merges) merge(walk, source, place, entries);
}

function readEntry(
  walk: Walk,
  keyNode: Scalar,
  name: string,
  value: unknown,
  place: Place,
  entries: Map<string, TreeNode>,
): void {
  const key = rangeOf(keyNode);
  const step = name.length > LONGEST_STEP ? clip(name) : name;
  const path = place.path === '' ? step : `${place.path}.${step}`;
  if (entries.has(name)) {
    const range = tighten(walk.text, key.start, key.end);
    const message = `\`${clip(name)}\` stands twice in this section; the first is used.`;
    walk.findings.add('duplicate-key', path, range, message);
    return;
  }
  const inner = { path, depth: place.depth + 1, key, alias: undefined, expanding: place.expanding };
  const child = isNode(value) ? build(walk, value, inner) : emptyNode(inner, key, 'null');
  entries.set(name, child ?? emptyNode(inner, key, 'broken'));
}

/** Paths hold no longer keys whole: thousands of values under one endless key would repeat it. */
const LONGEST_STEP = 80;

/** `<<`: what the section does not say itself comes from the sections named, the first named first. */
function merge(walk: Walk, source: Node, place: Place, entries: Map<string, TreeNode>): void {
  const target = isAlias(source) ? follow(walk, source, place.path) : source;
  if (target === undefined) return;
  if (isSeq(target) && !isAlias(source)) {
    for (const item of target.items) if (isNode(item) && !isSeq(item)) merge(walk, item, place, entries);
    return;
  }
  const alias = isAlias(source) ? rangeOf(source) : place.alias;
  if (!isMap(target)) {
    const range = tighten(walk.text, rangeOf(source).start, rangeOf(source).end);
    walk.findings.add('bad-alias', place.path, range, '`<<` merges a section, or a list of sections, given by alias.');
    return;
  }
  const inner = { ...place, depth: place.depth + 1, expanding: true, alias };
  if (!admits(walk, target, inner)) return;
  walk.open.add(target);
  const merged = new Map<string, TreeNode>();
  readEntries(walk, target, inner, merged);
  walk.open.delete(target);
  for (const [name, child] of merged) if (!entries.has(name)) entries.set(name, { ...child, merged: true });
}

function reportKey(walk: Walk, key: Node, path: string): void {
  const { start, end } = rangeOf(key);
  walk.findings.add(
    'yaml-syntax',
    path,
    tighten(walk.text, start, Math.max(end, start + 1)),
    'A key must be a plain word.',
  );
}

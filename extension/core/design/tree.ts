import type { TextRange } from '../report/problem.ts';

/** A value of a design with its place in the text. */
export interface TreeNode {
  /** Dotted path, e.g. `pump.beam.radius` or `surfaces[0].beam_radius`; '' for the root. */
  readonly path: string;
  /** `broken`: something stands here that can't be followed, and a problem already says so. */
  readonly kind: 'map' | 'list' | 'scalar' | 'null' | 'broken';
  /** The key in front of it; absent in lists and at the root. */
  readonly key: TextRange | undefined;
  /** What to underline: the value's characters, or the key (a first line where there is none) of what spans lines. */
  readonly value: TextRange;
  /** Everything from the key to the last character. */
  readonly extent: TextRange;
  /** Where the value itself is written: elsewhere than `value` if that is an alias. */
  readonly written: TextRange;
  /** Taken from another section by a merge: key and value stand elsewhere in the text. */
  readonly merged: boolean;
  /** A scalar's text, without its quotes. */
  readonly text: string | undefined;
  /** Offset of `text` in the file where the two agree character by character. */
  readonly textStart: number | undefined;
  readonly entries: ReadonlyMap<string, TreeNode> | undefined;
  readonly items: readonly TreeNode[] | undefined;
  /** What a validator sees: strings, numbers, booleans, null, arrays and objects. */
  readonly data: unknown;
}

/** The deepest node whose key or value holds an offset; an end counts, so that a cursor behind a word finds it. */
export function nodeAt(root: TreeNode | undefined, offset: number): TreeNode | undefined {
  if (root === undefined || !holds(root.extent, offset)) return undefined;
  let node = root;
  for (;;) {
    const inner = childAt(node, offset);
    if (inner === undefined) return node;
    node = inner;
  }
}

function childAt(node: TreeNode, offset: number): TreeNode | undefined {
  let found: TreeNode | undefined;
  for (const child of node.entries?.values() ?? node.items ?? []) {
    // A block reaches to the next key, so of two that hold the offset the later one is meant.
    if (!child.merged && holds(child.extent, offset)) found = child;
  }
  return found;
}

function holds(range: TextRange, offset: number): boolean {
  return offset >= range.start && offset <= range.end;
}

/** Every node by its path; of two with one path (a key may itself hold a dot) the first. */
export function indexByPath(root: TreeNode | undefined): ReadonlyMap<string, TreeNode> {
  const index = new Map<string, TreeNode>();
  const visit = (node: TreeNode): void => {
    if (!index.has(node.path)) index.set(node.path, node);
    for (const child of node.entries?.values() ?? node.items ?? []) visit(child);
  };
  if (root !== undefined) visit(root);
  return index;
}

/** Path of the section or list around a path; undefined for ''. */
export function parentPath(path: string): string | undefined {
  if (path === '') return undefined;
  const at = Math.max(path.lastIndexOf('.'), path.lastIndexOf('['));
  return at < 0 ? '' : path.slice(0, at);
}

import type { FoldingRange } from 'vscode-languageserver-protocol';
import type { TreeNode } from '../core/design/tree.ts';
import type { Subject } from './subject.ts';

/** Every section and list item of more than one line, and every run of comment lines; blank lines at the end stay outside. */
export function foldingRanges({ analysis, toRange, text }: Subject): FoldingRange[] {
  const found: FoldingRange[] = [];
  const lines = text.split(/\r\n|\r|\n/);
  const visit = (node: TreeNode): void => {
    const start = toRange({ start: node.extent.start, end: node.extent.start }).start.line;
    const end = node.extent.start + text.slice(node.extent.start, node.extent.end).trimEnd().length;
    const endLine = lastLine(toRange({ start: end, end }).start.line, start, lines);
    if (node.path !== '' && !node.merged && endLine > start) found.push({ startLine: start, endLine });
    for (const child of node.entries?.values() ?? node.items ?? []) visit(child);
  };
  if (analysis.design.root !== undefined) visit(analysis.design.root);
  return [...unique(found), ...comments(lines)];
}

/** A block reaches to the next key: comments and blank lines before that belong to what follows. */
function lastLine(end: number, start: number, lines: readonly string[]): number {
  let line = Math.min(end, lines.length - 1);
  while (line > start && /^\s*(#.*)?$/.test(lines[line] ?? '')) line--;
  return line;
}

function comments(lines: readonly string[]): FoldingRange[] {
  const found: FoldingRange[] = [];
  let first: number | undefined;
  for (let line = 0; line <= lines.length; line++) {
    const isComment = line < lines.length && /^\s*#/.test(lines[line] ?? '');
    if (isComment) first ??= line;
    else if (first !== undefined) {
      if (line - 1 > first) found.push({ startLine: first, endLine: line - 1, kind: 'comment' });
      first = undefined;
    }
  }
  return found;
}

/** Of several that begin on one line (a list item and its first key) only the longest. */
function unique(ranges: readonly FoldingRange[]): FoldingRange[] {
  const longest = new Map<number, FoldingRange>();
  for (const range of ranges) {
    const known = longest.get(range.startLine);
    if (known === undefined || known.endLine < range.endLine) longest.set(range.startLine, range);
  }
  return [...longest.values()].sort((a, b) => a.startLine - b.startLine);
}

import type { DocumentSymbol, SymbolKind } from 'vscode-languageserver-protocol';
import type { TreeNode } from '../core/design/tree.ts';
import type { TextRange } from '../core/report/problem.ts';
import { oneLine, shortened } from './one-line.ts';
import type { Subject } from './subject.ts';

/** LSP's numbers: 3 namespace, 18 array, 15 string, 16 number, 19 object. */
const kinds = { section: 19, list: 18, number: 16, text: 15 } as const satisfies Record<string, SymbolKind>;

const LONGEST_LABEL = 60;

/** Sections, keys and list items of a design as they are nested in the text; what a merge brings in stands elsewhere. */
export function documentSymbols({ analysis, toRange }: Subject): DocumentSymbol[] {
  const { root } = analysis.design;
  return root === undefined ? [] : childrenOf(root, root.extent, toRange);
}

function childrenOf(node: TreeNode, within: TextRange, toRange: Subject['toRange']): DocumentSymbol[] {
  const children = [...(node.entries?.entries() ?? [])].map(([name, child]) => ({ name, child }));
  const items = (node.items ?? []).map((child, index) => ({ name: itemName(child, index), child }));
  return [...children, ...items].flatMap(({ name, child }): DocumentSymbol[] => {
    // What an alias stands for is written elsewhere: editors refuse children outside of their parents.
    if (child.merged || !inside(child.extent, within)) return [];
    const selection = child.key ?? child.value;
    const range = {
      start: Math.min(child.extent.start, selection.start),
      end: Math.max(child.extent.end, selection.end),
    };
    const inner = childrenOf(child, range, toRange);
    const detail = child.kind === 'scalar' ? label(child.text ?? '') : '';
    return [
      {
        name: label(name) === '' ? '(no name)' : label(name),
        ...(detail !== '' && { detail }),
        kind: kindOf(child),
        range: toRange(range),
        selectionRange: toRange(selection),
        ...(inner.length > 0 && { children: inner }),
      },
    ];
  });
}

function label(text: string): string {
  return shortened(oneLine(text), LONGEST_LABEL);
}

function inside(inner: TextRange, outer: TextRange): boolean {
  return inner.start >= outer.start && inner.end <= outer.end;
}

function itemName(item: TreeNode, index: number): string {
  return item.entries?.get('name')?.text ?? item.text ?? `item ${index + 1}`;
}

function kindOf({ kind, data }: TreeNode): SymbolKind {
  if (kind === 'map') return kinds.section;
  if (kind === 'list') return kinds.list;
  return typeof data === 'number' || /^[+-]?[\d.]/.test(String(data)) ? kinds.number : kinds.text;
}

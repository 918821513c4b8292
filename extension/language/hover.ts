import type { Hover } from 'vscode-languageserver-protocol';
import type { Analysis } from '../core/analyse.ts';
import type { TreeNode } from '../core/design/tree.ts';
import type { TextRange } from '../core/report/problem.ts';
import { filledIn } from './filled-in.ts';
import { keyHelp } from './key-help.ts';
import { code, escaped } from './markdown.ts';
import type { Subject } from './subject.ts';
import { fullSummary, summary } from './summary.ts';
import { requirementRow, surfaceRow } from './verdicts.ts';

/** Keys that stand for the module as a whole. */
const headKeys: readonly string[] = ['title', 'format'];

/** What is known of the key or value at an offset, and the pulse that the design gives; undefined elsewhere. */
export function hover({ analysis, toRange }: Subject, offset: number): Hover | undefined {
  const node = analysis.design.nodeAt(offset);
  const place = node === undefined ? undefined : hoverPlace(node, offset);
  if (node === undefined || place === undefined) return undefined;
  const blocks = headKeys.includes(node.path)
    ? fullSummary(analysis)
    : [...about(analysis, node), '---', ...judged(analysis, node.path), ...summary(analysis)];
  return { contents: { kind: 'markdown', value: blocks.join('\n\n') }, range: toRange(place) };
}

/** A leaf answers on its key, its value and between; a section only on its key, not on all that it holds. */
function hoverPlace({ key, value, kind }: TreeNode, offset: number): TextRange | undefined {
  const isLeaf = kind === 'scalar' || kind === 'null';
  if (key === undefined) return isLeaf && holds(value, offset) ? value : undefined;
  const place = isLeaf && value.start >= key.end ? { start: key.start, end: value.end } : key;
  return holds(place, offset) ? place : undefined;
}

function holds({ start, end }: TextRange, offset: number): boolean {
  return offset >= start && offset <= end;
}

function about({ design, resolved }: Analysis, node: TreeNode): readonly string[] {
  const written = node.text === undefined ? '' : ` = ${code(node.text)}`;
  const heading = `**${escaped(node.path)}**${written}`;
  const schema = design.schemaOf(node.path);
  if (schema === undefined) return [heading];
  const help = [heading, ...keyHelp(schema)];
  const filled = filledIn(resolved.origins, node.path);
  return filled.length === 0 ? help : [...help, `Not written here, so filled in:\n${filled.join('\n')}`];
}

/** How the prediction stands against the requirement or the surface that the path belongs to. */
function judged({ prediction, problems }: Analysis, path: string): readonly string[] {
  if (prediction === undefined) return [];
  const [section = '', key = ''] = path.split('.');
  const wanted = prediction.requirements.filter(
    ({ name }) => section === 'requirements' && (key === '' || name === key),
  );
  const index = Number(/^surfaces\[(\d+)\]/.exec(path)?.[1]);
  const surface = prediction.surfaces[index];
  return [
    ...wanted.map(requirementRow).map(({ name, required, predicted, verdict }) => {
      if (predicted === undefined) return `${name} ${required}: not predicted by this model.`;
      return `${name} ${required}, predicted ${predicted}: ${verdict === 'good' ? 'met' : '**missed**'}.`;
    }),
    ...(surface === undefined ? [] : [surfaceRow(surface, index, problems)]).map(({ fluence, threshold, margin }) => {
      const against = threshold === undefined ? '' : ` against a threshold of ${threshold} at this pulse's width`;
      return `Peak fluence ${fluence}${against}${margin === undefined ? '' : `: margin ${margin}`}.`;
    }),
  ];
}

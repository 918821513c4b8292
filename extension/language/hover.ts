import type { Hover } from 'vscode-languageserver-protocol';
import type { TreeNode } from '../core/design/tree.ts';
import type { TextRange } from '../core/report/problem.ts';
import { filledIn } from './filled-in.ts';
import { keyHelp } from './key-help.ts';
import { code, escaped } from './markdown.ts';
import { sensitivityHelp, spreadHelp } from './sensitivity-help.ts';
import { siMeaning } from './si-meaning.ts';
import type { Subject } from './subject.ts';
import { fullSummary, summary } from './summary.ts';
import { tableHelp } from './table-help.ts';
import { requirementRow, surfaceRow } from './verdicts.ts';

/** Keys that stand for the module as a whole. */
const headKeys: readonly string[] = ['title', 'format'];

/** What is known of the key or value at an offset, and the pulse that the design gives; undefined elsewhere. */
export function hover(subject: Subject, offset: number): Hover | undefined {
  const { analysis, toRange } = subject;
  const node = analysis.design.nodeAt(offset);
  const place = node === undefined ? undefined : hoverPlace(node, offset);
  if (node === undefined || place === undefined) return undefined;
  const blocks = headKeys.includes(node.path)
    ? [...fullSummary(analysis), ...spreadHelp(subject.explorer.spreads())]
    : [...about(subject, node), '---', ...judged(subject, node.path), ...summary(analysis)];
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

/** A heading that an aliased value shares; what the key means; what moves with it; where a figure comes from. */
function about(subject: Subject, node: TreeNode): readonly string[] {
  const { design, resolved } = subject.analysis;
  const schema = design.schemaOf(node.path);
  const meaning = schema && siMeaning(node, schema);
  const written = node.text === undefined ? '' : ` = ${code(node.text)}${meaning === undefined ? '' : ` = ${meaning}`}`;
  const heading = `**${escaped(node.path)}**${written}`;
  if (schema === undefined) return [heading];
  const filled = filledIn(resolved.origins, node.path);
  return [
    heading,
    ...keyHelp(schema),
    ...tableHelp(subject.analysis, node.path),
    ...sensitivityHelp(subject, node.path),
    ...(filled.length === 0 ? [] : [`Not written here, so filled in:\n${filled.join('\n')}`]),
  ];
}

/** How the prediction stands against the requirement or the surface that the path belongs to. */
function judged({ analysis, explorer }: Subject, path: string): readonly string[] {
  const { prediction, problems } = analysis;
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
    ...(wanted.length === 0 ? [] : spreadHelp(explorer.spreads())),
    ...(surface === undefined ? [] : [surfaceRow(surface, index, problems)]).map(({ fluence, threshold, margin }) => {
      const against = threshold === undefined ? '' : ` against a threshold of ${threshold} at this pulse's width`;
      return `Peak fluence ${fluence}${against}${margin === undefined ? '' : `: margin ${margin}`}.`;
    }),
  ];
}

import type { DocumentSymbol, Range } from 'vscode-languageserver-protocol';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { analyse } from '../../extension/core/analyse.ts';
import { codeActions } from '../../extension/language/code-actions.ts';
import { codeLenses } from '../../extension/language/code-lenses.ts';
import { completion } from '../../extension/language/completion/completion.ts';
import { definition } from '../../extension/language/definition.ts';
import { diagnostics } from '../../extension/language/diagnostics.ts';
import { foldingRanges } from '../../extension/language/folding.ts';
import { hover } from '../../extension/language/hover.ts';
import { inlayHints } from '../../extension/language/inlay-hints.ts';
import { readout } from '../../extension/language/readout.ts';
import { show } from '../../extension/language/show.ts';
import type { Subject } from '../../extension/language/subject.ts';
import { documentSymbols } from '../../extension/language/symbols.ts';
import { defaultSettings } from '../../extension/protocol/requests.ts';
import { createAnalyses } from '../../extension/server/analyses.ts';

/** What was seen while a text was typed: states, how many of them predicted a pulse, and everything that was not right. */
export interface Typed {
  readonly states: number;
  readonly predicted: number;
  readonly faults: readonly string[];
}

/**
 * Types a design character by character into one document, as an editor would, and asks for every feature at the cursor
 * after each. Faults: what throws, a range outside the text, a figure that is not that of the text as it stands.
 * `actions`: every so many characters code actions are asked for as well, since they solve for values, and the analysis
 * kept for the document is compared with one made anew.
 */
export function typeThrough(text: string, actions = 25): Typed {
  const uri = 'file:///typed.gainmodule.yaml';
  let document = TextDocument.create(uri, 'gainmodule', 0, '');
  const analyses = createAnalyses({ get: () => document }, analyse);
  const faults: string[] = [];
  let predicted = 0;
  for (let length = 1; length <= text.length; length++) {
    const end = document.positionAt(length - 1);
    const change = { range: { start: end, end }, text: text[length - 1] ?? '' };
    document = TextDocument.update(document, [change], length);
    try {
      const subject = analyses.of(uri);
      if (subject === undefined || 'failure' in subject) throw new Error(subject?.failure ?? 'no subject');
      if (subject.version !== length) faults.push(`at ${length}: version ${subject.version}`);
      if (subject.analysis.prediction?.pulse !== undefined) predicted += 1;
      faults.push(...look(subject, document, length % actions === 0).map((fault) => `at ${length}: ${fault}`));
    } catch (error) {
      faults.push(`at ${length}: ${String(error)}`);
    }
  }
  return { states: text.length, predicted, faults };
}

function look(subject: Subject, document: TextDocument, withActions: boolean): string[] {
  const text = document.getText();
  const offset = text.length;
  const faults: string[] = [];
  if (subject.text !== text) faults.push('a subject of another text');
  const inside = (what: string, range: Range): void => {
    const [start, end] = [document.offsetAt(range.start), document.offsetAt(range.end)];
    // `offsetAt` clamps: a place outside the text comes back changed.
    const back = document.positionAt(end);
    if (start > end || back.line !== range.end.line || back.character !== range.end.character)
      faults.push(`${what} outside the text`);
  };
  const found = hover(subject, offset);
  if (found?.range) inside('a hover', found.range);
  for (const { range } of diagnostics(subject)) inside('a problem', range);
  for (const { textEdit } of completion(subject, offset))
    if (textEdit && 'range' in textEdit) inside('a completion', textEdit.range);
  const symbols = documentSymbols(subject);
  for (const { range } of symbols) inside('a symbol', range);
  if (!isNested(symbols, document)) faults.push('symbols outside of their parents');
  for (const { endLine } of foldingRanges(subject))
    if (endLine >= document.lineCount) faults.push('a fold outside the text');
  definition(subject, offset);
  if (withActions) {
    codeActions(subject, { start: Math.max(0, offset - 40), end: offset }, undefined);
    const fresh = analyse(text);
    const same = (key: 'prediction' | 'problems') =>
      JSON.stringify(subject.analysis[key]) === JSON.stringify(fresh[key]);
    if (!same('prediction')) faults.push('a prediction of another text');
    if (!same('problems')) faults.push('problems of another text');
  }
  return [...faults, ...staleFigures(subject)];
}

/** Whether each symbol holds its name and its children, without which an editor refuses them all. */
function isNested(symbols: readonly DocumentSymbol[], document: TextDocument): boolean {
  const holds = (outer: Range, inner: Range): boolean =>
    document.offsetAt(outer.start) <= document.offsetAt(inner.start) &&
    document.offsetAt(inner.end) <= document.offsetAt(outer.end);
  return symbols.every(
    ({ name, range, selectionRange, children = [] }) =>
      name !== '' &&
      holds(range, selectionRange) &&
      children.every((child) => holds(range, child.range)) &&
      isNested(children, document),
  );
}

/** Figures shown anywhere against those of the text as it stands. */
function staleFigures(subject: Subject): string[] {
  const { prediction } = subject.analysis;
  const energy = show(prediction?.pulse?.energy_J, 'energy');
  const stored = show(prediction?.state.stored_energy_J, 'energy');
  const lenses = codeLenses(subject, undefined);
  const title = lenses[0]?.command?.title ?? '';
  const hints = inlayHints(subject, { start: 0, end: subject.text.length }, defaultSettings.inlayHints);
  const state = readout(subject);
  return [
    ...(lenses.length === 1 && lenses[0]?.range.start.line === 0 ? [] : ['not one lens on the first line']),
    ...((energy === undefined ? /^No pulse/.test(title) : title.startsWith(`${energy} · `))
      ? []
      : [`a lens of another text: ${title}`]),
    ...(hints.every(({ label }) => !String(label).startsWith('stored') || label === `stored ${stored}`)
      ? []
      : ['a hint of another text']),
    ...(prediction === undefined && hints.length > 0 ? ['hints without a prediction'] : []),
    ...(state.headline[0]?.value === energy && state.version === subject.version ? [] : ['a readout of another text']),
  ];
}

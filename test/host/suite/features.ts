import {
  type CodeLens,
  type CompletionList,
  commands,
  type Definition,
  type DocumentSymbol,
  type FoldingRange,
  type InlayHint,
  type Location,
  Position,
  Range,
  type TextDocument,
  window,
  workspace,
} from 'vscode';
import * as assert from './assert.ts';
import { type Case, codeOf, fixesAt, placeOf, problemsOf, replace, revert, show, until } from './harness.ts';

const sound = 'transmitter.gainmodule.yaml';

const whole = (document: TextDocument) => new Range(0, 0, document.lineCount, 0);

async function lensOf(document: TextDocument): Promise<string> {
  const lenses = await commands.executeCommand<CodeLens[]>('vscode.executeCodeLensProvider', document.uri, 10);
  assert.equal(lenses.length, 1, 'one lens');
  assert.equal(lenses[0]?.range.start.line, 0, 'on the first line');
  return lenses[0]?.command?.title ?? '';
}

function hintsOf(document: TextDocument): Thenable<InlayHint[]> {
  return commands.executeCommand<InlayHint[]>('vscode.executeInlayHintProvider', document.uri, whole(document));
}

async function completionsAt(document: TextDocument, position: Position) {
  const list = await commands.executeCommand<CompletionList>(
    'vscode.executeCompletionItemProvider',
    document.uri,
    position,
  );
  return list.items;
}

const labelOf = ({ label }: { label: string | { label: string } }) => (typeof label === 'string' ? label : label.label);

export const features: readonly Case[] = [
  {
    name: 'the lens tells the pulse, stays while the text is broken, and tells the new pulse',
    async run() {
      const document = await show(sound);
      const before = await until('the pulse', async () => /^13\.\d mJ/.exec(await lensOf(document))?.[0]);
      await replace(document, 'length: 60 mm', 'length: 60');
      assert.match(await lensOf(document), /^No pulse predicted: .*\(line \d+\)$/);
      await replace(document, 'length: 60', 'length: 60 mm');
      await replace(document, 'power: 600 W', 'power: 650 W');
      const after = await lensOf(document);
      assert.match(after, /^1[45]\.\d mJ/);
      assert.ok(!after.startsWith(before), 'another energy');
      await revert(document);
    },
  },
  {
    name: 'hints stand behind their sections, and each can be switched off',
    async run() {
      const document = await show(sound);
      const hints = await until('hints', async () =>
        (await hintsOf(document)).length === 3 ? hintsOf(document) : undefined,
      );
      assert.same(
        hints.map(({ position }) => document.lineAt(position.line).text.trim()),
        ['pump:', 'resonator:', 'q_switch:'],
      );
      const settings = workspace.getConfiguration('giantpulse');
      await settings.update('inlayHints.pump', false, true);
      await until('two hints', async () => (await hintsOf(document)).length === 2 || undefined);
      await settings.update('inlayHints.pump', undefined, true);
      await until('three hints', async () => (await hintsOf(document)).length === 3 || undefined);
    },
  },
  {
    name: 'completion gives keys, materials, lines and units',
    async run() {
      const document = await show(sound);
      await replace(document, 'material: Nd:YAG', 'material: ');
      const materials = await completionsAt(document, placeOf(document, 'material: ').end);
      assert.ok(
        materials.some((item) => labelOf(item) === 'Nd:YVO4'),
        `Nd:YVO4 among ${materials.map(labelOf)}`,
      );
      await revert(document);
      await replace(document, '  length: 180 mm\n', '  \n');
      const { end } = placeOf(document, 'resonator:');
      const keys = await completionsAt(document, new Position(end.line + 1, 2));
      assert.equal(keys.map(labelOf).includes('length'), true, `length among ${keys.map(labelOf)}`);
      assert.equal(keys.map(labelOf).includes('output_reflectivity'), false, 'what is there');
      await revert(document);
      await replace(document, 'length: 180 mm', 'length: 180 ');
      const units = await completionsAt(document, placeOf(document, 'length: 180 ').end);
      assert.ok(
        units.some((item) => labelOf(item).includes('mm')),
        `mm among ${units.map(labelOf)}`,
      );
      await revert(document);
    },
  },
  {
    name: 'symbols, folding and definition follow the text',
    async run() {
      const document = await show(sound);
      const symbols = await commands.executeCommand<DocumentSymbol[]>(
        'vscode.executeDocumentSymbolProvider',
        document.uri,
      );
      const pump = symbols.find(({ name }) => name === 'pump');
      assert.ok(
        pump?.children.some(({ name, detail }) => name === 'power' && detail.startsWith('600 W')),
        'power in pump',
      );
      const folds = await commands.executeCommand<FoldingRange[]>('vscode.executeFoldingRangeProvider', document.uri);
      assert.ok(
        folds.some(({ start }) => document.lineAt(start).text === 'pump:'),
        'pump folds',
      );
      await replace(document, 'title:', 'x-mode: &mode { profile: gaussian, radius: 0.9 mm }\ntitle:');
      await replace(document, 'beam: { profile: gaussian, radius: 0.9 mm }', 'beam: *mode');
      const found = await commands.executeCommand<Definition>(
        'vscode.executeDefinitionProvider',
        document.uri,
        placeOf(document, '*mode').end.translate(0, -1),
      );
      const [target] = Array.isArray(found) ? found : [found as Location];
      assert.equal(document.getText(target?.range), '{ profile: gaussian, radius: 0.9 mm }');
      await revert(document);
    },
  },
  {
    name: 'a missed requirement points at what it hangs on, and a solved value mends it',
    async run() {
      const document = await show(sound);
      await replace(document, 'max: 12 ns', 'max: 9 ns');
      const problem = await until('related places', () =>
        problemsOf(document).find(
          (one) => codeOf(one) === 'requirement-missed' && (one.relatedInformation?.length ?? 0) > 0,
        ),
      );
      assert.equal(problem.relatedInformation?.length, 3);
      const fixes = await fixesAt(document, problem.range);
      const solved = fixes.find(({ title }) => title.startsWith('Set pump power to'));
      assert.ok(solved?.edit, `a solved value among ${fixes.map(({ title }) => title)}`);
      await workspace.applyEdit(solved.edit);
      await until(
        'no missed width',
        () =>
          problemsOf(document).every(
            (one) => codeOf(one) !== 'requirement-missed' || !document.getText(one.range).includes('9 ns'),
          ) || undefined,
      );
      await revert(document);
    },
  },
  {
    name: 'a finding is accepted with a reason, and refused without one',
    async run() {
      const document = await show(sound);
      await replace(document, 'max: 12 ns }', 'max: 9 ns } # accept requirement-missed:');
      await until('the refusal', () => problemsOf(document).find((one) => codeOf(one) === 'acceptance-invalid'));
      await replace(document, 'requirement-missed:', 'requirement-missed: the receiver is slower');
      const note = await until('the note', () =>
        problemsOf(document).find((one) => codeOf(one) === 'requirement-missed' && one.severity === 2),
      );
      assert.match(note.message, /Accepted: the receiver is slower/);
      await revert(document);
    },
  },
  {
    name: 'typing leaves no problem of an earlier text behind',
    async run() {
      const document = await show(sound);
      const editor = await window.showTextDocument(document);
      const { end } = placeOf(document, 'length: 180 mm');
      for (const character of ['x', 'y', 'z'])
        await editor.edit((edit) => edit.insert(document.lineAt(end.line).range.end, character));
      await until('the problem', () => problemsOf(document).find(({ message }) => message.includes('mmxyz')));
      for (let times = 0; times < 3; times++) {
        const { range } = document.lineAt(end.line);
        await editor.edit((edit) => edit.delete(new Range(range.end.translate(0, -1), range.end)));
      }
      await until('none', () => problemsOf(document).every(({ severity }) => severity > 0) || undefined);
      await revert(document);
    },
  },
];

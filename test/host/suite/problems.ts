import { DiagnosticSeverity, WorkspaceEdit, window, workspace } from 'vscode';
import * as assert from './assert.ts';
import { type Case, codeOf, fixesAt, placeOf, problemsOf, revert, show, until } from './harness.ts';

const forgotten = 'unit_forgotten.gainmodule.yaml';

const missingUnit = (document: Parameters<typeof problemsOf>[0]) =>
  problemsOf(document).find((problem) => codeOf(problem) === 'missing-unit');

export const problems: readonly Case[] = [
  {
    name: 'a forgotten unit is an error with its code, on the number alone',
    async run() {
      const document = await show(forgotten);
      const problem = await until('the problem', () => missingUnit(document));
      assert.equal(problem.severity, DiagnosticSeverity.Error);
      assert.equal(document.getText(problem.range), '60');
      assert.equal(document.lineAt(problem.range.start).text, '  length: 60');
    },
  },
  {
    name: 'the code links to its section in the shipped explanation of the checks',
    async run() {
      const document = await show(forgotten);
      const { code } = await until('the problem', () => missingUnit(document));
      assert.ok(typeof code === 'object', 'the code has a link');
      assert.match(code.target.path, /extension\/docs\/checks\.md$/);
      const text = new TextDecoder().decode(await workspace.fs.readFile(code.target.with({ fragment: '' })));
      const line = Number(/^L(\d+)$/.exec(code.target.fragment)?.[1]);
      assert.match(text.split('\n')[line - 1] ?? '', /^<a id="missing-unit">/);
    },
  },
  {
    name: 'a sound design has no error',
    async run() {
      const document = await show('transmitter.gainmodule.yaml');
      const edit = new WorkspaceEdit();
      edit.replace(document.uri, placeOf(document, 'mm'), '');
      await workspace.applyEdit(edit);
      await until('a problem after the edit', () => missingUnit(document));
      await revert(document);
      await until('no error', () => problemsOf(document).every(({ severity }) => severity > 0) || undefined);
      assert.same(
        problemsOf(document)
          .filter(({ severity }) => severity === DiagnosticSeverity.Error)
          .map(codeOf),
        [],
      );
    },
  },
  {
    name: 'typing the unit clears the problem',
    async run() {
      const document = await show(forgotten);
      await until('the problem', () => missingUnit(document));
      const editor = await window.showTextDocument(document);
      const { end } = placeOf(document, 'length: 60');
      await editor.edit((edit) => edit.insert(end, ' mm'));
      await until('no error', () => (missingUnit(document) === undefined ? true : undefined));
      await revert(document);
      await until('the problem again', () => missingUnit(document));
    },
  },
  {
    name: 'the quick fix writes a unit and nothing else',
    async run() {
      const document = await show(forgotten);
      const before = document.getText();
      const problem = await until('the problem', () => missingUnit(document));
      const fixes = await fixesAt(document, problem.range);
      const fix = fixes.find(({ title }) => /\bmm\b/.test(title));
      assert.ok(fix?.edit, `a fix with mm among: ${fixes.map(({ title }) => title).join(', ')}`);
      await workspace.applyEdit(fix.edit);
      assert.equal(document.getText(), before.replace('length: 60\n', 'length: 60 mm\n'));
      await until('no error', () => (missingUnit(document) === undefined ? true : undefined));
      await revert(document);
    },
  },
  {
    name: 'a file that is not a design is left alone',
    async run() {
      const document = await show('other.yaml');
      assert.equal(document.languageId, 'yaml');
      await new Promise((resolve) => setTimeout(resolve, 1000));
      assert.same(problemsOf(document), []);
    },
  },
];

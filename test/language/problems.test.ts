import { describe, expect, test } from 'vitest';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { codeActions } from '../../extension/language/code-actions.ts';
import { diagnostics, internalFailure } from '../../extension/language/diagnostics.ts';
import { bench, transmitter } from './bench.ts';

const forgotten = bench(transmitter.replace('length: 60 mm', 'length: 60'));

describe('diagnostics', () => {
  test('one for every problem, with severity, code and range', () => {
    const found = diagnostics(forgotten.subject);
    expect(found).toHaveLength(forgotten.subject.analysis.problems.length);
    const [first] = found.filter(({ code }) => code === 'missing-unit');
    expect(first).toMatchObject({ severity: 1, source: 'Giant Pulse' });
    expect(first && forgotten.document.getText(first.range)).toBe('60');
    expect(first).not.toHaveProperty('codeDescription');
  });

  test('a missed requirement is an error on the requirement', () => {
    const missed = bench(transmitter.replace('max: 12 ns', 'max: 5 ns'));
    const found = diagnostics(missed.subject, 'file:///checks.md');
    const problem = found.find(({ code }) => code === 'requirement-missed');
    expect(problem?.severity).toBe(1);
    expect(problem?.codeDescription?.href).toBe('file:///checks.md#requirement-missed');
    expect(problem?.range.start.line).toBe(
      transmitter.split('\n').findIndex((line) => line.includes('pulse_width: { max')),
    );
  });

  test('no range leaves the document, whatever the text', () => {
    for (const text of ['', '\u0000', 'format: 1', '- a\r\n- b\r\n', 'a: [', transmitter.slice(0, 300)]) {
      const { subject, document } = bench(text);
      for (const { range } of diagnostics(subject)) {
        expect(document.offsetAt(range.end)).toBeLessThanOrEqual(text.length);
        expect(document.offsetAt(range.start)).toBeLessThanOrEqual(document.offsetAt(range.end));
      }
    }
  });

  test('a fault of ours is an error on the first line, with its own code', () => {
    expect(internalFailure('a mirror fell off')).toMatchObject({
      severity: 1,
      code: 'internal-failure',
      range: { start: { line: 0 } },
      message: expect.stringContaining('a mirror fell off'),
    });
  });
});

describe('code actions', () => {
  const start = forgotten.at('length: 60', 8);

  test('offer the units of a number without one, and write only that', () => {
    const actions = codeActions(forgotten.subject, { start, end: start }, undefined);
    const millimetres = actions.find(({ title }) => /\bmm\b/.test(title));
    const edits = millimetres?.edit?.changes?.[forgotten.document.uri] ?? [];
    expect(TextDocument.applyEdits(forgotten.document, edits)).toBe(transmitter);
    expect(millimetres).toMatchObject({ kind: 'quickfix', diagnostics: [{ code: 'missing-unit' }] });
  });

  test('are preferred only where there is one way to mend the problem', () => {
    const actions = codeActions(forgotten.subject, { start, end: start }, undefined);
    expect(actions.length).toBeGreaterThan(1);
    expect(actions.map(({ isPreferred }) => isPreferred)).toEqual(actions.map(() => false));
  });

  test('are offered for what the selection touches, and nothing else', () => {
    expect(codeActions(forgotten.subject, { start: 0, end: start - 1 }, undefined)).toEqual([]);
    expect(
      codeActions(forgotten.subject, { start: 0, end: forgotten.document.getText().length }, undefined),
    ).not.toEqual([]);
  });
});

import { describe, expect, test } from 'vitest';
import type { DocumentSymbol, Range } from 'vscode-languageserver-protocol';
import { definition } from '../../extension/language/definition.ts';
import { foldingRanges } from '../../extension/language/folding.ts';
import { documentSymbols } from '../../extension/language/symbols.ts';
import { demo } from '../explore/designs.ts';
import { bench } from './bench.ts';

const shared = demo
  .replace(
    'title:',
    'x-mode: &mode { profile: gaussian, radius: 0.9 mm }\nx-rod: &rod\n  place: inside\n  beam_radius: 0.9 mm\ntitle:',
  )
  .replace('beam: { profile: gaussian, radius: 0.9 mm }', 'beam: *mode')
  .replace(
    '    place: inside\n    beam_radius: 0.9 mm\n    damage_threshold: { fluence: 12',
    '    <<: *rod\n    damage_threshold: { fluence: 12',
  );

const holds = (outer: Range, inner: Range): boolean => {
  const order = (a: Range['start'], b: Range['start']) => a.line - b.line || a.character - b.character;
  return order(outer.start, inner.start) <= 0 && order(inner.end, outer.end) <= 0;
};

function eachNested(
  symbols: readonly DocumentSymbol[],
  visit: (symbol: DocumentSymbol, parent?: DocumentSymbol) => void,
  parent?: DocumentSymbol,
): void {
  for (const symbol of symbols) {
    visit(symbol, parent);
    eachNested(symbol.children ?? [], visit, symbol);
  }
}

describe('symbols', () => {
  test('are the sections with their keys and values, list items by their names', () => {
    const symbols = documentSymbols(bench(demo).subject);
    expect(symbols.map(({ name }) => name)).toEqual([
      'format',
      'title',
      'gain_medium',
      'pump',
      'resonator',
      'q_switch',
      'surfaces',
      'requirements',
    ]);
    const child = (at: number, name: string) => symbols[at]?.children?.find((one) => one.name === name);
    expect(child(3, 'power')?.detail).toBe('600 W ± 3 %');
    expect(child(3, 'beam')?.children?.map(({ name }) => name)).toEqual(['profile', 'radius']);
    expect(symbols[6]?.children?.map(({ name }) => name)).toEqual([
      'output coupler, inner face',
      'rod, antireflection coating',
      'exit window',
    ]);
  });

  test('have names and values of one line, and not longer than a list has room for', () => {
    const [, first, second] = documentSymbols(
      bench(`format: 1\n"a\\nb": "1\\r\\n2"\nx-${'y'.repeat(99)}: ${'word '.repeat(40)}\n`).subject,
    );
    expect(first).toMatchObject({ name: 'a b', detail: '1 2' });
    expect(second?.name).toHaveLength(60);
    expect(second?.detail).toMatch(/^(word )+word…$/);
  });

  // An editor refuses symbols whose children or names stand outside of them.
  test.each([
    demo,
    shared,
    demo.replaceAll('\n', '\r\n'),
    '- a\n- b: 1\n',
    'a: {b: [1, {c: 2}]}',
    '"": 1\n',
    '[',
    'a: *b',
    '',
  ])('are nested as their ranges are', (text) => {
    let count = 0;
    eachNested(documentSymbols(bench(text).subject), (symbol, parent) => {
      count += 1;
      expect(holds(symbol.range, symbol.selectionRange)).toBe(true);
      if (parent !== undefined) expect(holds(parent.range, symbol.range)).toBe(true);
      expect(symbol.name).not.toBe('');
    });
    if (text.length > 500) expect(count).toBeGreaterThan(40);
  });
});

describe('definition', () => {
  const here = bench(shared);
  const target = (at: number) => {
    const found = definition(here.subject, at);
    return found && here.document.getText(found.range);
  };

  test('of an alias is the value at its anchor', () => {
    expect(target(here.at('*mode', 2))).toBe('{ profile: gaussian, radius: 0.9 mm }');
    expect(target(here.at('*mode', 0))).toBe('{ profile: gaussian, radius: 0.9 mm }');
  });

  test('of a merge is its anchor', () => {
    expect(target(here.at('<<: *rod', 6))).toBe('&rod');
  });

  test('of one of several merged sections is its anchor, not a note about it', () => {
    const several = bench(
      'x-a: &a\n  length: 1 mm # see &b\nx-b: &b { length: 2 mm }\n# then &a again\nresonator:\n  <<:\n    - *a\n    - *b\n',
    );
    const lineOf = (text: string) => definition(several.subject, several.at(text, 3))?.range.start.line;
    expect(lineOf('- *a')).toBe(0);
    expect(lineOf('- *b')).toBe(2);
  });

  test('is nowhere for anything else', () => {
    for (const place of ['title:', '600 W', 'x-mode', '&mode', '<<:']) expect(target(here.at(place))).toBeUndefined();
    expect(definition(bench('').subject, 0)).toBeUndefined();
    expect(definition(bench('a: *none').subject, 5)).toBeUndefined();
    expect(definition(bench('<<: *none').subject, 6)).toBeUndefined();
  });
});

describe('folding', () => {
  const foldsOf = (text: string) =>
    foldingRanges(bench(text).subject).map(({ startLine, endLine }) => {
      const lines = text.split('\n');
      return `${lines[startLine]?.trim()} … ${lines[endLine]?.trim()}`;
    });

  test('takes sections and list items whole, and no blank line behind them', () => {
    const folds = foldsOf(demo);
    expect(folds).toContain('gain_medium: … refractive_index: 1.82');
    expect(folds).toContain('pump: … beam: { profile: flat, radius: 1.7 mm }');
    expect(folds).toContain('- name: exit window … safety_factor: 3');
    expect(folds).toContain('surfaces: … safety_factor: 3');
    expect(folds).toContain('requirements: … hold_off_margin: { min: 1.5 }');
    expect(folds).toHaveLength(9);
  });

  test('takes runs of comments', () => {
    const text = '# one\n# two\nformat: 1\n# single\ntitle: a\n  # x\n  # y';
    expect(foldingRanges(bench(text).subject)).toEqual([
      { startLine: 0, endLine: 1, kind: 'comment' },
      { startLine: 5, endLine: 6, kind: 'comment' },
    ]);
  });

  test('counts lines as the editor does, whichever way they end', () => {
    const folds = foldingRanges(bench(demo).subject);
    for (const ending of ['\r\n', '\r']) {
      const text = '# one\n# two\n'.replaceAll('\n', ending);
      expect(foldingRanges(bench(text).subject)).toEqual([{ startLine: 0, endLine: 1, kind: 'comment' }]);
    }
    expect(foldingRanges(bench(demo.replaceAll('\n', '\r\n')).subject)).toEqual(folds);
  });

  test('leaves a comment above a section to that section', () => {
    expect(foldsOf(demo.replace('\nresonator:', '# the resonator\nresonator:'))).toContain(
      'pump: … beam: { profile: flat, radius: 1.7 mm }',
    );
  });
});

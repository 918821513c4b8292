import { describe, expect, test } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import { createPositions, positionsOf } from '../../extension/core/report/position.ts';
import { design } from './designs.ts';

const at = (text: string, offset: number) => {
  const { line, column } = createPositions(text)(offset);
  return [line, column];
};

describe('positions', () => {
  test('count lines and columns from 1', () => {
    expect([0, 1, 2, 3, 4].map((offset) => at('a\nbc', offset))).toEqual([
      [1, 1],
      [1, 2],
      [2, 1],
      [2, 2],
      [2, 3],
    ]);
  });

  test('a carriage return before the line break belongs to its line', () => {
    expect(at('a\r\nb', 1)).toEqual([1, 2]);
    expect(at('a\r\nb', 3)).toEqual([2, 1]);
  });

  test('a character beyond the basic plane takes two columns, as in editors', () => {
    expect(at('# 😀\nx: 😀 y', 3)).toEqual([1, 4]);
    expect(at('# 😀\nx: 😀 y', 11)).toEqual([2, 7]);
  });

  test('offsets outside the text fall on its ends', () => {
    expect(at('ab\n', -5)).toEqual([1, 1]);
    expect(at('ab\n', 99)).toEqual([2, 1]);
    expect(at('', 7)).toEqual([1, 1]);
  });

  test('agree with counting, for every offset of a text of mixed lines', () => {
    const text = 'format: 1\r\n\r\nä: 😀\n\n\tx\r\ny';
    const positionAt = createPositions(text);
    for (let offset = 0; offset <= text.length; offset++) {
      const lines = text.slice(0, offset).split('\n');
      expect(positionAt(offset)).toEqual({ line: lines.length, column: (lines.at(-1)?.length ?? 0) + 1 });
    }
  });

  test('of a finding are the same with either line ending, and after emoji on the lines before', () => {
    const text = design('checks/no-pulse.gainmodule.yaml');
    const rangeOf = (variant: string) => {
      const [problem] = analyse(variant).problems;
      return problem && positionsOf(problem.range, createPositions(variant));
    };
    const expected = { start: { line: 9, column: 10 }, end: { line: 9, column: 15 } };
    expect(rangeOf(text)).toEqual(expected);
    expect(rangeOf(text.replaceAll('\n', '\r\n'))).toEqual(expected);
    expect(rangeOf(text.replace('# A diode', '# 😀😀 A diode'))).toEqual(expected);
    expect(rangeOf(`\ufeff${text}`)).toEqual(expected);
  });
});

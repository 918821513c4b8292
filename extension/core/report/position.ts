import type { TextRange } from './problem.ts';

/** Line and column as people count them, from 1; columns in UTF-16 code units. */
export interface Position {
  readonly line: number;
  readonly column: number;
}

/** Finds positions in one text; lines end at `\n`. Offsets beyond the text fall on its end. */
export function createPositions(text: string): (offset: number) => Position {
  const starts = [0];
  for (let at = text.indexOf('\n'); at >= 0; at = text.indexOf('\n', at + 1)) starts.push(at + 1);
  return (offset) => {
    const place = Math.min(Math.max(offset, 0), text.length);
    let low = 0;
    let high = starts.length;
    while (high - low > 1) {
      const middle = (low + high) >> 1;
      if (starts[middle]! <= place) low = middle;
      else high = middle;
    }
    return { line: low + 1, column: place - starts[low]! + 1 };
  };
}

/** Start and end of a range. */
export function positionsOf(range: TextRange, positionAt: (offset: number) => Position) {
  return { start: positionAt(range.start), end: positionAt(range.end) };
}

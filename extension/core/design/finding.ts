import type { Fix, Problem, Severity, TextRange } from '../report/problem.ts';
import type { ReadingCode } from './codes.ts';

/** Collects problems up to a bound, so that noise neither floods the reader nor costs more than it tells. */
export interface Findings {
  add(code: ReadingCode, path: string, range: TextRange, message: string, more?: FindingDetail): void;
  /** No more are kept, so what comes need not be looked into closely. */
  isFull(): boolean;
  /** From now on nothing that begins in this range is added; ranges come in the order of the text. */
  mute(range: TextRange): void;
  /** In the order of the text, at most `limit` and one note. */
  list(): readonly Problem[];
}

export interface FindingDetail {
  readonly severity?: Severity;
  readonly fixes?: readonly Fix[];
}

/** Problems kept of one file; a note tells of the rest. */
export const MAX_PROBLEMS = 100;

export function createFindings(): Findings {
  const muted: TextRange[] = [];
  const kept = new Map<string, Problem>();
  let dropped = 0;
  return {
    add(code, path, range, message, more) {
      // An anchor used in three places is wrong once, whereas several keys can be missing in one place.
      const identity = `${code} ${range.start} ${range.end} ${code === 'missing-key' ? message : ''}`;
      if (kept.has(identity) || isWithin(muted, range.start)) return;
      if (kept.size >= MAX_PROBLEMS) {
        dropped++;
        return;
      }
      const severity = more?.severity ?? 'error';
      const fixes = more?.fixes;
      kept.set(identity, { code, severity, message, path, range, ...(fixes?.length ? { fixes } : {}) });
    },
    isFull: () => kept.size >= MAX_PROBLEMS,
    mute(range) {
      muted.push(range);
    },
    list() {
      const problems = [...kept.values()].sort((a, b) => a.range.start - b.range.start || a.range.end - b.range.end);
      const last = problems.at(-1);
      if (dropped === 0 || last === undefined) return problems;
      const code: ReadingCode = 'too-many-problems';
      const message = `${dropped} more problems are not shown; they may go away with the first ones.`;
      return [...problems, { code, severity: 'information', message, path: '', range: last.range }];
    },
  };
}

function isWithin(ranges: readonly TextRange[], offset: number): boolean {
  let low = 0;
  let high = ranges.length;
  while (low < high) {
    const middle = (low + high) >> 1;
    if (ranges[middle]!.end <= offset) low = middle + 1;
    else high = middle;
  }
  return low < ranges.length && ranges[low]!.start <= offset;
}

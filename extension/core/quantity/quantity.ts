import type { Fix, TextRange } from '../report/problem.ts';
import type { DimensionName } from './dimension.ts';
import { explain } from './explain.ts';
import { tooLong } from './explain-number.ts';
import { read } from './read.ts';

/** A number with its unit, and how it was written. */
export interface Quantity {
  /** SI; kelvin for a temperature, a plain fraction for a ratio. */
  readonly value: number;
  /** As written, in `unit`. */
  readonly written: number;
  /** As written; '' for a bare ratio. */
  readonly unit: string;
  /** SI, the half-width, not negative. */
  readonly tolerance?: number;
}

export interface QuantityProblem {
  readonly code:
    | 'missing-unit'
    | 'unknown-unit'
    | 'wrong-dimension'
    | 'not-a-quantity'
    | 'ambiguous-unit'
    | 'not-finite'
    | 'bad-tolerance';
  readonly message: string;
  /** Within the text that was read, as are those of the fixes. */
  readonly range: TextRange;
  readonly fixes: readonly Fix[];
}

/** Nobody writes a longer quantity; what is longer is another kind of text, and costs no more than its length. */
const LONGEST_TEXT = 200;

/**
 * Reads `NUMBER UNIT [± NUMBER [UNIT|%]]`. Only a ratio may do without a unit. A tolerance without a unit takes the
 * number's; one in percent (or ppm) is relative to the number. A ratio that is itself written in percent is the
 * exception: `85 % ± 2 %` means 83 % to 87 %, whereas `0.95 ± 2 %` means 0.931 to 0.969. After degrees Celsius a
 * tolerance is a difference: `25 Cel ± 2 K` and `25 Cel ± 2` are the same.
 */
export function readQuantity(
  text: string,
  dimension: DimensionName,
): { readonly quantity: Quantity } | { readonly problem: QuantityProblem } {
  const trimmed = text.trim();
  const result = trimmed.length > LONGEST_TEXT ? undefined : read(trimmed, dimension);
  if (result !== undefined && !('failure' in result)) return { quantity: result };
  const problem = result === undefined ? tooLong(trimmed, dimension) : explain(trimmed, result, dimension);
  const offset = text.length - text.trimStart().length;
  return { problem: offset === 0 ? problem : moved(problem, trimmed === '' ? 0 : offset) };
}

function moved(problem: QuantityProblem, offset: number): QuantityProblem {
  const shift = (range: TextRange): TextRange => ({ start: range.start + offset, end: range.end + offset });
  const fixes = problem.fixes.map((fix) => ({ ...fix, range: shift(fix.range) }));
  return { ...problem, range: shift(problem.range), fixes };
}

import type { DimensionName } from './dimension.ts';
import { workingFixes } from './fixes.ts';
import { misreading } from './misread.ts';
import type { QuantityProblem } from './quantity.ts';
import { excerpt, expected } from './wording.ts';

/** The problem of a text too long to be looked at. */
export function tooLong(text: string, dimension: DimensionName): QuantityProblem {
  const message = `\`${excerpt(text.trimStart())}\` is too long for a quantity; ${expected(dimension)}`;
  return { code: 'not-a-quantity', message, range: { start: 0, end: text.length }, fixes: [] };
}

/** The problem of a text in which no number can be found at the start, or something else right after it. */
export function explainNumber(text: string, dimension: DimensionName): QuantityProblem {
  const wanted = expected(dimension);
  const whole = { start: 0, end: text.length };
  if (text === '') {
    return { code: 'not-a-quantity', message: `nothing is written here; ${wanted}`, range: whole, fixes: [] };
  }
  if (/^[+-]?\.?(?:nan|inf|infinity)(?![a-z])/i.test(text)) {
    return {
      code: 'not-finite',
      message: `\`${excerpt(text)}\` is not a finite number; ${wanted}`,
      range: whole,
      fixes: [],
    };
  }
  const known = explainMisreading(text, dimension);
  if (known !== undefined) return known;
  const reason = /^[\d+\-.]/.test(text) ? 'is not one number with a unit' : "doesn't start with a number";
  return { code: 'not-a-quantity', message: `\`${excerpt(text)}\` ${reason}; ${wanted}`, range: whole, fixes: [] };
}

/** The problem of a number written in a way that we know and refuse; undefined if it is none of them. */
export function explainMisreading(text: string, dimension: DimensionName): QuantityProblem | undefined {
  const known = misreading(text);
  if (known === undefined) return undefined;
  const range = { start: 0, end: text.length };
  const fixes = workingFixes(text, dimension, range, known.texts);
  const message = `\`${excerpt(text)}\` ${known.reason}; ${expected(dimension)}`;
  return { code: 'not-a-quantity', message, range, fixes };
}

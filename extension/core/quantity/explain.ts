import type { Fix, TextRange } from '../report/problem.ts';
import type { DimensionName } from './dimension.ts';
import { explainMisreading, explainNumber } from './explain-number.ts';
import { explainUnit } from './explain-unit.ts';
import type { Failure } from './failure.ts';
import { likelyUnits, workingFixes } from './fixes.ts';
import type { QuantityProblem } from './quantity.ts';
import { excerpt, expected, toleranceWanted, whatItIs } from './wording.ts';

/** Says what is wrong with a trimmed text, what was expected, and which edits would make a quantity of it. */
export function explain(text: string, failure: Failure, dimension: DimensionName): QuantityProblem {
  const { start, end } = failure;
  const range = { start, end };
  const part = excerpt(text.slice(start, end));
  const wanted = expected(dimension);
  switch (failure.failure) {
    case 'number':
      return explainNumber(text, dimension);
    case 'missing-unit': {
      const texts = likelyUnits(text, dimension).map((unit) => `${text.slice(start, end)} ${unit}`);
      const fixes = workingFixes(text, dimension, range, texts);
      return { code: 'missing-unit', message: `${part} has no unit; ${wanted}`, range, fixes };
    }
    case 'unit':
      return explainUnit(text, failure, dimension);
    case 'dimension':
      return {
        code: 'wrong-dimension',
        message: `\`${part}\` ${whatItIs(text.slice(start, end), dimension)}; ${wanted}`,
        range,
        fixes: [],
      };
    case 'overflow':
      return { code: 'not-finite', message: `${part} is beyond what a number can hold; ${wanted}`, range, fixes: [] };
    case 'underflow':
      return {
        code: 'not-finite',
        message: `${part} is too small to be told from zero; ${wanted}, or write 0`,
        range,
        fixes: [],
      };
    case 'tolerance-empty':
      return badTolerance(`nothing follows \`${part}\`; ${toleranceWanted(dimension)}`, range);
    case 'tolerance-negative': {
      const fixes = workingFixes(text, dimension, range, [text.slice(start, end).replace(/^-/, '')]);
      return badTolerance(`a tolerance can't be negative, and \`${part}\` is`, range, fixes);
    }
    case 'tolerance-dimension':
      return badTolerance(
        `the tolerance \`${part}\` ${whatItIs(text.slice(start, end), dimension)}; ${toleranceWanted(dimension)}`,
        range,
      );
    case 'tolerance-celsius-percent':
      return badTolerance('a percentage of degrees Celsius has no meaning; write the tolerance in kelvin', range);
    case 'tolerance-unreadable':
      return (
        explainMisreading(text, dimension) ??
        badTolerance(`\`${part}\` is not a tolerance; ${toleranceWanted(dimension)}`, range)
      );
  }
}

function badTolerance(message: string, range: TextRange, fixes: readonly Fix[] = []): QuantityProblem {
  return { code: 'bad-tolerance', message, range, fixes };
}

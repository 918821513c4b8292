import type { Fix, TextRange } from '../report/problem.ts';
import { DIMENSIONS, type DimensionName, sameDimension } from './dimension.ts';
import { misreading } from './misread.ts';
import type { QuantityProblem } from './quantity.ts';
import { type Failure, PLUS_MINUS, read } from './read.ts';
import { suggestUnits } from './suggest.ts';
import { parseUnit } from './unit.ts';

/** Enough of a text to recognise it in a message, on one line. */
function excerpt(text: string): string {
  const line = text.slice(0, 41).replace(/[\p{Cc}\p{Zl}\p{Zp}`]/gu, ' ');
  return line.length <= 40 ? line : `${line.slice(0, 39).replace(/[\ud800-\udbff]$/, '')}…`;
}

function expected(dimension: DimensionName): string {
  const { noun, example } = DIMENSIONS[dimension];
  return `expected ${noun} such as \`${example}\``;
}

/** The problem of a text too long to be looked at. */
export function tooLong(text: string, dimension: DimensionName): QuantityProblem {
  const message = `\`${excerpt(text.trimStart())}\` is too long for a quantity; ${expected(dimension)}`;
  return { code: 'not-a-quantity', message, range: { start: 0, end: text.length }, fixes: [] };
}

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
      const units = toleranceUnit(text) ?? DIMENSIONS[dimension].units;
      const fixes = workingFixes(
        text,
        dimension,
        range,
        units.slice(0, 4).map((unit) => `${text.slice(start, end)} ${unit}`),
      );
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

function toleranceWanted(dimension: DimensionName): string {
  const unit = DIMENSIONS[dimension].units[0] ?? '%';
  return unit === '%' ? 'expected one such as `± 2 %`' : `expected one such as \`± 2 %\` or \`± 0.1 ${unit}\``;
}

function explainNumber(text: string, dimension: DimensionName): QuantityProblem {
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

function explainMisreading(text: string, dimension: DimensionName): QuantityProblem | undefined {
  const known = misreading(text);
  if (known === undefined) return undefined;
  const range = { start: 0, end: text.length };
  const fixes = workingFixes(text, dimension, range, known.texts);
  const message = `\`${excerpt(text)}\` ${known.reason}; ${expected(dimension)}`;
  return { code: 'not-a-quantity', message, range, fixes };
}

function explainUnit(text: string, failure: Failure, dimension: DimensionName): QuantityProblem {
  const { start, end, detail } = failure;
  const unit = text.slice(start, end);
  const { fault, start: from, end: to } = detail ?? { fault: 'malformed', start: 0, end: unit.length };
  const range = { start, end };
  const bad = unit.slice(from, to);
  const swap = (by: string): string => unit.slice(0, from) + by + unit.slice(to);
  switch (fault) {
    case 'ambiguous': {
      const better = swap(`(${bad.trimEnd().replace(/\s*\/\s*/g, '.')})`);
      const fixes = workingFixes(text, dimension, range, [better]);
      const advice = fixes.length > 0 ? `write \`${excerpt(better)}\`` : 'put what is divided by in parentheses';
      return {
        code: 'ambiguous-unit',
        message: `\`${excerpt(unit)}\` can be read in two ways; ${advice}`,
        range,
        fixes,
      };
    }
    case 'celsius': {
      const message = `\`${excerpt(bad)}\` is a point on a scale and can't be part of \`${excerpt(unit)}\`; write \`K\``;
      return { code: 'unknown-unit', message, range, fixes: workingFixes(text, dimension, range, [swap('K')]) };
    }
    case 'malformed':
    case 'unknown': {
      if (/^\S*\s+[+-]/.test(unit)) {
        const message = `\`${excerpt(unit)}\` is not a unit; a tolerance is written like \`± 0.1\` and is the same both ways`;
        return badTolerance(message, range);
      }
      const known = explainMisreading(text, dimension);
      if (known !== undefined) return known;
      const units = fault === 'unknown' ? suggestUnits(unit, from, to, dimension) : [];
      const fixes = workingFixes(text, dimension, range, units);
      const advice = fixes.length > 0 ? `did you mean ${listed(fixes.map((fix) => fix.text))}?` : expected(dimension);
      const name = fault === 'unknown' ? excerpt(fixes.length > 0 ? unit : bad) : excerpt(unit);
      return { code: 'unknown-unit', message: `unknown unit \`${name}\`; ${advice}`, range, fixes };
    }
  }
}

function listed(words: readonly string[]): string {
  const quoted = words.map((word) => `\`${excerpt(word)}\``);
  return quoted.length < 2 ? quoted.join() : `${quoted.slice(0, -1).join(', ')} or ${quoted.at(-1)}`;
}

/** The edits after which the text reads, or fails only further on for a reason of its own. */
function workingFixes(
  text: string,
  dimension: DimensionName,
  range: TextRange,
  texts: readonly string[],
): readonly Fix[] {
  const works = (candidate: string): boolean => {
    const again = read(text.slice(0, range.start) + candidate + text.slice(range.end), dimension);
    return !('failure' in again) || again.start >= range.start + candidate.length;
  };
  return texts.filter(works).map((candidate) => ({ title: `Write \`${excerpt(candidate)}\``, range, text: candidate }));
}

/** The unit at the end of `1.3 ± 0.1 mm`, which was surely meant for both. */
function toleranceUnit(text: string): readonly string[] | undefined {
  const tolerance = text.slice(text.search(PLUS_MINUS));
  const unit = PLUS_MINUS.test(text) ? /[\d.]\s*([^\s\d%.].*)$/.exec(tolerance)?.[1] : undefined;
  return unit === undefined || 'fault' in parseUnit(unit) ? undefined : [unit];
}

function whatItIs(text: string, wanted: DimensionName): string {
  const unit = text.replace(/^[+-]?[\d.]+(?:[eE][+-]?\d+)?\s*/, '');
  const parsed = parseUnit(unit);
  if ('fault' in parsed) return `is not ${DIMENSIONS[wanted].noun}`;
  const same = Object.values(DIMENSIONS).filter((row) => sameDimension(row.vector, parsed.vector));
  const named = same.find((row) => row.units.includes(unit)) ?? same[0];
  return named === undefined ? `is not ${DIMENSIONS[wanted].noun}` : `is ${named.noun}`;
}

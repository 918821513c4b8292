import type { DimensionName } from './dimension.ts';
import { explainMisreading } from './explain-number.ts';
import type { Failure } from './failure.ts';
import { workingFixes } from './fixes.ts';
import type { QuantityProblem } from './quantity.ts';
import { suggestUnits } from './suggest.ts';
import { excerpt, expected, listed } from './wording.ts';

/** The problem of a unit that can't be read, with the units that it may have been. */
export function explainUnit(text: string, failure: Failure, dimension: DimensionName): QuantityProblem {
  const misread = explainMisreading(text, dimension);
  if (misread !== undefined) return misread;
  const { start, end, detail } = failure;
  const unit = text.slice(start, end);
  const { fault, start: from, end: to } = detail ?? { fault: 'malformed', start: 0, end: unit.length };
  const range = { start, end };
  const bad = unit.slice(from, to);
  const swap = (by: string): string => unit.slice(0, from) + by + unit.slice(to);
  if (fault === 'ambiguous') {
    const better = swap(`(${bad.trimEnd().replace(/\s*\/\s*/g, '.')})`);
    const fixes = workingFixes(text, dimension, range, [better]);
    const advice = fixes.length > 0 ? `write \`${excerpt(better, 20)}\`` : 'put what is divided by in parentheses';
    const message = `\`${excerpt(unit, 20)}\` can be read in two ways; ${advice}`;
    return { code: 'ambiguous-unit', message, range, fixes };
  }
  if (fault === 'celsius') {
    const message = `\`${bad}\` is a point on a scale and can't be part of \`${excerpt(unit)}\`; write \`K\``;
    return { code: 'unknown-unit', message, range, fixes: workingFixes(text, dimension, range, [swap('K')]) };
  }
  if (/^\S*\s+[+-]/.test(unit)) {
    const message = `\`${excerpt(unit)}\` is not a unit; a tolerance is written like \`± 0.1\` and is the same both ways`;
    return { code: 'bad-tolerance', message, range, fixes: [] };
  }
  const units = fault === 'unknown' ? suggestUnits(unit, from, to, dimension) : [];
  const fixes = workingFixes(text, dimension, range, units);
  const advice = fixes.length > 0 ? `did you mean ${listed(fixes.map((fix) => fix.text))}?` : expected(dimension);
  const name = fault === 'unknown' && fixes.length === 0 ? bad : unit;
  return { code: 'unknown-unit', message: `unknown unit \`${excerpt(name)}\`; ${advice}`, range, fixes };
}

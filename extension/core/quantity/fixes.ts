import type { Fix, TextRange } from '../report/problem.ts';
import { DIMENSIONS, type DimensionName } from './dimension.ts';
import { PLUS_MINUS, read } from './read.ts';
import { parseUnit } from './unit.ts';
import { excerpt } from './wording.ts';

/** The edits after which the text reads, or fails only further on for a reason of its own. */
export function workingFixes(
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

/** What a number without a unit may have meant: the unit of its tolerance, else those usual for the dimension. */
export function likelyUnits(text: string, dimension: DimensionName): readonly string[] {
  return toleranceUnit(text) ?? DIMENSIONS[dimension].units.slice(0, 4);
}

/** The unit at the end of `1.3 ± 0.1 mm`, which was surely meant for both. */
function toleranceUnit(text: string): readonly string[] | undefined {
  const tolerance = text.slice(text.search(PLUS_MINUS));
  const unit = PLUS_MINUS.test(text) ? /[\d.]\s*([^\s\d%.].*)$/.exec(tolerance)?.[1] : undefined;
  return unit === undefined || 'fault' in parseUnit(unit) ? undefined : [unit];
}

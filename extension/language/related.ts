import { aimOf } from '../core/explore/goals.ts';
import { slopeOf } from '../core/explore/sensitivity.ts';
import type { Problem, TextRange } from '../core/report/problem.ts';
import { signedPercent } from './effects.ts';
import type { Subject } from './subject.ts';

/** A place elsewhere in the design that a problem hangs on. */
export interface Related {
  readonly range: TextRange;
  readonly message: string;
}

const MOST_RELATED = 3;

/** The written values that the figure behind a problem is most sensitive to, with what +1 % of each does to it. */
export function relatedTo({ analysis, explorer }: Subject, problem: Problem): readonly Related[] {
  const aim = aimOf(problem);
  if (aim === undefined) return [];
  return explorer
    .parameters()
    .flatMap(({ path }) => {
      const near = explorer.around(path);
      const found = near && slopeOf(near, aim.figure);
      return found ? [{ path, slope: found.slope }] : [];
    })
    .filter(({ slope }) => Math.abs(slope) > 1e-3)
    .sort((a, b) => Math.abs(b.slope) - Math.abs(a.slope))
    .slice(0, MOST_RELATED)
    .map(({ path, slope }) => ({
      range: analysis.design.rangeOf(path),
      message: `${aim.name.replaceAll('_', ' ')} changes by ${signedPercent(slope * 0.01)} for +1 % of ${path}`,
    }));
}

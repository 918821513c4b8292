import type { Analysis } from '../analyse.ts';
import { rootBetween } from '../numerics/root.ts';
import type { Outcome } from '../physics/predict.ts';
import { allows, parameterAt } from './parameters.ts';
import { type Rewriting, rewriting } from './rewrite.ts';
import { vary } from './vary.ts';

/** A value of the design with which a goal is just reached. */
export interface Solution extends Rewriting {
  readonly path: string;
  readonly outcome: Outcome;
}

/** How far a goal is from being reached: negative where it is missed, 0 where it is just reached; undefined where nothing can be said. */
export type Goal = (outcome: Outcome) => number | undefined;

/** Factors tried before the search gives up: what lies beyond is another design, not a repair. */
const REACH = [1.02, 1.05, 1.1, 1.2, 1.35, 1.5, 1.75, 2, 2.5, 3] as const;
/** For a fraction the factors are those of x/(1 − x), so that nine tenths and 99.9 % are both within reach. */
const REACH_OF_FRACTION = [...REACH, 5, 10, 30, 100, 300, 1000, 3000, 10_000] as const;
const DIGITS = [3, 4, 5] as const;
/** Finer than the finest rounding. */
const PRECISION = 1e-7;

/**
 * The value nearest to the present one with which a goal is reached, rounded to the side that reaches it and predicted
 * again as rounded. `direction` 1 raises it, -1 lowers it. Undefined where the goal is not reached within a factor of 3,
 * the schema's limits and its usual range, or where the text can't be edited.
 */
export function solve(analysis: Analysis, path: string, goal: Goal, direction: 1 | -1): Solution | undefined {
  const present = parameterAt(analysis, path);
  const { outcome } = analysis;
  if (present === undefined || outcome === undefined || !(present.value > 0)) return undefined;
  const at = (value: number): number | undefined => {
    if (!allows(analysis.design, path, value) || !isUsual(analysis, path, value)) return undefined;
    const varied = vary(analysis, [{ path, value }]);
    return varied && goal(varied);
  };
  let near = present.value;
  if (!((goal(outcome) ?? 0) < 0)) return undefined;
  const fraction = isFraction(analysis, path);
  for (const factor of fraction ? REACH_OF_FRACTION : REACH) {
    const far = fraction ? moved(present.value, factor ** direction) : present.value * factor ** direction;
    const reached = at(far);
    if (reached === undefined) return undefined;
    if (reached >= 0) {
      const exact = rootBetween((value) => at(value) ?? -1, near, far, PRECISION);
      return rounded(analysis, path, exact ?? far, goal, direction);
    }
    near = far;
  }
  return undefined;
}

/** As few digits as reach the goal; the prediction is that of the rounded value. */
function rounded(analysis: Analysis, path: string, exact: number, goal: Goal, direction: 1 | -1): Solution | undefined {
  for (const digits of DIGITS) {
    const written = rewriting(analysis, path, exact, digits, direction > 0 ? 'up' : 'down');
    const outcome = written && vary(analysis, [{ path, value: written.value }]);
    if (written && outcome && (goal(outcome) ?? -1) >= 0) return { ...written, path, outcome };
  }
  return undefined;
}

/** A ratio that can't exceed 1. */
function isFraction({ design }: Analysis, path: string): boolean {
  const schema = design.schemaOf(path);
  if (schema?.kind !== 'quantity' || schema.dimension !== 'ratio') return false;
  return schema.limits.some(({ bound, value }) => (bound === 'below' || bound === 'at most') && value <= 1);
}

function moved(fraction: number, factor: number): number {
  const odds = (fraction / (1 - fraction)) * factor;
  return odds / (1 + odds);
}

function isUsual({ design }: Analysis, path: string, value: number): boolean {
  const schema = design.schemaOf(path);
  if (schema?.kind !== 'quantity' || schema.usual === undefined) return true;
  return value >= schema.usual.low.value && value <= schema.usual.high.value;
}

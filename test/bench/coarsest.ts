import type { DepletionPulse } from '../../extension/core/physics/depletion.ts';

type Figures = Pick<DepletionPulse, 'endsAt' | 'peak' | 'width'>;
type Solve = (tolerance: number) => (Figures & { readonly evaluations: number }) | undefined;

/** Tolerances tried, finest first: four a decade, 1e-12 to 1e-3. */
const TOLERANCES = Array.from({ length: 37 }, (_, i) => 10 ** (-12 + i / 4));

/** A tolerance at which a solver meets an error, and what that takes. */
export interface Choice {
  readonly tolerance: number;
  readonly evaluations: number;
}

/**
 * The coarsest tolerance that meets an error in the figures named, as all finer ones do: one that meets it by luck,
 * between others that don't, is none that anybody could choose. Undefined where even the finest doesn't.
 */
export function coarsest(solve: Solve, exact: Figures, keys: readonly (keyof Figures)[], error: number) {
  let choice: Choice | undefined;
  for (const tolerance of TOLERANCES) {
    const found = solve(tolerance);
    const met = found && keys.every((key) => Math.abs(found[key] / exact[key] - 1) <= error);
    if (!met) break;
    choice = { tolerance, evaluations: found.evaluations };
  }
  return choice;
}

import type { Workspace } from './dop853_tableau.ts';
import type { RightHandSide } from './integration.ts';

/**
 * Length of the first step, E. Hairer, S. P. Nørsett and G. Wanner, Solving Ordinary Differential Equations I, 2nd ed.,
 * Springer 1993, section II.4, with time counted in units of the interval so that the choice does not
 * depend on the unit. One evaluation.
 */
export function startingStep(
  rhs: RightHandSide,
  w: Workspace,
  time: number,
  span: number,
  relativeTolerance: number,
): number {
  const { n, y, trial, k1, k2, absoluteTolerance } = w;
  let size = 0;
  let slope = 0;
  for (let i = 0; i < n; i++) {
    const scale = absoluteTolerance[i]! + relativeTolerance * Math.abs(y[i]!);
    size += (y[i]! / scale) ** 2;
    slope += ((span * k1[i]!) / scale) ** 2;
  }
  const guess = size <= 1e-10 || slope <= 1e-10 ? 1e-6 : Math.min(0.01 * Math.sqrt(size / slope), 1);
  for (let i = 0; i < n; i++) trial[i] = y[i]! + guess * span * k1[i]!;
  rhs(time + guess * span, trial, k2);
  let curvature = 0;
  for (let i = 0; i < n; i++) {
    const scale = absoluteTolerance[i]! + relativeTolerance * Math.abs(y[i]!);
    curvature += ((span * (k2[i]! - k1[i]!)) / scale) ** 2;
  }
  const largest = Math.max(Math.sqrt(slope), Math.sqrt(curvature) / guess);
  const refined = largest <= 1e-15 ? Math.max(1e-6, 1e-3 * guess) : (0.01 / largest) ** (1 / 8);
  const fraction = Math.min(100 * guess, refined, 1);
  return Math.abs(span) * (fraction > 0 ? fraction : 1e-6);
}

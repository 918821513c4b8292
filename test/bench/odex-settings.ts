import type { Case } from './cases.ts';
import { coarsest } from './coarsest.ts';
import { type Formulation, type OdexSettings, odexPulse } from './odex-pulse.ts';

/**
 * The settings with which odex meets an error in fewest evaluations. The raw field begins at 1e-17, so that its
 * absolute tolerance is tried over decades.
 */
export function odexSettings(each: Case, formulation: Formulation, figures: boolean, error: number): OdexSettings {
  const keys = figures ? (['endsAt', 'peak', 'width'] as const) : (['endsAt'] as const);
  let best: (OdexSettings & { readonly evaluations: number }) | undefined;
  for (const fieldTolerance of formulation === 'raw' ? [1e-2, 1e-4, 1e-6, 1e-8, 1e-10] : [1]) {
    const settings = { formulation, fieldTolerance, figures };
    const solve = (tolerance: number) => odexPulse(each, { ...settings, tolerance });
    const choice = coarsest(solve, each.pulse, keys, error);
    if (choice && !(best && best.evaluations <= choice.evaluations)) best = { ...settings, ...choice };
  }
  if (!best) throw new Error(`odex does not meet an error of ${error}`);
  return best;
}

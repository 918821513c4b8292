import type { Parameter } from './parameters.ts';
import { EFFECT_NAMES, type EffectName, type Sensitivity } from './sensitivity.ts';

/** What the written tolerances do to a figure together. */
export interface Spread {
  /** Relative half-width. */
  readonly relative: number;
  /** The tolerance that contributes most. */
  readonly dominant: string;
  /** Its part of the sum of squares, 0 to 1. */
  readonly share: number;
}

/** Two predictions for each. */
const MOST_TOLERANCES = 100;

export type Spreads = Readonly<Partial<Record<EffectName, Spread>>>;

/**
 * Root of the sum of squares of each tolerance's effect, taken as independent: the law of propagation of uncertainty
 * for uncorrelated inputs (JCGM 100:2008, 5.1.2, first order). Empty where nothing has a tolerance, and where more have
 * one than an answer at once can take.
 */
export function spreadsOf(
  parameters: readonly Parameter[],
  sensitivity: (path: string) => Sensitivity | undefined,
): Spreads {
  const spreads: Partial<Record<EffectName, Spread>> = {};
  if (parameters.filter(({ tolerance }) => tolerance !== undefined).length > MOST_TOLERANCES) return spreads;
  const toleranced = parameters.flatMap(({ path, value, tolerance }) => {
    const found = tolerance === undefined || value === 0 ? undefined : sensitivity(path);
    return found && tolerance ? [{ path, effects: found.effects, relative: tolerance / Math.abs(value) }] : [];
  });
  for (const name of EFFECT_NAMES) {
    let sum = 0;
    let dominant = { path: '', square: 0 };
    for (const { path, effects, relative } of toleranced) {
      const square = ((effects[name] ?? 0) * relative) ** 2;
      sum += square;
      if (square > dominant.square) dominant = { path, square };
    }
    if (sum > 0) spreads[name] = { relative: Math.sqrt(sum), dominant: dominant.path, share: dominant.square / sum };
  }
  return spreads;
}

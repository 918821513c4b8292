import type { Analysis } from '../analyse.ts';
import type { Outcome } from '../physics/predict.ts';
import { marginsOf, tightestMargin } from './margins.ts';
import { allows, parameterAt } from './parameters.ts';
import { vary } from './vary.ts';

export const EFFECT_NAMES = ['energy', 'peak', 'width', 'margin'] as const;

export type EffectName = (typeof EFFECT_NAMES)[number];

/** Relative change of each figure per relative change of a value: ∂ln(figure)/∂ln(value), without unit. */
export type Effects = Readonly<Partial<Record<EffectName, number>>>;

export interface Sensitivity {
  readonly path: string;
  /** SI. */
  readonly value: number;
  readonly effects: Effects;
  /** The effects are those of an increase; a decrease does otherwise, since a limit or a switching time lies just here. */
  readonly oneSided: boolean;
}

/** Relative step of the difference quotients: its square, 1e-6, bounds their error where the model is smooth. */
const STEP = 1e-3;
/** Left and right quotients that differ by more than this, relatively and absolutely, belong to a kink. */
const KINK = { relative: 0.05, absolute: 0.005 } as const;

/**
 * How the figures of a design follow one of its values, from central differences of the whole model, defaults and table
 * figures following as they would in the file. Undefined where there is no pulse, the path is no number that the pulse
 * can depend on, or the number is 0, which has no relative change.
 */
export function sensitivityOf(analysis: Analysis, path: string): Sensitivity | undefined {
  const { outcome, design } = analysis;
  const parameter = parameterAt(analysis, path);
  if (outcome?.figures.pulse === undefined || parameter === undefined || parameter.value === 0) return undefined;
  const { value } = parameter;
  const base = figuresOf(outcome, outcome);
  const quotients = (side: 1 | -1): Effects | undefined => {
    const changed = value * (1 + side * STEP);
    const varied = allows(design, path, changed) ? vary(analysis, [{ path, value: changed }]) : undefined;
    return varied?.figures.pulse && quotient(base, figuresOf(varied, outcome), side * STEP);
  };
  const above = quotients(1);
  const below = quotients(-1);
  if (above === undefined || below === undefined) {
    const known = above ?? below;
    return known && { path, value, effects: known, oneSided: true };
  }
  const oneSided = EFFECT_NAMES.some((name) => kinked(above[name], below[name]));
  return { path, value, effects: oneSided ? above : mean(above, below), oneSided };
}

/** The margin is always the one that is tightest in the design as it stands. */
function figuresOf(outcome: Outcome, present: Outcome): Effects {
  const { pulse } = outcome.figures;
  const tightest = tightestMargin(present);
  const margin = marginsOf(outcome).find(({ kind, path }) => kind === tightest?.kind && path === tightest.path);
  return {
    ...(pulse && { energy: pulse.energy_J, peak: pulse.peak_power_W, width: pulse.width_fwhm_s }),
    ...(margin && { margin: margin.value }),
  };
}

function quotient(base: Effects, changed: Effects, step: number): Effects {
  return each((name) => {
    const [before, after] = [base[name], changed[name]];
    return before === undefined || after === undefined ? undefined : (after / before - 1) / step;
  });
}

function mean(above: Effects, below: Effects): Effects {
  return each((name) => {
    const [right, left] = [above[name], below[name]];
    return right === undefined || left === undefined ? undefined : (right + left) / 2;
  });
}

function each(figureOf: (name: EffectName) => number | undefined): Effects {
  const effects: Partial<Record<EffectName, number>> = {};
  for (const name of EFFECT_NAMES) {
    const value = figureOf(name);
    if (value !== undefined && Number.isFinite(value)) effects[name] = value;
  }
  return effects;
}

function kinked(right: number | undefined, left: number | undefined): boolean {
  if (right === undefined || left === undefined) return false;
  return Math.abs(right - left) > KINK.absolute + KINK.relative * Math.max(Math.abs(right), Math.abs(left));
}

import type { Analysis } from '../analyse.ts';
import type { Outcome } from '../physics/predict.ts';
import { marginsOf, tightestMargin } from './margins.ts';
import { allows, parameterAt } from './parameters.ts';
import { vary } from './vary.ts';

export const EFFECT_NAMES = ['energy', 'peak', 'width', 'margin'] as const;

export type EffectName = (typeof EFFECT_NAMES)[number];

/** A predicted number, SI; undefined where it does not apply. */
export type FigureOf = (outcome: Outcome) => number | undefined;

/** What a design does a little above and below one of its values. */
export interface Around {
  readonly path: string;
  /** SI. */
  readonly value: number;
  readonly here: Outcome;
  /** At `1 + STEP` and `1 - STEP` of the value; absent where that is not allowed or gives no pulse. */
  readonly above?: Outcome;
  readonly below?: Outcome;
}

/** Relative change of a figure per relative change of a value: ∂ln(figure)/∂ln(value), without unit. */
export interface Slope {
  readonly slope: number;
  /** It is that of an increase; a decrease does otherwise, since a limit or a switching time lies just here. */
  readonly oneSided: boolean;
}

/** Slopes of the figures that matter most. */
export interface Sensitivity {
  readonly path: string;
  /** SI. */
  readonly value: number;
  readonly effects: Readonly<Partial<Record<EffectName, number>>>;
  readonly oneSided: boolean;
}

/** Relative step of the difference quotients: its square, 1e-6, bounds their error where the model is smooth. */
const STEP = 1e-3;
/** Left and right quotients that differ by more than this, relatively and absolutely, belong to a kink. */
const KINK = { relative: 0.05, absolute: 0.005 } as const;

/**
 * Two more predictions, defaults and table figures following as they would in the file. Undefined where there is no
 * pulse, the path is no number that a pulse can depend on, or the number is 0, which has no relative change.
 */
export function around(analysis: Analysis, path: string): Around | undefined {
  const { outcome: here, design } = analysis;
  const parameter = parameterAt(analysis, path);
  if (here?.figures.pulse === undefined || parameter === undefined || parameter.value === 0) return undefined;
  const { value } = parameter;
  const at = (changed: number): Outcome | undefined => {
    const varied = allows(design, path, changed) ? vary(analysis, [{ path, value: changed }]) : undefined;
    return varied?.figures.pulse && varied;
  };
  const above = at(value * (1 + STEP));
  const below = at(value * (1 - STEP));
  return { path, value, here, ...(above && { above }), ...(below && { below }) };
}

/** From the central difference of the whole model; undefined where the figure does not apply or nothing lies beside. */
export function slopeOf({ here, above, below }: Around, figure: FigureOf): Slope | undefined {
  const base = figure(here);
  const quotient = (outcome: Outcome | undefined, step: number): number | undefined => {
    const changed = outcome && figure(outcome);
    const slope = base === undefined || changed === undefined ? Number.NaN : (changed / base - 1) / step;
    return Number.isFinite(slope) ? slope : undefined;
  };
  const right = quotient(above, STEP);
  const left = quotient(below, -STEP);
  if (right === undefined || left === undefined) {
    const known = right ?? left;
    return known === undefined ? undefined : { slope: known, oneSided: true };
  }
  const kink = KINK.absolute + KINK.relative * Math.max(Math.abs(right), Math.abs(left));
  const oneSided = Math.abs(right - left) > kink;
  return { slope: oneSided ? right : (right + left) / 2, oneSided };
}

/** How energy, peak, width and the tightest margin follow a value. */
export function sensitivityOf(near: Around): Sensitivity {
  const figures = effectFigures(near.here);
  const effects: Partial<Record<EffectName, number>> = {};
  let oneSided = false;
  for (const name of EFFECT_NAMES) {
    const found = slopeOf(near, figures[name]);
    if (found === undefined) continue;
    effects[name] = found.slope;
    oneSided ||= found.oneSided;
  }
  return { path: near.path, value: near.value, effects, oneSided };
}

/** The margin is always the one that is tightest in the design as it stands. */
function effectFigures(present: Outcome): Readonly<Record<EffectName, FigureOf>> {
  const tightest = tightestMargin(present);
  return {
    energy: ({ figures }) => figures.pulse?.energy_J,
    peak: ({ figures }) => figures.pulse?.peak_power_W,
    width: ({ figures }) => figures.pulse?.width_fwhm_s,
    margin: (outcome) =>
      marginsOf(outcome).find(({ kind, path }) => kind === tightest?.kind && path === tightest.path)?.value,
  };
}

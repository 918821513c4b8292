import type { Outcome } from '../physics/predict.ts';

/** How far a design stays from damage or pre-lasing. */
export interface Margin {
  readonly kind: 'damage' | 'hold-off';
  /** The surface, or `hold-off`. */
  readonly name: string;
  /** Where the design decides it. */
  readonly path: string;
  /** A factor; below 1 the limit is passed. */
  readonly value: number;
  /** What the design wants it to be: a surface's safety factor, the required hold-off margin, else 1. */
  readonly wanted: number;
}

/** Every margin that is known, surfaces in the order of the file, hold-off last. */
export function marginsOf({ figures, cavity, holdOffMargin }: Outcome): readonly Margin[] {
  const { surfaces } = cavity.module;
  const damage = figures.surfaces.flatMap(({ name, margin }, index): Margin[] => {
    const surface = surfaces[index];
    if (surface === undefined || margin === undefined) return [];
    return [{ kind: 'damage', name, path: surface.path, value: margin, wanted: surface.safetyFactor }];
  });
  if (holdOffMargin === undefined) return damage;
  const required = figures.requirements.find(({ name }) => name === 'hold_off_margin')?.minimum ?? 1;
  const path = 'q_switch.closed_loss';
  return [...damage, { kind: 'hold-off', name: 'hold-off', path, value: holdOffMargin, wanted: required }];
}

/** The margin with least to spare over what is wanted of it; undefined where none is known. */
export function tightestMargin(outcome: Outcome): Margin | undefined {
  const [first, ...others] = marginsOf(outcome);
  return first && others.reduce((least, one) => (spare(one) < spare(least) ? one : least), first);
}

function spare({ value, wanted }: Margin): number {
  return value / wanted;
}

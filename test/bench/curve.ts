import { rootBetween } from '../../extension/core/numerics/root.ts';

/** A step's dense output kept by its values at Chebyshev points: odex overwrites its own with the next step. */
export interface Curve {
  /** Where it rises through a level, if it does so within the step. */
  crossing(level: number): number | undefined;
}

const NODES = Array.from({ length: 20 }, (_, i) => -Math.cos((Math.PI * i) / 19));

export function sampled(course: (time: number) => number, from: number, to: number): Curve {
  const half = (to - from) / 2;
  const values = NODES.map((node) => course(from + half * (1 + node)));
  return {
    crossing(level) {
      if (!(values[0]! <= level && values.at(-1)! > level)) return undefined;
      const at = rootBetween((place) => valueAt(values, place) - level, -1, 1);
      return at === undefined ? undefined : from + half * (1 + at);
    },
  };
}

/** Barycentric interpolation. Source: Berrut & Trefethen, SIAM Review 46, 501 (2004). */
function valueAt(values: readonly number[], place: number): number {
  let above = 0;
  let below = 0;
  for (let i = 0; i < NODES.length; i++) {
    const distance = place - NODES[i]!;
    if (distance === 0) return values[i]!;
    const weight = ((i % 2 === 0 ? 1 : -1) * (i === 0 || i === NODES.length - 1 ? 0.5 : 1)) / distance;
    above += weight * values[i]!;
    below += weight;
  }
  return above / below;
}

import type { AcceptedStep } from '../numerics/dop853.ts';
import { rootBetween } from '../numerics/root.ts';

/** What is kept of an integration: the course of the field and the gain, step by step. */
export interface Trace {
  add(step: AcceptedStep): void;
  /** First time (s) at which the photons in the mode rose through a number. */
  rises(photons: number): number | undefined;
  /** Times in s, ln(1 + φ) and G at the ends of all steps kept and at points within them. */
  samples(): { readonly time: number[]; readonly field: number[]; readonly gain: number[] };
}

interface Segment {
  readonly start: number;
  readonly end: number;
  /** ln(φ + seed) at the Chebyshev nodes of the step: they carry the whole dense polynomial. */
  readonly field: Float64Array;
  readonly gainBefore: number;
  readonly gainAfter: number;
}

const NODES = Float64Array.from({ length: 8 }, (_, i) => -Math.cos((Math.PI * i) / 7));

/** A trace of a state laid out as ln(φ + seed), x, upper shares, lower shares weighted by `lowerWeight`. */
export function createTrace(rings: number, seed: number, lowerWeight: number): Trace {
  const segments: Segment[] = [];
  const gainOf = (state: Float64Array) => {
    let gain = 0;
    for (let k = 0; k < rings; k++) gain += state[2 + k]! - lowerWeight * (state[2 + rings + k] ?? 0);
    return gain;
  };
  return {
    add(step) {
      const half = (step.end - step.start) / 2;
      const field = new Float64Array(NODES.length);
      for (let i = 0; i < field.length; i++) field[i] = step.interpolate(step.start + half * (1 + NODES[i]!), 0);
      segments.push({
        start: step.start,
        end: step.end,
        field,
        gainBefore: gainOf(step.before),
        gainAfter: gainOf(step.after),
      });
    },
    rises(photons) {
      const level = Math.log(photons + seed);
      const found = segments.find((s) => s.field[0]! <= level && s.field[7]! > level);
      return found && rootBetween((time) => fieldAt(found, time) - level, found.start, found.end);
    },
    samples() {
      const time: number[] = [];
      const field: number[] = [];
      const gain: number[] = [];
      for (const s of segments) {
        for (let i = 0; i < 8; i++) {
          const share = (1 + NODES[i]!) / 2;
          time.push(s.start + share * (s.end - s.start));
          field.push(Math.log(Math.max(1, Math.exp(s.field[i]!) - seed + 1)));
          gain.push(s.gainBefore + share * (s.gainAfter - s.gainBefore));
        }
      }
      return { time, field, gain };
    },
  };
}

/** Barycentric interpolation on Chebyshev points of the second kind. Source: Berrut & Trefethen, SIAM Review 46, 501 (2004). */
function fieldAt(segment: Segment, time: number): number {
  const node = (2 * (time - segment.start)) / (segment.end - segment.start) - 1;
  let above = 0;
  let below = 0;
  for (let i = 0; i < 8; i++) {
    const distance = node - NODES[i]!;
    if (Math.abs(distance) < 1e-15) return segment.field[i]!;
    const weight = ((i % 2 === 0 ? 1 : -1) * (i === 0 || i === 7 ? 0.5 : 1)) / distance;
    above += weight * segment.field[i]!;
    below += weight;
  }
  return above / below;
}

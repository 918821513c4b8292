import { gaussLegendre, type QuadratureRule } from '../numerics/gauss-legendre.ts';
import type { Beam } from './gain-module.ts';

/**
 * The transverse plane cut into rings, each with one inversion. Arrays have one entry a ring.
 * A sum over rings of weight × f is (1/A) ∫ f ψ dA over the plane.
 */
export interface Rings {
  /** ψ: the mode's intensity over its value on axis, 0 to 1. */
  readonly intensity: Float64Array;
  readonly weight: Float64Array;
  /** Pump profile, m⁻²: its integral over the plane is 1. */
  readonly pump: Float64Array;
  /** A = ∫ ψ dA, m². */
  readonly modeArea: number;
}

const SMOOTH = gaussLegendre(20);
const STEEP = gaussLegendre(40);
/** Exponent q of the ring coordinate v, in which a Gaussian pump's share of the gain is the polynomial v^(q − 1). */
const STRETCH = 5;
/** A Gaussian pump is cut off from the reabsorbing rest where it has fallen to e^−36 of its axis value. */
const PUMP_DEPTH = 36;
/** Below this ψ the mode holds nothing that a double would keep. */
const SMALLEST_INTENSITY = 1e-15;

/**
 * Rings for a mode and a pump that both extend over the whole plane (`docs/model.md`, "Inversion").
 * A flat mode depletes evenly, so one ring with the mean inversion is exact. A Gaussian mode is cut in ψ,
 * where dA = −A dψ/ψ, at Gauss–Legendre nodes of a stretched coordinate; `reabsorbing` adds the unpumped part of the mode.
 * Radii in m, above 0.
 */
export function ringsFor(mode: Beam, pump: Beam, reabsorbing: boolean): Rings {
  if (mode.profile === 'flat') {
    const modeArea = Math.PI * mode.radius ** 2;
    const one = Float64Array.of(1);
    return { intensity: one, weight: one, pump: Float64Array.of(pumpWithin(pump, mode.radius) / modeArea), modeArea };
  }
  const modeArea = (Math.PI * mode.radius ** 2) / 2;
  if (pump.profile === 'gaussian') {
    const exponent = (mode.radius / pump.radius) ** 2;
    const onAxis = 2 / (Math.PI * pump.radius ** 2);
    const reach = Math.exp(-PUMP_DEPTH / exponent);
    const rings = reabsorbing
      ? join(panel(reach, 1, 4, STEEP), panel(0, reach, 4, SMOOTH))
      : panel(0, 1, STRETCH / (exponent + 1), SMOOTH);
    return { ...rings, pump: rings.intensity.map((psi) => onAxis * psi ** exponent), modeArea };
  }
  const edge = Math.exp(-2 * (pump.radius / mode.radius) ** 2);
  const level = 1 / (Math.PI * pump.radius ** 2);
  const inner = panel(edge, 1, 4, SMOOTH);
  const rings = reabsorbing ? join(inner, panel(0, edge, 4, SMOOTH)) : inner;
  return { ...rings, pump: rings.intensity.map((psi) => (psi >= edge ? level : 0)), modeArea };
}

/** Fraction of the pump that falls within a radius (m). */
export function pumpWithin(pump: Beam, radius: number): number {
  return pump.profile === 'flat'
    ? Math.min(1, (radius / pump.radius) ** 2)
    : -Math.expm1(-2 * (radius / pump.radius) ** 2);
}

type Panel = Pick<Rings, 'intensity' | 'weight'>;

/** Rings between two values of ψ, at the rule's nodes in v = ψ^(1/stretch); none where there is no width to cut. */
function panel(from: number, to: number, stretch: number, rule: QuadratureRule): Panel {
  const low = from ** (1 / stretch);
  const half = (to ** (1 / stretch) - low) / 2;
  const count = to > SMALLEST_INTENSITY ? rule.nodes.length : 0;
  const intensity = new Float64Array(count);
  const weight = new Float64Array(count);
  for (let i = 0; i < count; i++) {
    const v = low + half * (1 + rule.nodes[i]!);
    intensity[i] = v ** stretch;
    weight[i] = (rule.weights[i]! * half * stretch * intensity[i]!) / v;
  }
  return { intensity, weight };
}

function join(a: Panel, b: Panel): Panel {
  return {
    intensity: Float64Array.of(...a.intensity, ...b.intensity),
    weight: Float64Array.of(...a.weight, ...b.weight),
  };
}

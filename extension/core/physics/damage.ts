import type { GainModule, Surface } from './gain-module.ts';
import type { SurfaceFigures } from './prediction.ts';

/** Exponents of threshold against pulse width: square root, and the mean of published coatings (0.10 to 0.51). */
export const SQUARE_ROOT = 0.5;
export const COATING_MEAN = 0.3;
/** s: scaled thresholds are extrapolated outside this range, and refused below `SHORTEST_SCALED`. */
export const SCALED_RANGE = [50e-12, 100e-9] as const;
export const SHORTEST_SCALED = 20e-12;
/** Relative difference of wavelength above which a threshold says little. */
export const WAVELENGTH_MISMATCH = 0.05;

/**
 * Peak fluence on a surface in J/m², hot spots not counted. Outside: the leaving beam's, E/(πw²) flat, 2E/(πw²) Gaussian.
 * Inside, a transmitting face sees both directions, (1 + R)/(1 − R) times that; a reflecting face is judged by the
 * incident fluence, 1/(1 − R) times (ISO 21254). Exact at the coupler, an upper bound elsewhere. Energy in J, R below 1.
 */
export function peakFluence(module: GainModule, surface: Surface, energy: number): number {
  const { outputReflectivity: reflectivity, beam } = module.resonator;
  const leaving = ((beam.profile === 'gaussian' ? 2 : 1) * energy) / (Math.PI * surface.beamRadius ** 2);
  if (surface.place === 'outside') return leaving;
  return (leaving * (surface.face === 'transmitting' ? 1 + reflectivity : 1)) / (1 - reflectivity);
}

/** Threshold at a pulse width in J/m²: the cautious branch and the other end of the band between the two exponents. */
export interface ScaledThreshold {
  readonly cautious: number;
  readonly bold: number;
}

/**
 * Scales a threshold to another pulse width (s, full width at half maximum) as (τ/τ₀)^m; undefined below 20 ps.
 * Sources: Stuart et al., Phys. Rev. B 53, 1749 (1996), m = 1/2; Rainer et al., ASTM STP (1985), m = 0.10 to 0.51.
 */
export function scaledThreshold(surface: Surface, pulseWidth: number): ScaledThreshold | undefined {
  const { fluence, pulseWidth: givenAt } = surface.threshold;
  if (pulseWidth < SHORTEST_SCALED || givenAt < SHORTEST_SCALED) return undefined;
  const ends = [SQUARE_ROOT, COATING_MEAN].map((exponent) => fluence * (pulseWidth / givenAt) ** exponent);
  return { cautious: Math.min(...ends), bold: Math.max(...ends) };
}

/** Fluence, threshold and margin of a surface for a pulse. Margin: scaled threshold over fluence times hot-spot factor. */
export function surfaceFigures(module: GainModule, surface: Surface, energy: number, width: number): SurfaceFigures {
  const fluence = peakFluence(module, surface, energy);
  const threshold = scaledThreshold(surface, width);
  return {
    name: surface.name,
    peak_fluence_J_per_cm2: fluence * 1e-4,
    ...(threshold && {
      threshold_J_per_cm2: threshold.cautious * 1e-4,
      margin: threshold.cautious / (fluence * surface.hotSpotFactor),
    }),
  };
}

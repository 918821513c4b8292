import type { Beam, GainModule } from '../../extension/core/physics/gain-module.ts';
import { c, energyUnitOf, h, lossOf } from './modules.ts';
import { disc } from './raw-rate-equations.ts';

/** Trains worked out the long way: radial rings by the thousand, opening after opening, roots by bisection. */
export interface BruteTrain {
  readonly energy: number;
  readonly first: number | undefined;
  readonly gain: number;
  /** Upper-level ions over the whole plane just before an opening. */
  readonly ions: number;
  readonly depletion: number;
}

interface Ring {
  readonly psi: number;
  readonly area: number;
  /** m⁻². */
  readonly pump: number;
}

function profileAt(beam: Beam, r: number): number {
  if (beam.profile === 'flat') return r < beam.radius ? 1 / (Math.PI * beam.radius ** 2) : 0;
  return (2 / (Math.PI * beam.radius ** 2)) * Math.exp(-2 * (r / beam.radius) ** 2);
}

/** Rings out to where neither beam is left, cut where a flat beam ends or a Gaussian one changes. */
export function ringsOf(module: GainModule): Ring[] {
  const mode = module.resonator.beam;
  const pump = module.pump.beam;
  const cuts = [mode, pump].flatMap(({ profile, radius }) =>
    profile === 'flat' ? [0, radius] : [0, 0.8, 1.6, 2.6, 4.5].map((part) => part * radius),
  );
  cuts.sort((a, b) => a - b);
  const radial = cuts.slice(1).flatMap((to, i) => between(cuts[i]!, to));
  const onAxis = profileAt(mode, 0);
  return radial.map(({ r, area }) => ({ psi: profileAt(mode, r) / onAxis, area, pump: profileAt(pump, r) }));
}

function between(from: number, to: number) {
  const width = to - from;
  if (!(width > 0)) return [];
  return disc(1, 150).map(({ r, area }) => {
    const at = from + r * width;
    return { r: at, area: (area / r) * width * at };
  });
}

/** Follows `openings` openings from a cold start; every one that exceeds threshold fires. */
export function bruteTrain(module: GainModule, openings: number, rings = ringsOf(module)): BruteTrain {
  const { medium, pump, qSwitch } = module;
  const sigma = medium.emissionCrossSection + medium.absorptionCrossSection;
  const ground = medium.absorptionCrossSection
    ? ((medium.ionDensity ?? 0) * medium.length * medium.absorptionCrossSection) / sigma
    : 0;
  const area = rings.reduce((sum, ring) => sum + ring.psi * ring.area, 0);
  const rate = (pump.power * pump.absorbedFraction * pump.quantumEfficiency * pump.wavelength) / (h * c);
  const period = 1 / qSwitch.repetitionRate;
  const loss = lossOf(module);
  const decay = (time: number) => Math.exp(-time / medium.upperLevelLifetime);
  const fill = (n: number, s: number) => {
    if (pump.kind === 'continuous') return toward(n, s, period);
    const pumped = Math.min(pump.duration ?? 0, qSwitch.opensAt);
    return toward(n, s, pumped) * decay(qSwitch.opensAt - pumped);
  };
  const toward = (n: number, s: number, time: number) => {
    const full = rate * medium.upperLevelLifetime * s;
    return full + (n - full) * decay(time);
  };
  let ions = rings.map(() => 0);
  let last = { energy: 0, gain: 0, ions: 0, depletion: 0 };
  let first: number | undefined;
  for (let opening = 0; opening < openings; opening++) {
    ions = ions.map((n, k) => fill(n, rings[k]!.pump));
    const share = rings.map((ring, k) => ((2 * sigma) / area) * (ions[k]! - ground) * ring.psi * ring.area);
    const gain = share.reduce((sum, g) => sum + g, 0);
    const depletion = gain > loss ? depletionOf(share, rings, loss) : 0;
    const energy = energyUnitOf(module) * -Math.log(module.resonator.outputReflectivity) * depletion;
    first ??= energy > 0 ? energy : undefined;
    last = { energy, gain, ions: ions.reduce((sum, n, k) => sum + n * rings[k]!.area, 0), depletion };
    ions = ions.map((n, k) => {
      const used = -Math.expm1(-rings[k]!.psi * depletion);
      const left = n - ((n - ground) * used) / medium.inversionReductionFactor;
      return pump.kind === 'continuous' ? left : left * decay(period - qSwitch.opensAt);
    });
  }
  return { ...last, first };
}

/** The root of ∫G dx = loss·x that is not 0. */
function depletionOf(share: readonly number[], rings: readonly Ring[], loss: number): number {
  const field = (x: number) =>
    share.reduce((sum, g, k) => {
      const { psi } = rings[k]!;
      return sum + (psi > 0 ? (g * -Math.expm1(-psi * x)) / psi : g * x);
    }, 0) -
    loss * x;
  const gain = share.reduce((sum, g) => sum + g, 0);
  let low = 0;
  let high = 1e-3 * (gain / loss - 1);
  while (field(high) > 0) {
    low = high;
    high *= 2;
  }
  for (let pass = 0; pass < 52; pass++) {
    const middle = (low + high) / 2;
    if (field(middle) > 0) low = middle;
    else high = middle;
  }
  return high;
}

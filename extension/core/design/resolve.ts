import type { GainModule, Pump, QSwitch, Surface } from '../physics/gain-module.ts';
import type { Problem } from '../report/problem.ts';
import type { PumpSection, QSwitchSection, SurfaceSection } from './generated/gain-module.ts';
import { createOrigins, type Origin, type Origins } from './origins.ts';
import type { Draft, ReadDesign } from './read.ts';
import { reporter, resolveMedium } from './resolve-medium.ts';

/** A design with nothing left open: the module in SI, where each filled-in figure comes from, and what stands in the way. */
export interface ResolvedDesign {
  /** Absent where a section that the pulse depends on is incomplete or invalid. */
  readonly module?: GainModule;
  /** By path: every figure that the file does not give itself. */
  readonly origins: ReadonlyMap<string, Origin>;
  readonly problems: readonly Problem[];
}

/** Paths that the pulse does not depend on. */
const BESIDE_THE_PULSE = /^(title$|surfaces|requirements|x-)/;

/** Fills in defaults and the property table's figures. Nothing else is assumed: what is missing is a problem. */
export function resolveDesign(design: ReadDesign): ResolvedDesign {
  const problems: Problem[] = [];
  const origins = createOrigins();
  const { gain_medium, pump, resonator, q_switch, surfaces } = design.values;
  const medium = gain_medium && resolveMedium(gain_medium, origins, reporter(problems, design.rangeOf));
  const resolvedPump = pump && resolvePump(pump, origins);
  const qSwitch = q_switch && resolvedPump && resolveSwitch(q_switch, resolvedPump, origins);
  const cavity = resolveResonator(resonator);
  const blocked = design.problems.some((p) => p.severity === 'error' && !BESIDE_THE_PULSE.test(p.path));
  const module = !blocked &&
    medium &&
    resolvedPump &&
    cavity &&
    qSwitch && {
      medium,
      pump: resolvedPump,
      resonator: cavity,
      qSwitch,
      surfaces: (surfaces ?? []).flatMap((surface, index) => resolveSurface(surface, index, origins)),
    };
  return { ...(module && { module }), origins: origins.all, problems };
}

function resolveResonator(section: ReadDesign['values']['resonator']): GainModule['resonator'] | undefined {
  const { length, output_reflectivity, round_trip_loss, beam } = section ?? {};
  if (!length || !output_reflectivity || !round_trip_loss || !beam?.profile || !beam.radius) return undefined;
  return {
    length: length.value,
    outputReflectivity: output_reflectivity.value,
    roundTripLoss: round_trip_loss.value,
    beam: { profile: beam.profile, radius: beam.radius.value },
  };
}

function resolvePump(section: Draft<PumpSection>, origins: Origins): Pump | undefined {
  const { kind, wavelength, absorbed_fraction, beam, duration } = section;
  const power = section.power?.value ?? diodePower(section.diode, origins);
  if (!kind || !wavelength || power === undefined || !absorbed_fraction || !beam?.profile || !beam.radius)
    return undefined;
  if (kind === 'pulsed' && !duration) return undefined;
  return {
    kind,
    wavelength: wavelength.value,
    power,
    ...(duration && { duration: duration.value }),
    absorbedFraction: absorbed_fraction.value,
    quantumEfficiency: section.quantum_efficiency?.value ?? origins.fallback('pump.quantum_efficiency', 1, '1'),
    beam: { profile: beam.profile, radius: beam.radius.value },
  };
}

/** (I − I_th) · slope · count · delivery, never below 0 W. */
function diodePower(diode: Draft<PumpSection>['diode'], origins: Origins): number | undefined {
  const { current, threshold_current, slope_efficiency, count } = diode ?? {};
  if (!current || !threshold_current || !slope_efficiency || count === undefined) return undefined;
  const delivery = diode?.delivery_efficiency?.value ?? origins.fallback('pump.diode.delivery_efficiency', 1, '100 %');
  return Math.max(0, current.value - threshold_current.value) * slope_efficiency.value * count * delivery;
}

function resolveSwitch(section: Draft<QSwitchSection>, pump: Pump, origins: Origins): QSwitch | undefined {
  const { kind, repetition_rate, closed_loss, opens_at, gate, opening_time, absorber } = section;
  if (!kind || !repetition_rate) return undefined;
  const rate = repetition_rate.value;
  const pulsed = pump.kind === 'pulsed' && pump.duration !== undefined;
  return {
    kind,
    ...(closed_loss && { closedLoss: closed_loss.value }),
    openingTime: opening_time?.value ?? origins.fallback('q_switch.opening_time', 0, 'instantaneous'),
    opensAt:
      opens_at?.value ?? (pulsed ? origins.fallback('q_switch.opens_at', pump.duration, "the pump's end") : 1 / rate),
    gate: gate?.value ?? origins.fallback('q_switch.gate', 0.5 / rate, 'half the period'),
    repetitionRate: rate,
    extraOpticalPath: (absorber?.length?.value ?? 0) * ((absorber?.refractive_index?.value ?? 1) - 1),
  };
}

function resolveSurface(section: Draft<SurfaceSection>, index: number, origins: Origins): Surface[] {
  const { name, place, face, beam_radius, damage_threshold, hot_spot_factor, safety_factor } = section;
  const { fluence, pulse_width, wavelength } = damage_threshold ?? {};
  if (!name || !place || !beam_radius || !fluence || !pulse_width || !wavelength) return [];
  const path = `surfaces[${index}]`;
  return [
    {
      name,
      path,
      place,
      face: face ?? 'transmitting',
      beamRadius: beam_radius.value,
      threshold: { fluence: fluence.value, pulseWidth: pulse_width.value, wavelength: wavelength.value },
      hotSpotFactor: hot_spot_factor?.value ?? origins.fallback(`${path}.hot_spot_factor`, 1, '1'),
      safetyFactor: safety_factor?.value ?? origins.fallback(`${path}.safety_factor`, 1, '1'),
    },
  ];
}

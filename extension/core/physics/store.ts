import { type Cavity, roundTripGain } from './cavity.ts';

/** What the medium holds: upper-level ions per m² of each ring, and ions in all over the whole pumped area. */
export interface Store {
  readonly ions: Float64Array;
  readonly total: number;
  /** The gain reached what the closed switch holds, and filling stopped there. */
  readonly overfilled: boolean;
}

/** From one opening to the next, in s: decay until the pump starts, pumping, decay until the switch opens. */
export interface Schedule {
  readonly idle: number;
  readonly pumped: number;
  readonly wait: number;
}

/** The schedule of a train; a continuous pump's first opening comes one period after its start. */
export function scheduleOf(cavity: Cavity): Schedule {
  const { pump, qSwitch } = cavity.module;
  const period = 1 / qSwitch.repetitionRate;
  if (pump.kind === 'continuous') return { idle: 0, pumped: period, wait: 0 };
  const pumped = Math.min(pump.duration ?? 0, qSwitch.opensAt);
  return { idle: Math.max(0, period - qSwitch.opensAt), pumped, wait: qSwitch.opensAt - pumped };
}

export function emptyStore(cavity: Cavity): Store {
  return { ions: new Float64Array(cavity.rings.weight.length), total: 0, overfilled: false };
}

/** What the pump would hold against decay alone, if it ran on for ever. */
export function fullStore(cavity: Cavity): Store {
  const ions = cavity.pumpRate * cavity.module.medium.upperLevelLifetime;
  return { ions: cavity.rings.pump.map((profile) => ions * profile), total: ions, overfilled: false };
}

/**
 * The store at the next opening: dN/dt = rate·s − N/τ while pumped, −N/τ otherwise. With a `limit`, filling stops
 * where the round-trip log gain reaches it, the profile kept. `pumped` may be infinite.
 */
export function refill(cavity: Cavity, left: Store, schedule: Schedule, limit = Number.POSITIVE_INFINITY): Store {
  const lifetime = cavity.module.medium.upperLevelLifetime;
  const idled = blend(left, emptyStore(cavity), -Math.expm1(-schedule.idle / lifetime));
  const full = fullStore(cavity);
  const before = roundTripGain(cavity, idled.ions);
  const ceiling = roundTripGain(cavity, full.ions);
  const approach = -Math.expm1(-schedule.pumped / lifetime);
  const approachAtLimit = (limit - before) / (ceiling - before);
  const overfilled = ceiling > limit && before <= limit && approachAtLimit < approach;
  const filled = blend(idled, full, overfilled ? approachAtLimit : approach);
  return { ...blend(filled, emptyStore(cavity), -Math.expm1(-schedule.wait / lifetime)), overfilled };
}

/** The store a share (0 to 1) of the way from one to another. */
export function blend(from: Store, to: Store, share: number): Store {
  return {
    ions: from.ions.map((n, k) => n + share * (to.ions[k]! - n)),
    total: from.total + share * (to.total - from.total),
    overfilled: false,
  };
}

/** Takes from each ring the part of its inversion that a pulse used up: a loss ΔN of inversion costs ΔN/γ upper-level ions. */
export function drain(cavity: Cavity, store: Store, used: (ring: number) => number): Store {
  const { weight, intensity, modeArea } = cavity.rings;
  const ions = store.ions.map((n, k) => n - ((n - cavity.ground) * used(k)) / cavity.reduction);
  let taken = 0;
  for (let k = 0; k < ions.length; k++) taken += (weight[k]! / intensity[k]!) * (store.ions[k]! - ions[k]!);
  return { ions, total: store.total - modeArea * taken, overfilled: false };
}

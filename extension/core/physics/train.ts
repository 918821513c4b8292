import { type Balance, balancedDepletion, balanceOf, singleShot } from './balance.ts';
import { type Cavity, roundTripGain } from './cavity.ts';
import { type Firing, fire } from './fire.ts';
import { blend, emptyStore, refill, type Schedule, type Store, scheduleOf } from './store.ts';

/** What a module does opening after opening, from a cold start on. */
export interface Train {
  /** Just before the settled pulse; where none fires, what the closed and reopened switch holds for good. */
  readonly store: Store;
  readonly settled?: Firing;
  readonly first?: Firing;
  readonly afterPause?: Firing;
  /** Mean energy per opening once settled, J. */
  readonly meanEnergy: number;
  /** The gain that filling would have reached, had the closed switch held it; absent where it did hold. */
  readonly unheldGain?: number;
  /** Openings fail or pulses alternate instead of settling; `settled` is then the largest pulse met. */
  readonly unsettled: boolean;
  /** Openings followed, at most 240, and integration steps that they took, about 20,000 at most. */
  readonly work: { readonly openings: number; readonly steps: number };
  /** What the optimum coupling is judged by: the store given for a pulsed pump, the balance for a continuous one. */
  readonly balance: Balance;
}

/** Openings followed before a train is called unsettled, and the last of them that its mean is taken over. */
const MOST_OPENINGS = 240;
const MEAN_OVER = 64;
/** Relative change of gain from opening to opening at which a train is settled. */
const SETTLED = 1e-11;
/** The same where pulses are integrated in time, to about 1e-10 each. */
const SETTLED_INTEGRATED = 1e-9;
/** Integration steps allowed for a train; one pulse takes about 60. */
const MOST_STEPS = 20_000;
/** Relative difference of gain at which a train that repeats is the one in balance. */
const SAME_GAIN = 1e-6;
/** After so many openings in a row that came closer to balance, the train is taken to reach it. */
const APPROACHES = 8;

/** Follows openings until they repeat. An opening that fails carries its inversion over. */
export function trainOf(cavity: Cavity): Train {
  const { pump } = cavity.module;
  const schedule = scheduleOf(cavity);
  const limit = cavity.loss + cavity.closedLog;
  const lost = lostInPeriod(cavity);
  const balance = trainBalance(cavity, schedule, lost);
  let unheldGain = 0;
  const fill = (left: Store, over: Schedule) => {
    const store = refill(cavity, left, over, limit);
    if (store.overfilled) unheldGain = Math.max(unheldGain, roundTripGain(cavity, refill(cavity, left, over).ions));
    return store;
  };
  const run = follow(cavity, schedule, fill, limit, lost, balance);
  const afterPause =
    pump.kind === 'continuous'
      ? fire(cavity, refill(cavity, emptyStore(cavity), { idle: 0, pumped: Number.POSITIVE_INFINITY, wait: 0 }, limit))
      : undefined;
  return {
    ...run,
    ...(afterPause && { afterPause }),
    ...(unheldGain > 0 && { unheldGain }),
    balance: pump.kind === 'continuous' ? balance : singleShot(cavity, run.store),
  };
}

/** The pulse that a train settles to, found without following it; undefined where none lasts. */
export function settledPulse(cavity: Cavity): Firing | undefined {
  if (cavity.module.medium.lowerLevelLifetime !== undefined) return trainOf(cavity).settled;
  const balance = trainBalance(cavity, scheduleOf(cavity), lostInPeriod(cavity));
  return balanced(cavity, balance, cavity.loss + cavity.closedLog)?.settled;
}

function trainBalance(cavity: Cavity, schedule: Schedule, lost: number): Balance {
  return balanceOf(cavity, refill(cavity, emptyStore(cavity), { ...schedule, idle: 0 }), lost);
}

/** The part of the upper-level ions that decays from one opening to the next. */
function lostInPeriod({ module: { qSwitch, medium } }: Cavity): number {
  return -Math.expm1(-1 / (qSwitch.repetitionRate * medium.upperLevelLifetime));
}

function follow(
  cavity: Cavity,
  schedule: Schedule,
  fill: (left: Store, over: Schedule) => Store,
  limit: number,
  lost: number,
  balance: Balance,
) {
  const idle = balance.store(0);
  const goal = balanced(cavity, balance, limit);
  const goalGain = goal ? roundTripGain(cavity, goal.store.ions) : Number.NaN;
  const energies: number[] = [];
  let store = fill(emptyStore(cavity), { ...schedule, idle: 0 });
  let first: Firing | undefined;
  let largest: Balanced | undefined;
  let approaches = 0;
  let steps = 0;
  for (let opening = 0; opening < MOST_OPENINGS && steps < MOST_STEPS; opening++) {
    if (!(roundTripGain(cavity, store.ions) > cavity.loss)) {
      const waited = untilThreshold(cavity, store, idle, lost);
      if (waited === undefined)
        return { store: idle, ...ended(first, undefined, 0, false), work: { openings: opening, steps } };
      store = waited;
    }
    const fired = fire(cavity, store);
    first ??= fired;
    steps += fired?.steps ?? 0;
    const work = { openings: opening + 1, steps };
    if (fired && fired.energy >= (largest?.settled.energy ?? 0)) largest = { store, settled: fired };
    energies.push(fired?.energy ?? 0);
    const next = fill(fired?.after ?? store, schedule);
    const gain = roundTripGain(cavity, store.ions);
    const nextGain = roundTripGain(cavity, next.ions);
    const near = fired?.model === 'time_integration' ? SETTLED_INTEGRATED : SETTLED;
    const repeats = Math.abs(nextGain - gain) <= near * gain;
    // Ions beside the mode, which no pulse takes, may gather for much longer than the gain takes to repeat.
    if (repeats && Math.abs(next.total - store.total) <= near * store.total)
      return { store, ...ended(first, fired, fired?.energy ?? 0, false), work };
    const arrived = repeats && Math.abs(gain - goalGain) <= SAME_GAIN * gain;
    approaches = fired && Math.abs(nextGain - goalGain) < Math.abs(gain - goalGain) ? approaches + 1 : 0;
    if (goal && (arrived || approaches >= APPROACHES))
      return { store: goal.store, ...ended(first, goal.settled, goal.settled.energy, false), work };
    store = next;
  }
  const tail = energies.slice(-MEAN_OVER);
  const mean = tail.reduce((sum, energy) => sum + energy, 0) / tail.length;
  return {
    store: largest?.store ?? store,
    ...ended(first, largest?.settled, mean, true),
    work: { openings: energies.length, steps },
  };
}

/** A store and the pulse that comes of it. */
interface Balanced {
  readonly store: Store;
  readonly settled: Firing;
}

/**
 * The pulse of a train in balance, where the pulse takes just the depletion that it was assumed to; undefined where
 * there is none, the switch would not hold, or a lower level of its own makes depletion say too little.
 */
function balanced(cavity: Cavity, balance: Balance, limit: number): Balanced | undefined {
  if (cavity.module.medium.lowerLevelLifetime !== undefined) return undefined;
  let depletion = balancedDepletion(balance, cavity.loss);
  let previous: { readonly at: number; readonly miss: number } | undefined;
  for (let pass = 0; pass < 12 && depletion !== undefined && depletion > 0; pass++) {
    const store = balance.store(depletion);
    const settled = roundTripGain(cavity, store.ions) < limit ? fire(cavity, store) : undefined;
    if (!settled) return undefined;
    const miss = settled.depletion - depletion;
    if (settled.model === 'depletion' || Math.abs(miss) <= SETTLED_INTEGRATED * depletion) return { store, settled };
    const at = depletion;
    depletion = previous ? at - (miss * (at - previous.at)) / (miss - previous.miss) : settled.depletion;
    previous = { at, miss };
  }
  return undefined;
}

function ended(first: Firing | undefined, settled: Firing | undefined, meanEnergy: number, unsettled: boolean) {
  return { ...(first && { first }), ...(settled && { settled }), meanEnergy, unsettled };
}

/** The store at the first opening whose gain exceeds the loss, none firing before; undefined if that never comes. */
function untilThreshold(cavity: Cavity, store: Store, idle: Store, lost: number): Store | undefined {
  const ceiling = roundTripGain(cavity, idle.ions);
  const gain = roundTripGain(cavity, store.ions);
  if (!(ceiling > cavity.loss)) return undefined;
  const openings = Math.floor(Math.log((ceiling - cavity.loss) / (ceiling - gain)) / Math.log1p(-lost)) + 1;
  return blend(store, idle, -Math.expm1(openings * Math.log1p(-lost)));
}

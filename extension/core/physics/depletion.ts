import { gaussLegendre } from '../numerics/gauss-legendre.ts';

/**
 * The pulse as a function of depletion x, where dx = 2γσI dt/(hν) with I the one-way intensity on axis.
 * `gain[k]` is ring k's share of the round-trip log gain before the pulse, `intensity[k]` its ψ; then
 * G(x) = Σ gain·exp(−ψx), and the field in units of hν/(2γσ t_r) is F(x) = start + ∫₀ˣ G dx' − loss·x.
 * Sources: Degnan, IEEE J. Quantum Electron. 25, 214 (1989); Wagner & Lengyel, J. Appl. Phys. 34, 2040 (1963).
 */
export interface Depletion {
  readonly gain: Float64Array;
  readonly intensity: Float64Array;
  /** δ, round-trip log loss, above 0. */
  readonly loss: number;
  /** Field at x = 0 in the same unit, at or above 0. */
  readonly start: number;
}

export interface DepletionPulse {
  /** x where the field peaks (G = loss) and where it has gone back to zero. */
  readonly peakAt: number;
  readonly endsAt: number;
  /** F at the peak. */
  readonly peak: number;
  /** Full width at half maximum in units of t_r. */
  readonly width: number;
}

/** G, F and dG/dx at one depletion. */
interface Course {
  gain: number;
  field: number;
  slope: number;
}

const RULE = gaussLegendre(12);
/** Relative step after which Newton's (quadratic) and Halley's (cubic) next step would be below rounding. */
const NEWTON_LAST_STEP = 1e-8;
const HALLEY_LAST_STEP = 1e-5;
const MAXIMUM_ITERATIONS = 60;
/** Coefficients of s, s², … in z where e^−z − 1 + z = s²/2, used up to the s where 1 + s²/2 is as good. */
const SERIES = [1, 1 / 6, 1 / 36, 1 / 270, 1 / 4320, -1 / 17010, -139 / 5443200, -1 / 204120];
const SERIES_REACH = 2.4;

/** Σ gain: the round-trip log gain before the pulse. */
export function smallSignalGain(gain: Float64Array): number {
  let sum = 0;
  for (let k = 0; k < gain.length; k++) sum += gain[k]!;
  return sum;
}

/** Field and gain at a depletion x ≥ 0. */
export function courseAt(depletion: Depletion, x: number): Course {
  const course = { gain: Number.NaN, field: Number.NaN, slope: Number.NaN };
  follow(depletion, x, course);
  return course;
}

/** The pulse, or undefined where the gain does not exceed the loss or the field never doubles its start. */
export function depletionPulse(depletion: Depletion): DepletionPulse | undefined {
  const course: Course = { gain: Number.NaN, field: Number.NaN, slope: Number.NaN };
  const rise = smallSignalGain(depletion.gain) - depletion.loss;
  if (!(rise > 0)) return undefined;
  const peakAt = gainFallsTo(depletion, depletion.loss, course);
  const peak = course.field;
  const { slope } = course;
  const half = peak / 2;
  let endsAt = fieldReaches(depletion, 0, peakAt + fallsBy(depletion, peak, slope, 1), course);
  // Rings that reabsorb may make the pulse end much sooner than guessed, but never before this.
  if (!(endsAt > peakAt)) endsAt = fieldReaches(depletion, 0, 2 * peakAt, course);
  if (!(peak > 2 * depletion.start) || !(endsAt > peakAt) || !Number.isFinite(endsAt)) return undefined;
  // The tangents at both ends enclose the field, which is concave.
  const earliest = (half - depletion.start) / rise;
  const latest = endsAt + half / (course.gain - depletion.loss);
  const early = Math.max(earliest, peakAt + fallsBy(depletion, half, slope, -1));
  const before = fieldReaches(depletion, half, early, course);
  const late = Math.min(peakAt + fallsBy(depletion, half, slope, 1), latest);
  const after = fieldReaches(depletion, half, late, course);
  return { peakAt, endsAt, peak, width: timeBetween(depletion, before, after, endsAt) };
}

/**
 * How far after (`side` 1) or before (−1) the peak the field has fallen by `drop`, were the gain one exponential that
 * has the loss as its value and `slope` as its slope at the peak: so it is for one ring, and more rings put the place
 * between the result and the peak before it, beyond it after it. −∞ where that says nothing.
 * With z the distance in e-foldings, e^−z − 1 + z = s²/2. Source: z = s + s²/6 + s³/36 + …, the series of
 * Marsaglia & Marsaglia, Am. Math. Monthly 97, 826 (1990), or nearly 1 + s²/2 where z is large.
 */
function fallsBy({ loss }: Depletion, drop: number, slope: number, side: 1 | -1): number {
  const fold = -loss / slope;
  const level = drop / (loss * fold);
  const s = side * Math.sqrt(2 * level);
  if (s < -SERIES_REACH) return Number.NEGATIVE_INFINITY;
  if (s > SERIES_REACH) return fold * (1 + level);
  let sum = 0;
  for (let i = SERIES.length - 1; i >= 0; i--) sum = s * (SERIES[i]! + sum);
  return fold * sum;
}

/** Where Newton's method on ln G steps to from x = 0. */
function firstGuess({ gain, intensity }: Depletion, level: number): number {
  let sum = 0;
  let slope = 0;
  for (let k = 0; k < gain.length; k++) {
    sum += gain[k]!;
    slope += gain[k]! * intensity[k]!;
  }
  return slope > 0 ? (Math.log(sum / level) * sum) / slope : 0;
}

/** Smallest x > 0 where the gain has fallen to `level` (0 < level < G(0)), by Newton's method on ln G; leaves `course` there. */
export function gainFallsTo(depletion: Depletion, level: number, course: Course): number {
  let low = 0;
  let high = Number.POSITIVE_INFINITY;
  let x = firstGuess(depletion, level);
  for (let pass = 0; pass < MAXIMUM_ITERATIONS; pass++) {
    follow(depletion, x, course);
    if (course.gain > level) low = x;
    else high = x;
    const step = course.gain > 0 ? (Math.log(course.gain / level) * course.gain) / -course.slope : Number.NaN;
    let next = x + step;
    if (!(next >= low && next <= high)) next = high === Number.POSITIVE_INFINITY ? 2 * low + 1 : (low + high) / 2;
    const last = Math.abs(next - x) <= NEWTON_LAST_STEP * next;
    x = next;
    if (last) break;
  }
  return x;
}

/**
 * x where the field reaches `level`, by Halley's method from a guess on the wanted side of the peak: the field
 * is concave there, so the first step lands where the rest converge from one side. Leaves `course` at the last guess.
 */
function fieldReaches(depletion: Depletion, level: number, guess: number, course: Course): number {
  let x = guess;
  for (let pass = 0; pass < MAXIMUM_ITERATIONS; pass++) {
    follow(depletion, x, course);
    const excess = course.field - level;
    const rate = course.gain - depletion.loss;
    const step = excess / (rate - (excess * course.slope) / (2 * rate));
    x -= step;
    if (!(Math.abs(step) > HALLEY_LAST_STEP * x)) break;
  }
  return x;
}

/** ∫ dx/F between two depletions inside the pulse, in units of t_r; u = ln[x/(end − x)] takes both zeros of F to infinity. */
function timeBetween(depletion: Depletion, from: number, to: number, end: number): number {
  const low = Math.log(from / (end - from));
  const half = (Math.log(to / (end - to)) - low) / 2;
  let sum = 0;
  const middle = Math.exp(low + half);
  const last = RULE.nodes.length - 1;
  for (let i = 0; 2 * i < last; i++) {
    const spread = Math.exp(half * RULE.nodes[i]!);
    const pair = paceAt(depletion, end, middle * spread) + paceAt(depletion, end, middle / spread);
    sum += RULE.weights[i]! * pair;
  }
  return sum * half;
}

/** dx/(F du) at u = ln(odds). */
function paceAt(depletion: Depletion, end: number, odds: number): number {
  const share = 1 / (1 + odds);
  const x = end * odds * share;
  return (x * share) / fieldAt(depletion, x);
}

/**
 * Time from x = 0 to a later depletion up to the peak, in units of t_r; start must be above 0.
 * 1/F is split into 1/(start + rise·x), integrated exactly, and a smooth rest.
 */
export function timeTo(depletion: Depletion, x: number): number {
  const course: Course = { gain: Number.NaN, field: Number.NaN, slope: Number.NaN };
  const { start } = depletion;
  const rise = smallSignalGain(depletion.gain) - depletion.loss;
  let rest = 0;
  for (let i = 0; i < RULE.nodes.length; i++) {
    const at = (x / 2) * (1 + RULE.nodes[i]!);
    follow(depletion, at, course);
    const straight = start + rise * at;
    rest += (RULE.weights[i]! * (straight - course.field)) / (course.field * straight);
  }
  return Math.log1p((rise * x) / start) / rise + (rest * x) / 2;
}

/** Time from the peak until the field has fallen to a fraction of it, in units of t_r. */
export function timeFromPeak(depletion: Depletion, pulse: DepletionPulse, fraction: number): number {
  const course: Course = { gain: Number.NaN, field: Number.NaN, slope: Number.NaN };
  const to = fieldReaches(depletion, fraction * pulse.peak, pulse.endsAt, course);
  return timeBetween(depletion, pulse.peakAt, to, pulse.endsAt);
}

/** Depletions and times (units of t_r, zero at the peak) at `points` places between two equal fractions of the peak. */
export function timesBetween(
  depletion: Depletion,
  pulse: DepletionPulse,
  fraction: number,
  points: number,
): { readonly x: number; readonly time: number }[] {
  const { peakAt, peak, endsAt } = pulse;
  const course: Course = { gain: Number.NaN, field: Number.NaN, slope: Number.NaN };
  const level = Math.max(fraction * peak, 2 * depletion.start);
  const rise = smallSignalGain(depletion.gain) - depletion.loss;
  const from = fieldReaches(depletion, level, (level - depletion.start) / rise, course);
  const to = fieldReaches(depletion, level, endsAt, course);
  const low = Math.log(from / (endsAt - from));
  const step = (Math.log(to / (endsAt - to)) - low) / (points - 1);
  const places = Array.from({ length: points }, (_, i) => endsAt / (1 + Math.exp(-(low + i * step))));
  const before = timeBetween(depletion, from, peakAt, endsAt);
  let time = -before;
  return places.map((x, i) => {
    if (i > 0) time += timeBetween(depletion, places[i - 1]!, x, endsAt);
    return { x, time };
  });
}

/** F alone. */
function fieldAt({ gain, intensity, start, loss }: Depletion, x: number): number {
  let field = start - loss * x;
  for (let k = 0; k < gain.length; k++) field -= (gain[k]! * Math.expm1(-intensity[k]! * x)) / intensity[k]!;
  return field;
}

function follow(depletion: Depletion, x: number, course: Course): void {
  const { gain, intensity } = depletion;
  let g = 0;
  let field = depletion.start - depletion.loss * x;
  let slope = 0;
  for (let k = 0; k < gain.length; k++) {
    const psi = intensity[k]!;
    const share = gain[k]!;
    const lost = -share * Math.expm1(-psi * x);
    const left = share - lost;
    g += left;
    field += lost / psi;
    slope -= psi * left;
  }
  course.gain = g;
  course.field = field;
  course.slope = slope;
}

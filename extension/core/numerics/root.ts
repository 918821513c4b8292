/**
 * A root of f between two ends where f changes sign, by Brent's method, to about 1e-14 of the bracket's scale, or to
 * `precision` of itself.
 * Undefined where the signs do not differ or f is not finite there.
 * Source: R. P. Brent, Algorithms for Minimization without Derivatives (1973), ch. 4.
 */
export function rootBetween(f: (x: number) => number, from: number, to: number, precision = 2e-15): number | undefined {
  let a = from;
  let b = to;
  let fa = f(a);
  let fb = f(b);
  if (!Number.isFinite(fa) || !Number.isFinite(fb)) return undefined;
  if (fa === 0) return a;
  if (fb !== 0 && fa > 0 === fb > 0) return undefined;
  let c = a;
  let fc = fa;
  let previous = b - a;
  let step = previous;
  for (let pass = 0; pass < 200 && fb !== 0; pass++) {
    if (Math.abs(fc) < Math.abs(fb)) {
      [a, b, c] = [b, c, b];
      [fa, fb, fc] = [fb, fc, fb];
    }
    const tolerance = precision * Math.abs(b);
    const middle = (c - b) / 2;
    if (Math.abs(middle) <= tolerance) break;
    const trial = interpolate(a, b, c, fa, fb, fc);
    const limit = Math.min(Math.abs(previous) / 2, 1.5 * Math.abs(middle));
    const taken = Math.abs(trial) < limit && trial > 0 === middle > 0 ? trial : middle;
    previous = taken === middle ? middle : step;
    step = taken;
    a = b;
    fa = fb;
    b += Math.abs(step) > tolerance ? step : Math.sign(middle) * tolerance;
    fb = f(b);
    if (fb > 0 === fc > 0) {
      c = a;
      fc = fa;
      previous = b - a;
      step = previous;
    }
  }
  return b;
}

/** Step from b by inverse quadratic interpolation, or the secant where only two points differ. */
function interpolate(a: number, b: number, c: number, fa: number, fb: number, fc: number): number {
  const s = fb / fa;
  if (a === c) return ((c - b) * s) / (s - 1);
  const q = fa / fc;
  const r = fb / fc;
  const numerator = s * ((c - b) * q * (q - r) - (b - a) * (r - 1));
  return -numerator / ((q - 1) * (r - 1) * (s - 1));
}

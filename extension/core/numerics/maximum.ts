const GOLDEN = (3 - Math.sqrt(5)) / 2;

export interface Maximum {
  readonly at: number;
  readonly value: number;
}

/**
 * The maximum of a function with one peak in [from, to], by Brent's method (golden section and parabola);
 * the place is good to about 1e-8 relative, the value to rounding.
 * Source: R. P. Brent, Algorithms for Minimization without Derivatives (1973), ch. 5.
 */
export function maximumBetween(f: (x: number) => number, from: number, to: number, tolerance = 1e-9): Maximum {
  let low = from;
  let high = to;
  let best = low + GOLDEN * (high - low);
  let second = best;
  let third = best;
  let fBest = f(best);
  let fSecond = fBest;
  let fThird = fBest;
  let step = 0;
  let before = 0;
  for (let pass = 0; pass < 100; pass++) {
    const middle = (low + high) / 2;
    const smallest = tolerance * Math.abs(best) + 1e-300;
    if (Math.abs(best - middle) <= 2 * smallest - (high - low) / 2) break;
    const trial = parabola(best, second, third, fBest, fSecond, fThird);
    const inside = best + trial > low + 2 * smallest && best + trial < high - 2 * smallest;
    if (Math.abs(before) > smallest && inside && Math.abs(trial) < Math.abs(before) / 2) {
      before = step;
      step = trial;
    } else {
      before = best < middle ? high - best : low - best;
      step = GOLDEN * before;
    }
    const x = best + (Math.abs(step) >= smallest ? step : Math.sign(step) * smallest);
    const value = f(x);
    if (value >= fBest) {
      if (x < best) high = best;
      else low = best;
      [third, second, best] = [second, best, x];
      [fThird, fSecond, fBest] = [fSecond, fBest, value];
      continue;
    }
    if (x < best) low = x;
    else high = x;
    if (value >= fSecond || second === best) {
      [third, second] = [second, x];
      [fThird, fSecond] = [fSecond, value];
    } else if (value >= fThird || third === best || third === second) {
      third = x;
      fThird = value;
    }
  }
  return { at: best, value: fBest };
}

/** Step from a to the vertex of the parabola through three points; NaN where they are on a line. */
function parabola(a: number, b: number, c: number, fa: number, fb: number, fc: number): number {
  const r = (a - b) * (fa - fc);
  const q = (a - c) * (fa - fb);
  return -((a - c) * q - (a - b) * r) / (2 * (q - r));
}

import { Solver } from 'odex';
import { describe, expect, test } from 'vitest';
import { type IntegrationOptions, integrate, type RightHandSide } from '../../extension/core/numerics/dop853.ts';

const tight: IntegrationOptions = { relativeTolerance: 1e-12, absoluteTolerance: 1e-14, maximumSteps: 100_000 };

/** The same problem by extrapolation, a family of methods of its own. */
function extrapolate(rhs: RightHandSide, initial: Float64Array, end: number, absoluteTolerance = 1e-13): number[] {
  const solver = new Solver(initial.length);
  solver.relativeTolerance = 1e-13;
  solver.absoluteTolerance = absoluteTolerance;
  solver.maxSteps = 100_000;
  const derivative = (time: number, state: number[]): number[] => {
    const out = new Float64Array(state.length);
    rhs(time, Float64Array.from(state), out);
    return [...out];
  };
  const solution = solver.solve(derivative, 0, [...initial], end);
  expect(solution.outcome).toBe(0);
  return solution.y;
}

/** Inversion n and photons p in units of the threshold and of the photon lifetime: a giant pulse from noise. */
const giantPulse: RightHandSide = (_time, y, out) => {
  out[0] = -y[0]! * y[1]!;
  out[1] = (y[0]! - 1) * y[1]!;
};
/** n + p − ln n is constant along every solution. */
const invariant = (y: Float64Array): number => y[0]! + y[1]! - Math.log(y[0]!);

const predatorAndPrey: RightHandSide = (_time, y, out) => {
  out[0] = y[0]! * (1.5 - y[1]!);
  out[1] = y[1]! * (y[0]! - 3);
};

/** Restricted three-body problem with the orbit of the book, section II.0: initial values and period from there. */
const moon = 0.012277471;
const arenstorfStart = Float64Array.of(0.994, 0, 0, -2.0015851063790824);
const arenstorfPeriod = 17.065216560157964;
const arenstorf: RightHandSide = (_time, y, out) => {
  const earth = 1 - moon;
  const toEarth = Math.hypot(y[0]! + moon, y[1]!) ** 3;
  const toMoon = Math.hypot(y[0]! - earth, y[1]!) ** 3;
  out[0] = y[2]!;
  out[1] = y[3]!;
  out[2] = y[0]! + 2 * y[3]! - (earth * (y[0]! + moon)) / toEarth - (moon * (y[0]! - earth)) / toMoon;
  out[3] = y[1]! - 2 * y[2]! - (earth * y[1]!) / toEarth - (moon * y[1]!) / toMoon;
};

describe('giant pulse', () => {
  const start = Float64Array.of(3, 1e-10);

  test.each([
    [1e-6, 1e-7, 400],
    [1e-9, 1e-10, 800],
    [1e-12, 1e-12, 1700],
  ])('keeps its invariant at tolerance %d within %d and %d evaluations', (tolerance, drift, evaluations) => {
    let peak = 0;
    const result = integrate(
      giantPulse,
      0,
      start,
      20,
      { relativeTolerance: tolerance, absoluteTolerance: tolerance * 1e-3, maximumSteps: 10_000 },
      (step) => {
        peak = Math.max(peak, step.after[1]!);
        return false;
      },
    );
    expect(result.status).toBe('reached');
    expect(peak).toBeGreaterThan(0.5);
    expect(Math.abs(invariant(result.state) - invariant(start))).toBeLessThan(drift);
    expect(result.evaluations).toBeLessThan(evaluations);
  });

  test('the peak from the dense output is 2 − ln 3 above the noise', () => {
    let peak = 0;
    integrate(giantPulse, 0, start, 20, tight, (step) => {
      for (let part = 0; part <= 400; part++) {
        peak = Math.max(peak, step.interpolate(step.start + (part / 400) * (step.end - step.start), 1));
      }
      return false;
    });
    expect(Math.abs(peak - (2 - Math.log(3) + 1e-10))).toBeLessThan(1e-6);
    expect(peak).toBeLessThanOrEqual(2 - Math.log(3) + 1e-9);
  });

  test('agrees with extrapolation', () => {
    // When the pulse comes depends on the noise: both must resolve it.
    const result = integrate(giantPulse, 0, start, 14, { ...tight, absoluteTolerance: 1e-22 });
    const reference = extrapolate(giantPulse, start, 14, 1e-22);
    expect(Math.abs(result.state[0]! - reference[0]!)).toBeLessThan(1e-10);
    expect(Math.abs(result.state[1]! - reference[1]!)).toBeLessThan(1e-10);
  });
});

test('predator and prey agree with extrapolation', () => {
  const start = Float64Array.of(10, 5);
  const result = integrate(predatorAndPrey, 0, start, 15, tight);
  const reference = extrapolate(predatorAndPrey, start, 15);
  for (const i of [0, 1]) expect(Math.abs(result.state[i]! / reference[i]! - 1)).toBeLessThan(1e-9);
});

describe('Arenstorf orbit', () => {
  test('closes after the published period', () => {
    const result = integrate(arenstorf, 0, arenstorfStart, arenstorfPeriod, tight);
    expect(result.status).toBe('reached');
    for (const i of [0, 1]) expect(Math.abs(result.state[i]! - arenstorfStart[i]!)).toBeLessThan(1e-9);
    expect(result.evaluations).toBeLessThan(5500);
  });

  test('agrees with extrapolation half way round', () => {
    const end = arenstorfPeriod / 2;
    const result = integrate(arenstorf, 0, arenstorfStart, end, tight);
    const reference = extrapolate(arenstorf, arenstorfStart, end);
    for (const i of [0, 1, 2, 3]) expect(Math.abs(result.state[i]! - reference[i]!)).toBeLessThan(1e-8);
  });
});

import { describe, expect, test } from 'vitest';
import {
  type IntegrationOptions,
  type IntegrationOutcome,
  integrate,
  type RightHandSide,
} from '../../extension/core/numerics/dop853.ts';

const tight: IntegrationOptions = { relativeTolerance: 1e-12, absoluteTolerance: 1e-14, maximumSteps: 100_000 };
const decay: RightHandSide = (_time, y, out) => {
  out[0] = -y[0]!;
};
const oscillator: RightHandSide = (_time, y, out) => {
  out[0] = y[1]!;
  out[1] = -y[0]!;
};

/** One evaluation at the start, one for the first step's length, twelve a step, eleven a rejected one. */
function evaluationsOf({ steps, rejected }: IntegrationOutcome): number {
  return 2 + 12 * steps + 11 * rejected;
}

describe('closed forms', () => {
  test('exponential decay over ten lifetimes', () => {
    const result = integrate(decay, 0, Float64Array.of(1), 10, tight);
    expect(result.status).toBe('reached');
    expect(result.time).toBe(10);
    expect(Math.abs(result.state[0]! / Math.exp(-10) - 1)).toBeLessThan(1e-10);
    expect(result.evaluations).toBeLessThan(650);
    expect(result.evaluations).toBe(evaluationsOf(result));
  });

  test('harmonic oscillator over a hundred periods', () => {
    const result = integrate(oscillator, 0, Float64Array.of(1, 0), 200 * Math.PI, tight);
    expect(Math.abs(result.state[0]! - 1)).toBeLessThan(1e-9);
    expect(Math.abs(result.state[1]!)).toBeLessThan(1e-9);
    expect(result.evaluations).toBeLessThan(45_000);
  });

  test('logistic growth from 1e-9 of the capacity', () => {
    const small = 1e-9;
    const result = integrate(
      (_time, y, out) => {
        out[0] = y[0]! * (1 - y[0]!);
      },
      0,
      Float64Array.of(small),
      25,
      { ...tight, absoluteTolerance: 1e-22 },
    );
    const exact = 1 / (1 + (1 / small - 1) * Math.exp(-25));
    expect(Math.abs(result.state[0]! / exact - 1)).toBeLessThan(1e-9);
  });

  test('a time-dependent right-hand side uses the nodes: y′ = cos t', () => {
    const result = integrate(
      (time, _y, out) => {
        out[0] = Math.cos(time);
      },
      1,
      Float64Array.of(Math.sin(1)),
      4,
      tight,
    );
    expect(Math.abs(result.state[0]! - Math.sin(4))).toBeLessThan(1e-12);
  });

  test('every stage stands at its own time: y′ = 1 from y = t', () => {
    let worst = 0;
    let calls = 0;
    const clock: RightHandSide = (time, y, out) => {
      worst = Math.max(worst, Math.abs(y[0]! - time));
      calls++;
      out[0] = 1;
    };
    const result = integrate(clock, 0, Float64Array.of(0), 3, fixedSteps(8), (step) => {
      step.interpolate(step.end, 0);
      return false;
    });
    expect(worst).toBeLessThan(1e-14);
    expect(calls).toBe(result.evaluations);
    expect(calls).toBe(1 + 6 * (12 + 3));
  });

  test('backwards from the end returns to the start', () => {
    const there = integrate(oscillator, 0, Float64Array.of(1, 0), 7, tight);
    const back = integrate(oscillator, 7, there.state, 0, tight);
    expect(back.status).toBe('reached');
    expect(Math.abs(back.state[0]! - 1)).toBeLessThan(1e-11);
    expect(Math.abs(back.state[1]!)).toBeLessThan(1e-11);
  });
});

/** Loose tolerances and a fixed step length: the error then shows the order of the formula itself. */
function fixedSteps(count: number): IntegrationOptions {
  const step = 4 / count;
  return { relativeTolerance: 1, absoluteTolerance: 1, maximumSteps: 1000, initialStep: step, maximumStep: step };
}

describe('order of convergence', () => {
  test('halving the step divides the final error by about 2 to the eighth', () => {
    const errors = [8, 16, 32].map((count) => {
      const result = integrate(oscillator, 0, Float64Array.of(1, 0), 4, fixedSteps(count));
      expect(result.steps).toBe(count);
      return Math.hypot(result.state[0]! - Math.cos(4), result.state[1]! + Math.sin(4));
    });
    for (const order of [Math.log2(errors[0]! / errors[1]!), Math.log2(errors[1]! / errors[2]!)]) {
      expect(order).toBeGreaterThan(7.5);
      expect(order).toBeLessThan(9.5);
    }
  });

  test('halving the step divides the error between steps by at least about 2 to the seventh', () => {
    const errors = [4, 8, 16].map((count) => {
      let worst = 0;
      integrate(oscillator, 0, Float64Array.of(1, 0), 4, fixedSteps(count), (step) => {
        for (const fraction of [0.2, 0.4, 0.5, 0.7, 0.9]) {
          const time = step.start + fraction * (step.end - step.start);
          worst = Math.max(worst, Math.abs(step.interpolate(time, 0) - Math.cos(time)));
        }
        return false;
      });
      return worst;
    });
    for (const order of [Math.log2(errors[0]! / errors[1]!), Math.log2(errors[1]! / errors[2]!)]) {
      expect(order).toBeGreaterThan(6.7);
    }
  });
});

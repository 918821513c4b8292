import { describe, expect, test } from 'vitest';
import { type IntegrationOptions, integrate, type RightHandSide } from '../../extension/core/numerics/dop853.ts';

const usual: IntegrationOptions = { relativeTolerance: 1e-9, absoluteTolerance: 1e-12, maximumSteps: 2000 };
const one = Float64Array.of(1);
const growth: RightHandSide = (_time, y, out) => {
  out[0] = y[0]!;
};
const oscillator: RightHandSide = (_time, y, out) => {
  out[0] = y[1]!;
  out[1] = -y[0]!;
};

describe('dense output', () => {
  test('follows all components to the tolerance and leaves the steps as they were', () => {
    const plain = integrate(oscillator, 0, Float64Array.of(0, 1), 30, usual);
    const into = new Float64Array(2);
    let worst = 0;
    const dense = integrate(oscillator, 0, Float64Array.of(0, 1), 30, usual, (step) => {
      for (const fraction of [0, 0.1, 0.35, 0.6, 0.85, 1]) {
        const time = step.start + fraction * (step.end - step.start);
        step.interpolateAll(time, into);
        worst = Math.max(worst, Math.abs(into[0]! - Math.sin(time)), Math.abs(into[1]! - Math.cos(time)));
      }
      return false;
    });
    expect(worst).toBeLessThan(1e-7);
    expect(dense.state).toEqual(plain.state);
    expect(dense.evaluations).toBe(plain.evaluations + 3 * plain.steps);
  });

  test('meets both ends of the step', () => {
    integrate(oscillator, 0, Float64Array.of(0, 1), 10, usual, (step) => {
      expect(step.interpolate(step.start, 0)).toBe(step.before[0]);
      expect(Math.abs(step.interpolate(step.end, 0) - step.after[0]!)).toBeLessThan(1e-15);
      return false;
    });
  });

  test('costs three evaluations only in the steps that ask', () => {
    const plain = integrate(oscillator, 0, Float64Array.of(0, 1), 30, usual);
    let asked = 0;
    const some = integrate(oscillator, 0, Float64Array.of(0, 1), 30, usual, (step) => {
      if (step.start < 10) {
        step.interpolate(step.end, 0);
        step.interpolate(step.end, 1);
        asked++;
      }
      return false;
    });
    expect(asked).toBeGreaterThan(0);
    expect(asked).toBeLessThan(some.steps);
    expect(some.evaluations).toBe(plain.evaluations + 3 * asked);
  });

  test('a component that does not exist is not a number', () => {
    integrate(growth, 0, one, 1, usual, (step) => {
      expect(step.interpolate(step.end, 1)).toBeNaN();
      expect(step.interpolate(step.end, -1)).toBeNaN();
      expect(step.interpolate(step.end, 0.5)).toBeNaN();
      return false;
    });
  });
});

describe('steps', () => {
  test('join without gaps and end exactly at the end', () => {
    let previous = 0;
    let value = 1;
    const result = integrate(growth, 0, one, 0.1 + 0.2, usual, (step) => {
      expect(step.start).toBe(previous);
      expect(step.before[0]).toBe(value);
      previous = step.end;
      value = step.after[0]!;
      return false;
    });
    expect(previous).toBe(0.1 + 0.2);
    expect(result.state[0]).toBe(value);
  });

  test('the observer stops where it says', () => {
    const result = integrate(growth, 0, one, 100, usual, (step) => step.after[0]! > 10);
    expect(result.status).toBe('stopped');
    expect(result.time).toBeLessThan(10);
    expect(result.state[0]).toBeGreaterThan(10);
    expect(Math.abs(result.state[0]! / Math.exp(result.time) - 1)).toBeLessThan(1e-7);
  });

  test('keep to the longest step, backwards too', () => {
    const longest = 0.125;
    for (const end of [2, -2]) {
      const options = { ...usual, relativeTolerance: 1e-3, maximumStep: longest };
      const result = integrate(growth, 0, one, end, options, (step) => {
        expect(Math.abs(step.end - step.start)).toBeLessThanOrEqual(longest * 1.01 + 1e-12);
        return false;
      });
      expect(result.status).toBe('reached');
      expect(result.steps).toBeGreaterThanOrEqual(16);
    }
  });

  test('do not depend on the unit of time, over 30 decades', () => {
    const counts = [1, 1e-9, 1e-15, 1e15].map((unit) => {
      const result = integrate(
        (_time, y, out) => {
          out[0] = y[1]! / unit;
          out[1] = -y[0]! / unit;
        },
        0,
        Float64Array.of(0, 1),
        20 * unit,
        usual,
      );
      expect(Math.abs(result.state[0]! - Math.sin(20))).toBeLessThan(1e-7);
      return result.steps;
    });
    expect(new Set(counts).size).toBe(1);
  });

  test('the given arrays stay as they are', () => {
    const initial = Float64Array.of(0, 1);
    const tolerance = Float64Array.of(1e-9, 1e-9);
    integrate(oscillator, 0, initial, 3, { ...usual, absoluteTolerance: tolerance });
    expect([...initial, ...tolerance]).toEqual([0, 1, 1e-9, 1e-9]);
  });
});

describe('endings', () => {
  test('nothing to do is done at once', () => {
    const still = integrate(growth, 5, one, 5, usual);
    expect(still).toEqual({ status: 'reached', time: 5, state: one, steps: 0, rejected: 0, evaluations: 0 });
    expect(integrate(growth, 0, new Float64Array(0), 1, usual).status).toBe('reached');
  });

  test('a system at rest takes few evaluations, with zero tolerance and zero state too', () => {
    const rest: RightHandSide = (_time, _y, out) => {
      out.fill(0);
    };
    const result = integrate(rest, 0, Float64Array.of(0, 3), 1, { ...usual, absoluteTolerance: 0 });
    expect(result.status).toBe('reached');
    expect(result.evaluations).toBeLessThan(150);
  });

  test('a stiff system ends by its limit on steps', () => {
    const relaxation: RightHandSide = (time, y, out) => {
      out[0] = -1e6 * (y[0]! - Math.cos(time));
    };
    const result = integrate(relaxation, 0, Float64Array.of(0), 10, usual);
    expect(result.status).toBe('too-many-steps');
    expect(result.steps + result.rejected).toBe(2000);
    expect(result.time).toBeGreaterThan(0);
    expect(result.time).toBeLessThan(1);
    expect(Math.abs(result.state[0]! - Math.cos(result.time))).toBeLessThan(1e-4);
  });

  test('a solution that leaves for infinity is followed to its pole, not past it', () => {
    const explosion: RightHandSide = (_time, y, out) => {
      out[0] = y[0]! ** 2;
    };
    const result = integrate(explosion, 0, one, 2, usual);
    expect(['step-too-small', 'not-finite']).toContain(result.status);
    expect(Math.abs(result.time - 1)).toBeLessThan(1e-6);
    expect(result.evaluations).toBeLessThan(5000);
  });

  test('where the right-hand side stops being a number the step shrinks up to that point', () => {
    const wall: RightHandSide = (time, _y, out) => {
      out[0] = time <= 1 ? 1 : Number.NaN;
    };
    const result = integrate(wall, 0, Float64Array.of(0), 2, usual);
    expect(result.status).toBe('not-finite');
    expect(result.time).toBeLessThanOrEqual(1);
    expect(result.time).toBeGreaterThan(0.999);
    expect(Math.abs(result.state[0]! - result.time)).toBeLessThan(1e-12);
  });

  test('an infinite derivative away from the path is passed with shorter steps', () => {
    const result = integrate(
      (_time, y, out) => {
        out[0] = y[0]! < 0 ? Number.POSITIVE_INFINITY : -y[0]!;
      },
      0,
      one,
      5,
      { ...usual, initialStep: 5 },
    );
    expect(result.status).toBe('reached');
    expect(Math.abs(result.state[0]! - Math.exp(-5))).toBeLessThan(1e-8);
  });

  test.each([
    ['start', Number.NaN, 1, 1, usual],
    ['end', 0, 1, Number.POSITIVE_INFINITY, usual],
    ['state', 0, Number.NaN, 1, usual],
    ['relative tolerance', 0, 1, 1, { ...usual, relativeTolerance: Number.NaN }],
    ['absolute tolerance', 0, 1, 1, { ...usual, absoluteTolerance: Number.NaN }],
    ['missing tolerances', 0, 1, 1, { ...usual, absoluteTolerance: new Float64Array(0) }],
  ])('a %s that is not finite is refused before the first evaluation', (_name, start, value, end, options) => {
    const result = integrate(growth, start, Float64Array.of(value), end, options);
    expect(result.status).toBe('not-finite');
    expect(result.evaluations).toBe(0);
  });

  test('no steps allowed, none taken', () => {
    for (const maximumSteps of [0, -1, Number.NaN]) {
      const result = integrate(growth, 0, one, 1, { ...usual, maximumSteps });
      expect(result.status).toBe('too-many-steps');
      expect(result.time).toBe(0);
    }
  });
});

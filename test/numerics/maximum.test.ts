import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { maximumBetween } from '../../extension/core/numerics/maximum.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

describe('the maximum of a function with one peak', () => {
  it('is placed to 1e-7 and valued to rounding, over many decades', () => {
    fc.assert(
      fc.property(between(-100, 100), between(0.01, 0.99), between(0.1, 10), (decade, place, width) => {
        const scale = 10 ** decade;
        const wanted = place * scale;
        const f = (x: number) => 3 - ((x - wanted) / (width * scale)) ** 2;
        let calls = 0;
        const { at, value } = maximumBetween(
          (x) => {
            calls++;
            return f(x);
          },
          0,
          scale,
        );
        // The place is only as good as the root of the value's rounding.
        expect(Math.abs(at - wanted) / scale).toBeLessThan(1e-7 * Math.max(1, width));
        expect(3 - value).toBeLessThan(1e-14);
        expect(calls).toBeLessThan(70);
      }),
    );
  });

  it('is found where parabolas mislead: cusps and long tails', () => {
    const cases: [(x: number) => number, number, number, number][] = [
      [(x) => -Math.sqrt(Math.abs(x - 0.3)), 0, 1, 0.3],
      [(x) => x * Math.exp(-x), 0, 200, 1],
      [(x) => -Math.abs(x - 7), 0, 10, 7],
      [(x) => Math.log(x) / x, 1, 1000, Math.E],
    ];
    for (const [f, from, to, wanted] of cases) {
      expect(Math.abs(maximumBetween(f, from, to).at - wanted)).toBeLessThan(1e-6);
    }
  });

  it('of a slope is the higher end', () => {
    expect(maximumBetween((x) => x, 0, 2).at).toBeCloseTo(2, 6);
    expect(maximumBetween((x) => -x, 1, 2).at).toBeCloseTo(1, 6);
  });

  it('gives the value at the place that it gives', () => {
    const f = (x: number) => Math.sin(x) * Math.exp(-x / 9);
    const { at, value } = maximumBetween(f, 0.2, 3);
    expect(value).toBe(f(at));
    expect(Math.tan(at)).toBeCloseTo(9, 5);
  });

  it('ends in bounded calls even where the function is flat or not a number', () => {
    for (const f of [() => 0, () => Number.NaN, (x: number) => (x > 0.5 ? Number.NaN : x)]) {
      let calls = 0;
      maximumBetween(
        (x) => {
          calls++;
          return f(x);
        },
        0,
        1,
      );
      expect(calls).toBeLessThanOrEqual(101);
    }
  });
});

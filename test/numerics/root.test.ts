import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import { rootBetween } from '../../extension/core/numerics/root.ts';

const between = (min: number, max: number) => fc.double({ min, max, noNaN: true });

/** The root and how often the function was called. */
function counted(f: (x: number) => number, from: number, to: number) {
  let calls = 0;
  const root = rootBetween(
    (x) => {
      calls++;
      return f(x);
    },
    from,
    to,
  );
  return { root, calls };
}

describe('a root between two ends', () => {
  it('of smooth functions is good to rounding in few calls', () => {
    const cases: [(x: number) => number, number, number, number][] = [
      [(x) => x * x - 2, 0, 2, Math.SQRT2],
      [(x) => Math.cos(x) - x, 0, 1, 0.7390851332151607],
      [(x) => Math.exp(x) - 1e3, -5, 20, Math.log(1e3)],
      [(x) => Math.log(x), 1e-8, 1e3, 1],
      [(x) => x ** 3, -1, 0.7, 0],
    ];
    for (const [f, from, to, wanted] of cases) {
      const { root, calls } = counted(f, from, to);
      expect(Math.abs(root! - wanted)).toBeLessThan(wanted === 0 ? 1e-5 : 4e-15 * Math.abs(wanted) + 1e-15);
      expect(calls).toBeLessThanOrEqual(wanted === 0 ? 203 : 25);
    }
  });

  it('is found over many decades, whichever end comes first and whatever the sign', () => {
    fc.assert(
      fc.property(between(-250, 250), between(1.01, 50), fc.boolean(), fc.boolean(), (decade, spread, swap, flip) => {
        const wanted = 10 ** decade;
        const f = (x: number) => (flip ? -1 : 1) * (Math.log(x / wanted) + 0.1 * Math.sin(x / wanted - 1));
        const ends: [number, number] = [wanted / spread, wanted * spread];
        const { root, calls } = counted(f, ends[swap ? 1 : 0], ends[swap ? 0 : 1]);
        expect(Math.abs(root! / wanted - 1)).toBeLessThan(1e-14);
        expect(calls).toBeLessThan(40);
      }),
    );
  });

  it('of steps, flats and kinks is still bracketed, in bounded calls', () => {
    fc.assert(
      fc.property(between(-1, 1), between(1, 30), (place, power) => {
        for (const f of [
          (x: number) => (x < place ? -1 : 1e6),
          (x: number) => Math.sign(x - place) * Math.abs(x - place) ** power,
          (x: number) => Math.max(-1e-3, x - place),
        ]) {
          const { root, calls } = counted(f, -3, 3);
          expect(calls).toBeLessThanOrEqual(203);
          // At a high power the function itself underflows near its root.
          expect(Math.abs(f(root!))).toBeLessThanOrEqual(Math.max(1e6 * Number(f(3) === 1e6), 1e-12));
        }
      }),
    );
  });

  it('at an end is that end, in no more calls', () => {
    expect(counted((x) => x - 2, 2, 5)).toEqual({ root: 2, calls: 2 });
    expect(counted((x) => x - 5, 2, 5)).toEqual({ root: 5, calls: 2 });
  });

  it('does not exist without a change of sign or with ends that are not finite', () => {
    expect(rootBetween((x) => x * x + 1, -1, 1)).toBeUndefined();
    expect(rootBetween((x) => 1 / x, 0, 1)).toBeUndefined();
    expect(rootBetween(() => Number.NaN, 0, 1)).toBeUndefined();
    expect(rootBetween((x) => x, Number.NaN, 1)).toBeUndefined();
    expect(rootBetween((x) => x - 0.5, Number.NEGATIVE_INFINITY, 1)).toBeUndefined();
  });
});

import { describe, expect, it } from 'vitest';
import { gaussLegendre, quadrature } from '../../extension/core/numerics/gauss-legendre.ts';

const orders = [1, 2, 3, 5, 12, 20, 40, 101, 200];

describe('Gauss–Legendre rules', () => {
  // Source: Abramowitz & Stegun, Handbook of Mathematical Functions (1964), table 25.4.
  it('have the tabulated nodes and weights', () => {
    expect([...gaussLegendre(1).nodes]).toEqual([expect.closeTo(0, 15)]);
    expect(gaussLegendre(1).weights[0]).toBeCloseTo(2, 14);
    const [a, b] = gaussLegendre(2).nodes;
    expect([a, b]).toEqual([expect.closeTo(-0.577350269189626, 14), expect.closeTo(0.577350269189626, 14)]);
    const five = gaussLegendre(5);
    expect(five.nodes[4]).toBeCloseTo(0.906179845938664, 14);
    expect(five.nodes[3]).toBeCloseTo(0.538469310105683, 14);
    expect(five.weights[4]).toBeCloseTo(0.236926885056189, 14);
    expect(five.weights[2]).toBeCloseTo(0.568888888888889, 14);
    const twelve = gaussLegendre(12);
    expect(twelve.nodes[11]).toBeCloseTo(0.981560634246719, 14);
    expect(twelve.weights[11]).toBeCloseTo(0.047175336386512, 14);
  });

  it.each(orders)('of %d points are symmetric, ordered, positive and sum to 2', (points) => {
    const { nodes, weights } = gaussLegendre(points);
    let sum = 0;
    for (let i = 0; i < points; i++) {
      expect(nodes[i]! + nodes[points - 1 - i]!).toBeCloseTo(0, 14);
      expect(weights[i]! - weights[points - 1 - i]!).toBeCloseTo(0, 14);
      expect(weights[i]!).toBeGreaterThan(0);
      expect(Math.abs(nodes[i]!)).toBeLessThan(1);
      if (i > 0) expect(nodes[i]!).toBeGreaterThan(nodes[i - 1]!);
      sum += weights[i]!;
    }
    expect(sum).toBeCloseTo(2, 13);
  });

  it.each(orders)('of %d points are exact up to degree 2n − 1 and no further', (points) => {
    const rule = gaussLegendre(points);
    for (const degree of [0, 1, points, 2 * points - 2, 2 * points - 1]) {
      const wanted = (1 - (-1) ** (degree + 1)) / (degree + 1);
      expect(quadrature(rule, -1, 1, (x) => x ** degree)).toBeCloseTo(wanted, 13);
    }
    // The next power is missed by the square of the monic Legendre polynomial's norm.
    if (points <= 12) {
      const missed = 2 / (2 * points + 1) - quadrature(rule, -1, 1, (x) => x ** (2 * points));
      let norm = 2 / (2 * points + 1);
      for (let k = 1; k <= points; k++) norm *= (k / (2 * k - 1)) ** 2;
      expect(missed / norm).toBeCloseTo(1, 3);
    }
  });

  it('integrate over any interval, forwards and backwards', () => {
    const rule = gaussLegendre(20);
    expect(quadrature(rule, 0, Math.PI, Math.sin)).toBeCloseTo(2, 13);
    expect(quadrature(rule, Math.PI, 0, Math.sin)).toBeCloseTo(-2, 13);
    expect(quadrature(rule, 3, 3, Math.exp)).toBe(0);
    expect(quadrature(rule, 1e-9, 2e-9, (x) => 1 / x)).toBeCloseTo(Math.LN2, 13);
  });
});

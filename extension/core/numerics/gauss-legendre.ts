/** Nodes on (−1, 1) and weights of an n-point rule. */
export interface QuadratureRule {
  readonly nodes: Float64Array;
  readonly weights: Float64Array;
}

/**
 * Gauss–Legendre rule of `points` nodes, exact for polynomials of degree 2·points − 1.
 * Nodes by Newton's method on the Legendre recurrence. Valid for 1 to 200 points.
 * Source: Abramowitz & Stegun, Handbook of Mathematical Functions (1964), 25.4.29.
 */
export function gaussLegendre(points: number): QuadratureRule {
  const nodes = new Float64Array(points);
  const weights = new Float64Array(points);
  for (let i = 0; i < points; i++) {
    let x = -Math.cos((Math.PI * (i + 0.75)) / (points + 0.5));
    let slope = 1;
    for (let pass = 0; pass < 8; pass++) {
      let previous = 1;
      let value = x;
      for (let degree = 2; degree <= points; degree++) {
        const next = ((2 * degree - 1) * x * value - (degree - 1) * previous) / degree;
        previous = value;
        value = next;
      }
      slope = (points * (x * value - previous)) / (x * x - 1);
      x -= value / slope;
    }
    nodes[i] = x;
    weights[i] = 2 / ((1 - x * x) * slope * slope);
  }
  return { nodes, weights };
}

/** ∫ f over [from, to] by a given rule. */
export function quadrature(rule: QuadratureRule, from: number, to: number, integrand: (x: number) => number): number {
  const half = (to - from) / 2;
  const middle = (to + from) / 2;
  let sum = 0;
  for (let i = 0; i < rule.nodes.length; i++) sum += rule.weights[i]! * integrand(middle + half * rule.nodes[i]!);
  return sum * half;
}

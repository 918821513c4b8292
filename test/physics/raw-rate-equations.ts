import { Solver } from 'odex';

/** What the rate equations need, in SI units; written from the conventions alone, none of it from the product. */
export interface RawLaser {
  readonly wavelength: number;
  readonly crossSection: number;
  readonly roundTripTime: number;
  readonly reflectivity: number;
  readonly roundTripLoss: number;
  readonly closedLoss: number;
  readonly openingTime: number;
  /** ∫ψ dA, m². */
  readonly modeArea: number;
  /** Upper-level ions per m² just before opening, mode intensity ψ and area dA of each ring. */
  readonly rings: readonly { readonly ions: number; readonly psi: number; readonly area: number }[];
}

export interface RawPulse {
  readonly energy: number;
  readonly peakPower: number;
  readonly width: number;
  readonly buildUp: number;
}

/** Rings of a disc at the two Gauss nodes of `panels` equal parts of its radius. */
export function disc(radius: number, panels: number): { readonly r: number; readonly area: number }[] {
  const width = radius / panels;
  return Array.from({ length: 2 * panels }, (_, i) => {
    const r = (Math.floor(i / 2) + 0.5 + (i % 2 === 0 ? -0.5 : 0.5) / Math.sqrt(3)) * width;
    return { r, area: 2 * Math.PI * r * (width / 2) };
  });
}

/** State: photons φ, ∫φ dt over t_r, then N of each ring. Times in units of t_r from the first instant of opening. */
export function rawPulse(laser: RawLaser): RawPulse {
  const { crossSection, modeArea, rings, roundTripTime: trip } = laser;
  const open = -Math.log(laser.reflectivity) - Math.log(1 - laser.roundTripLoss);
  const ramp = laser.openingTime / trip;
  const gainOf = (y: readonly number[]) =>
    rings.reduce((sum, { psi, area }, k) => sum + ((2 * crossSection) / modeArea) * y[k + 2]! * psi * area, 0);
  const rhs = (t: number, y: number[]): number[] => {
    const shut = t < ramp ? (laser.closedLoss * (1 + Math.cos((Math.PI * t) / ramp))) / 2 : 0;
    const gain = gainOf(y);
    const photons = y[0]!;
    const crossings = (2 * crossSection * photons) / modeArea;
    return [
      (gain - open + Math.log(1 - shut)) * photons + gain,
      photons,
      ...rings.map(({ psi }, k) => -crossings * psi * y[k + 2]!),
    ];
  };
  const ions = rings.map((ring) => ring.ions);
  const gain = gainOf([0, 0, ...ions]);
  const behind = gain / (open - Math.log(1 - laser.closedLoss) - gain);
  const steps: { t: number; y: number[] }[] = [{ t: 0, y: [behind, 0, ...ions] }];
  const advance = (from: { t: number; y: number[] }, t: number, keep?: (t: number, y: number[]) => boolean) => {
    const solver = new Solver(rings.length + 2);
    solver.relativeTolerance = 1e-12;
    solver.absoluteTolerance = [1e-9, 1e-9, ...ions.map((n) => 1e-14 * n)];
    solver.maxSteps = 100_000;
    return solver.solve(rhs, from.t, [...from.y], t, keep && ((_n, _before, at, y) => keep(at, [...y])));
  };
  let highest = 0;
  const collect = (t: number, y: number[]) => {
    if (t > steps.at(-1)!.t) steps.push({ t, y });
    highest = Math.max(highest, y[0]!);
    return !(y[0]! < 1e-11 * highest);
  };
  // Two legs: the loss has a corner in its second derivative where the ramp ends.
  if (ramp > 0) advance(steps[0]!, ramp, collect);
  advance(steps.at(-1)!, 1e5, collect);
  /** Where something of the state changes sign, by bisection: each trial is integrated anew from the step before. */
  const crossing = (value: (t: number, y: number[]) => number, index: number) => {
    const from = steps[index]!;
    let low = from.t;
    let high = steps[index + 1]!.t;
    const sign = Math.sign(value(from.t, from.y));
    for (let pass = 0; pass < 44; pass++) {
      const middle = (low + high) / 2;
      if (Math.sign(value(middle, advance(from, middle).y)) === sign) low = middle;
      else high = middle;
    }
    return { t: low, y: advance(from, low).y };
  };
  const growth = (t: number, y: number[]) => rhs(t, y)[0]!;
  const top = steps.findIndex(({ t, y }, i) => growth(t, y) > 0 && growth(steps[i + 1]!.t, steps[i + 1]!.y) <= 0);
  const peak = crossing(growth, top);
  const half = (_t: number, y: number[]) => y[0]! - peak.y[0]! / 2;
  const rise = crossing(
    half,
    steps.findLastIndex(({ t, y }) => t < peak.t && half(t, y) < 0),
  );
  const fall = crossing(half, steps.findIndex(({ t, y }) => t > peak.t && half(t, y) < 0) - 1);
  const perPhoton = (6.62607015e-34 * 299792458 * -Math.log(laser.reflectivity)) / laser.wavelength;
  return {
    energy: perPhoton * steps.at(-1)!.y[1]!,
    peakPower: (perPhoton * peak.y[0]!) / trip,
    width: (fall.t - rise.t) * trip,
    buildUp: peak.t * trip,
  };
}

/**
 * Dense output of order 7 of the method in dop853_tableau.ts: three further stages, then a polynomial a component.
 * Coefficients: E. Hairer, S. P. Nørsett and G. Wanner, Solving Ordinary Differential Equations I, 2nd ed.,
 * Springer 1993, section II.10, rounded to double precision.
 */
import type { Workspace } from './dop853_tableau.ts';
import type { AcceptedStep, RightHandSide } from './integration.ts';

/** The one step object handed to the observer, refilled by `show`. */
export function createStepView(rhs: RightHandSide, w: Workspace, onDenseStages: () => void) {
  const prepared = new Uint8Array(w.n);
  let staged = false;
  let h = 0;
  const step = {
    start: 0,
    end: 0,
    before: w.y,
    after: w.next,
    interpolate(time: number, component: number): number {
      if (prepared[component] === undefined) return Number.NaN;
      if (!staged) {
        takeDenseStages(rhs, w, step.start, h);
        onDenseStages();
        prepared.fill(0);
        staged = true;
      }
      if (prepared[component] !== 1) {
        prepareDense(w, h, component);
        prepared[component] = 1;
      }
      return evaluateDense(w, component, (time - step.start) / h);
    },
    interpolateAll(time: number, into: Float64Array): void {
      for (let i = 0; i < w.n; i++) into[i] = step.interpolate(time, i);
    },
  };
  const show = (start: number, end: number, length: number): AcceptedStep => {
    step.start = start;
    step.end = end;
    h = length;
    staged = false;
    return step;
  };
  return { show };
}

/** Evaluates the three further stages of the dense output; k13 must hold the derivative at the end. 3 evaluations. */
function takeDenseStages(rhs: RightHandSide, w: Workspace, time: number, h: number): void {
  const { trial } = w;
  stage14(w, h);
  rhs(time + 0.1 * h, trial, w.k14);
  stage15(w, h);
  rhs(time + 0.2 * h, trial, w.k15);
  stage16(w, h);
  rhs(time + 0.7777777777777778 * h, trial, w.k16);
}

/** Writes the eight dense-output coefficients of component `i`, book section II.10. */
function prepareDense(w: Workspace, h: number, i: number): void {
  const { y, next, dense, k1, k6, k7, k8, k9, k10, k11, k12, k13, k14, k15, k16 } = w;
  const difference = next[i]! - y[i]!;
  const slope = h * k1[i]! - difference;
  const base = 8 * i;
  dense[base] = y[i]!;
  dense[base + 1] = difference;
  dense[base + 2] = slope;
  dense[base + 3] = difference - h * k13[i]! - slope;
  dense[base + 4] =
    h *
    (-8.428938276109013 * k1[i]! +
      0.5667149535193777 * k6[i]! -
      3.0689499459498917 * k7[i]! +
      2.38466765651207 * k8[i]! +
      2.117034582445028 * k9[i]! -
      0.871391583777973 * k10[i]! +
      2.2404374302607883 * k11[i]! +
      0.6315787787694688 * k12[i]! -
      0.08899033645133331 * k13[i]! +
      18.148505520854727 * k14[i]! -
      9.194632392478356 * k15[i]! -
      4.436036387594894 * k16[i]!);
  dense[base + 5] =
    h *
    (10.427508642579134 * k1[i]! +
      242.28349177525817 * k6[i]! +
      165.20045171727028 * k7[i]! -
      374.5467547226902 * k8[i]! -
      22.113666853125306 * k9[i]! +
      7.733432668472264 * k10[i]! -
      30.674084731089398 * k11[i]! -
      9.332130526430229 * k12[i]! +
      15.697238121770845 * k13[i]! -
      31.139403219565178 * k14[i]! -
      9.35292435884448 * k15[i]! +
      35.81684148639408 * k16[i]!);
  dense[base + 6] =
    h *
    (19.985053242002433 * k1[i]! -
      387.0373087493518 * k6[i]! -
      189.17813819516758 * k7[i]! +
      527.8081592054236 * k8[i]! -
      11.57390253995963 * k9[i]! +
      6.8812326946963 * k10[i]! -
      1.0006050966910838 * k11[i]! +
      0.7777137798053443 * k12[i]! -
      2.778205752353508 * k13[i]! -
      60.19669523126412 * k14[i]! +
      84.32040550667716 * k15[i]! +
      11.99229113618279 * k16[i]!);
  dense[base + 7] =
    h *
    (-25.69393346270375 * k1[i]! -
      154.18974869023643 * k6[i]! -
      231.5293791760455 * k7[i]! +
      357.6391179106141 * k8[i]! +
      93.40532418362432 * k9[i]! -
      37.45832313645163 * k10[i]! +
      104.0996495089623 * k11[i]! +
      29.8402934266605 * k12[i]! -
      43.53345659001114 * k13[i]! +
      96.32455395918828 * k14[i]! -
      39.17726167561544 * k15[i]! -
      149.72683625798564 * k16[i]!);
}

/** Value of the dense output of component `i` at the fraction `s` of the step, 0 to 1. */
function evaluateDense(w: Workspace, i: number, s: number): number {
  const { dense } = w;
  const base = 8 * i;
  const r = 1 - s;
  const upper = dense[base + 4]! + s * (dense[base + 5]! + r * (dense[base + 6]! + s * dense[base + 7]!));
  return dense[base]! + s * (dense[base + 1]! + r * (dense[base + 2]! + s * (dense[base + 3]! + r * upper)));
}

function stage14(w: Workspace, h: number): void {
  const { n, y, k1, k7, k8, k9, k10, k11, k12, k13, trial } = w;
  for (let i = 0; i < n; i++)
    trial[i] =
      y[i]! +
      h *
        (0.056167502283047954 * k1[i]! +
          0.25350021021662483 * k7[i]! -
          0.2462390374708025 * k8[i]! -
          0.12419142326381637 * k9[i]! +
          0.15329179827876568 * k10[i]! +
          0.00820105229563469 * k11[i]! +
          0.007567897660545699 * k12[i]! -
          0.008298 * k13[i]!);
}

function stage15(w: Workspace, h: number): void {
  const { n, y, k1, k6, k7, k8, k11, k12, k13, k14, trial } = w;
  for (let i = 0; i < n; i++)
    trial[i] =
      y[i]! +
      h *
        (0.03183464816350214 * k1[i]! +
          0.028300909672366776 * k6[i]! +
          0.053541988307438566 * k7[i]! -
          0.05492374857139099 * k8[i]! -
          0.00010834732869724932 * k11[i]! +
          0.0003825710908356584 * k12[i]! -
          0.00034046500868740456 * k13[i]! +
          0.1413124436746325 * k14[i]!);
}

function stage16(w: Workspace, h: number): void {
  const { n, y, k1, k6, k7, k8, k9, k13, k14, k15, trial } = w;
  for (let i = 0; i < n; i++)
    trial[i] =
      y[i]! +
      h *
        (-0.42889630158379194 * k1[i]! -
          4.697621415361164 * k6[i]! +
          7.683421196062599 * k7[i]! +
          4.06898981839711 * k8[i]! +
          0.3567271874552811 * k9[i]! -
          0.0013990241651590145 * k13[i]! +
          2.9475147891527724 * k14[i]! -
          9.15095847217987 * k15[i]!);
}

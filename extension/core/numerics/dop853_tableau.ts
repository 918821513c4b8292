/**
 * One step of the explicit Runge–Kutta method of order 8(5,3) by Dormand and Prince.
 * Coefficients: E. Hairer, S. P. Nørsett and G. Wanner, Solving Ordinary Differential Equations I, 2nd ed.,
 * Springer 1993, sections II.5 and II.10 (the method DOP853), rounded to double precision.
 * They stand as literals in one loop a stage, because a table walked by index is about five times slower.
 */
import type { RightHandSide } from './dop853.ts';

/** All arrays of one integration, views of one allocation; k1 to k16 are the stage derivatives of the book. */
export interface Workspace {
  readonly n: number;
  /** State at the start of the step. */
  readonly y: Float64Array;
  /** State at the end of the step. */
  readonly next: Float64Array;
  /** Argument of the stage being evaluated. */
  readonly trial: Float64Array;
  readonly absoluteTolerance: Float64Array;
  /** Eight coefficients of the dense output a component. */
  readonly dense: Float64Array;
  readonly k1: Float64Array;
  readonly k2: Float64Array;
  readonly k3: Float64Array;
  readonly k4: Float64Array;
  readonly k5: Float64Array;
  readonly k6: Float64Array;
  readonly k7: Float64Array;
  readonly k8: Float64Array;
  readonly k9: Float64Array;
  readonly k10: Float64Array;
  readonly k11: Float64Array;
  readonly k12: Float64Array;
  readonly k13: Float64Array;
  readonly k14: Float64Array;
  readonly k15: Float64Array;
  readonly k16: Float64Array;
}

/** Workspace for a system of `n` equations. */
export function createWorkspace(n: number): Workspace {
  const pool = new Float64Array(28 * n);
  const view = (row: number, rows = 1) => pool.subarray(row * n, (row + rows) * n);
  return {
    n,
    y: view(0),
    next: view(1),
    trial: view(2),
    absoluteTolerance: view(3),
    k1: view(4),
    k2: view(5),
    k3: view(6),
    k4: view(7),
    k5: view(8),
    k6: view(9),
    k7: view(10),
    k8: view(11),
    k9: view(12),
    k10: view(13),
    k11: view(14),
    k12: view(15),
    k13: view(16),
    k14: view(17),
    k15: view(18),
    k16: view(19),
    dense: view(20, 8),
  };
}

/** Evaluates stages 2 to 12 and the new state in `next`; k1 must hold the derivative at `time`. 11 evaluations. */
export function takeStep(rhs: RightHandSide, w: Workspace, time: number, h: number): void {
  const { trial } = w;
  stage2(w, h);
  rhs(time + 0.05260015195876773 * h, trial, w.k2);
  stage3(w, h);
  rhs(time + 0.0789002279381516 * h, trial, w.k3);
  stage4(w, h);
  rhs(time + 0.1183503419072274 * h, trial, w.k4);
  stage5(w, h);
  rhs(time + 0.2816496580927726 * h, trial, w.k5);
  stage6(w, h);
  rhs(time + 0.3333333333333333 * h, trial, w.k6);
  stage7(w, h);
  rhs(time + 0.25 * h, trial, w.k7);
  stage8(w, h);
  rhs(time + 0.3076923076923077 * h, trial, w.k8);
  stage9(w, h);
  rhs(time + 0.6512820512820513 * h, trial, w.k9);
  stage10(w, h);
  rhs(time + 0.6 * h, trial, w.k10);
  stage11(w, h);
  rhs(time + 0.8571428571428571 * h, trial, w.k11);
  stage12(w, h);
  rhs(time + h, trial, w.k12);
  solution(w, h);
}

/**
 * Error of the step just taken in units of the tolerance (at most 1 to be accepted), from the embedded formulas of
 * order 5 and 3 combined as in the book, section II.10, equation (10.17). Not finite if a stage was not.
 */
export function errorNorm(w: Workspace, h: number, relativeTolerance: number): number {
  const { n, y, next, absoluteTolerance, k1, k6, k7, k8, k9, k10, k11, k12 } = w;
  let sum5 = 0;
  let sum3 = 0;
  for (let i = 0; i < n; i++) {
    const scale = 1 / (absoluteTolerance[i]! + relativeTolerance * Math.max(Math.abs(y[i]!), Math.abs(next[i]!)));
    const error5 =
      scale *
      (0.01312004499419488 * k1[i]! -
        1.2251564463762044 * k6[i]! -
        0.4957589496572502 * k7[i]! +
        1.6643771824549864 * k8[i]! -
        0.35032884874997366 * k9[i]! +
        0.3341791187130175 * k10[i]! +
        0.08192320648511571 * k11[i]! -
        0.022355307863886294 * k12[i]!);
    const error3 =
      scale *
      (-0.18980075407240762 * k1[i]! +
        4.450312892752409 * k6[i]! +
        1.8915178993145003 * k7[i]! -
        5.801203960010585 * k8[i]! -
        0.4226823213237919 * k9[i]! -
        0.1521609496625161 * k10[i]! +
        0.20136540080403034 * k11[i]! +
        0.02265179219836082 * k12[i]!);
    sum5 += error5 * error5;
    sum3 += error3 * error3;
  }
  const denominator = sum5 + 0.01 * sum3;
  return denominator === 0 ? 0 : (Math.abs(h) * sum5) / Math.sqrt(denominator * n);
}

function stage2(w: Workspace, h: number): void {
  const { n, y, k1, trial } = w;
  const a1 = h * 0.05260015195876773;
  for (let i = 0; i < n; i++) trial[i] = y[i]! + a1 * k1[i]!;
}

function stage3(w: Workspace, h: number): void {
  const { n, y, k1, k2, trial } = w;
  const a1 = h * 0.0197250569845379;
  const a2 = h * 0.0591751709536137;
  for (let i = 0; i < n; i++) trial[i] = y[i]! + a1 * k1[i]! + a2 * k2[i]!;
}

function stage4(w: Workspace, h: number): void {
  const { n, y, k1, k3, trial } = w;
  const a1 = h * 0.02958758547680685;
  const a3 = h * 0.08876275643042054;
  for (let i = 0; i < n; i++) trial[i] = y[i]! + a1 * k1[i]! + a3 * k3[i]!;
}

function stage5(w: Workspace, h: number): void {
  const { n, y, k1, k3, k4, trial } = w;
  const a1 = h * 0.2413651341592667;
  const a3 = h * -0.8845494793282861;
  const a4 = h * 0.924834003261792;
  for (let i = 0; i < n; i++) trial[i] = y[i]! + a1 * k1[i]! + a3 * k3[i]! + a4 * k4[i]!;
}

function stage6(w: Workspace, h: number): void {
  const { n, y, k1, k4, k5, trial } = w;
  const a1 = h * 0.037037037037037035;
  const a4 = h * 0.17082860872947386;
  const a5 = h * 0.12546768756682242;
  for (let i = 0; i < n; i++) trial[i] = y[i]! + a1 * k1[i]! + a4 * k4[i]! + a5 * k5[i]!;
}

function stage7(w: Workspace, h: number): void {
  const { n, y, k1, k4, k5, k6, trial } = w;
  const a1 = h * 0.037109375;
  const a4 = h * 0.17025221101954405;
  const a5 = h * 0.06021653898045596;
  const a6 = h * -0.017578125;
  for (let i = 0; i < n; i++) trial[i] = y[i]! + a1 * k1[i]! + a4 * k4[i]! + a5 * k5[i]! + a6 * k6[i]!;
}

function stage8(w: Workspace, h: number): void {
  const { n, y, k1, k4, k5, k6, k7, trial } = w;
  const a1 = h * 0.03709200011850479;
  const a4 = h * 0.17038392571223998;
  const a5 = h * 0.10726203044637328;
  const a6 = h * -0.015319437748624402;
  const a7 = h * 0.008273789163814023;
  for (let i = 0; i < n; i++) trial[i] = y[i]! + a1 * k1[i]! + a4 * k4[i]! + a5 * k5[i]! + a6 * k6[i]! + a7 * k7[i]!;
}

function stage9(w: Workspace, h: number): void {
  const { n, y, k1, k4, k5, k6, k7, k8, trial } = w;
  const a1 = h * 0.6241109587160757;
  const a4 = h * -3.3608926294469414;
  const a5 = h * -0.868219346841726;
  const a6 = h * 27.59209969944671;
  const a7 = h * 20.154067550477894;
  const a8 = h * -43.48988418106996;
  for (let i = 0; i < n; i++)
    trial[i] = y[i]! + a1 * k1[i]! + a4 * k4[i]! + a5 * k5[i]! + a6 * k6[i]! + a7 * k7[i]! + a8 * k8[i]!;
}

function stage10(w: Workspace, h: number): void {
  const { n, y, k1, k4, k5, k6, k7, k8, k9, trial } = w;
  const a1 = h * 0.47766253643826434;
  const a4 = h * -2.4881146199716677;
  const a5 = h * -0.590290826836843;
  const a6 = h * 21.230051448181193;
  const a7 = h * 15.279233632882423;
  const a8 = h * -33.28821096898486;
  const a9 = h * -0.020331201708508627;
  for (let i = 0; i < n; i++)
    trial[i] = y[i]! + a1 * k1[i]! + a4 * k4[i]! + a5 * k5[i]! + a6 * k6[i]! + a7 * k7[i]! + a8 * k8[i]! + a9 * k9[i]!;
}

function stage11(w: Workspace, h: number): void {
  const { n, y, k1, k4, k5, k6, k7, k8, k9, k10, trial } = w;
  const a1 = h * -0.9371424300859873;
  const a4 = h * 5.186372428844064;
  const a5 = h * 1.0914373489967295;
  const a6 = h * -8.149787010746927;
  const a7 = h * -18.52006565999696;
  const a8 = h * 22.739487099350505;
  const a9 = h * 2.4936055526796523;
  const a10 = h * -3.0467644718982196;
  for (let i = 0; i < n; i++)
    trial[i] =
      y[i]! +
      a1 * k1[i]! +
      a4 * k4[i]! +
      a5 * k5[i]! +
      a6 * k6[i]! +
      a7 * k7[i]! +
      a8 * k8[i]! +
      a9 * k9[i]! +
      a10 * k10[i]!;
}

function stage12(w: Workspace, h: number): void {
  const { n, y, k1, k4, k5, k6, k7, k8, k9, k10, k11, trial } = w;
  const a1 = h * 2.273310147516538;
  const a4 = h * -10.53449546673725;
  const a5 = h * -2.0008720582248625;
  const a6 = h * -17.9589318631188;
  const a7 = h * 27.94888452941996;
  const a8 = h * -2.8589982771350235;
  const a9 = h * -8.87285693353063;
  const a10 = h * 12.360567175794303;
  const a11 = h * 0.6433927460157636;
  for (let i = 0; i < n; i++)
    trial[i] =
      y[i]! +
      a1 * k1[i]! +
      a4 * k4[i]! +
      a5 * k5[i]! +
      a6 * k6[i]! +
      a7 * k7[i]! +
      a8 * k8[i]! +
      a9 * k9[i]! +
      a10 * k10[i]! +
      a11 * k11[i]!;
}

function solution(w: Workspace, h: number): void {
  const { n, y, k1, k6, k7, k8, k9, k10, k11, k12, next } = w;
  const a1 = h * 0.054293734116568765;
  const a6 = h * 4.450312892752409;
  const a7 = h * 1.8915178993145003;
  const a8 = h * -5.801203960010585;
  const a9 = h * 0.3111643669578199;
  const a10 = h * -0.1521609496625161;
  const a11 = h * 0.20136540080403034;
  const a12 = h * 0.04471061572777259;
  for (let i = 0; i < n; i++)
    next[i] =
      y[i]! +
      a1 * k1[i]! +
      a6 * k6[i]! +
      a7 * k7[i]! +
      a8 * k8[i]! +
      a9 * k9[i]! +
      a10 * k10[i]! +
      a11 * k11[i]! +
      a12 * k12[i]!;
}

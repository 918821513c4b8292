/**
 * One step of the explicit Runge–Kutta method of order 8(5,3) by Dormand and Prince.
 * Coefficients: E. Hairer, S. P. Nørsett and G. Wanner, Solving Ordinary Differential Equations I, 2nd ed.,
 * Springer 1993, sections II.5 and II.10 (the method DOP853), rounded to double precision.
 *
 * Each stage is one loop of its own with its coefficients as literals, over one array with row offsets, which was
 * measured to be a tenth faster than an array object a row.
 */
import type { RightHandSide } from './integration.ts';

/** First index of each row of the pool; k1 to k16 are the stage derivatives of the book, and y is row 0. */
interface Rows {
  readonly next: number;
  readonly trial: number;
  readonly tolerance: number;
  readonly k1: number;
  readonly k2: number;
  readonly k3: number;
  readonly k4: number;
  readonly k5: number;
  readonly k6: number;
  readonly k7: number;
  readonly k8: number;
  readonly k9: number;
  readonly k10: number;
  readonly k11: number;
  readonly k12: number;
  readonly k13: number;
  readonly k14: number;
  readonly k15: number;
  readonly k16: number;
}

/** All arrays of one integration: rows of one allocation, and a view of each row. */
export interface Workspace {
  readonly n: number;
  readonly pool: Float64Array;
  readonly rows: Rows;
  /** State at the start of the step. */
  readonly y: Float64Array;
  /** State at the end of the step. */
  readonly next: Float64Array;
  /** Argument of the stage being evaluated. */
  readonly trial: Float64Array;
  readonly absoluteTolerance: Float64Array;
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
  /** Eight coefficients of the dense output a component. */
  readonly dense: Float64Array;
}

/** Workspace for a system of `n` equations. */
export function createWorkspace(n: number): Workspace {
  const pool = new Float64Array(28 * n);
  const row = (index: number) => pool.subarray(index * n, (index + 1) * n);
  return {
    n,
    pool,
    rows: {
      next: n,
      trial: 2 * n,
      tolerance: 3 * n,
      k1: 4 * n,
      k2: 5 * n,
      k3: 6 * n,
      k4: 7 * n,
      k5: 8 * n,
      k6: 9 * n,
      k7: 10 * n,
      k8: 11 * n,
      k9: 12 * n,
      k10: 13 * n,
      k11: 14 * n,
      k12: 15 * n,
      k13: 16 * n,
      k14: 17 * n,
      k15: 18 * n,
      k16: 19 * n,
    },
    y: row(0),
    next: row(1),
    trial: row(2),
    absoluteTolerance: row(3),
    k1: row(4),
    k2: row(5),
    k3: row(6),
    k4: row(7),
    k5: row(8),
    k6: row(9),
    k7: row(10),
    k8: row(11),
    k9: row(12),
    k10: row(13),
    k11: row(14),
    k12: row(15),
    k13: row(16),
    k14: row(17),
    k15: row(18),
    k16: row(19),
    dense: pool.subarray(20 * n),
  };
}

/**
 * Evaluates stages 2 to 12 and the new state in `next`; k1 must hold the derivative at `time`. 11 evaluations.
 * Returns the error in units of the tolerance, at most 1 to be accepted; not finite if a stage was not.
 */
export function takeStep(rhs: RightHandSide, w: Workspace, time: number, h: number, relativeTolerance: number): number {
  const { trial } = w;
  prepareStage2(w, h);
  rhs(time + 0.05260015195876773 * h, trial, w.k2);
  prepareStage3(w, h);
  rhs(time + 0.0789002279381516 * h, trial, w.k3);
  prepareStage4(w, h);
  rhs(time + 0.1183503419072274 * h, trial, w.k4);
  prepareStage5(w, h);
  rhs(time + 0.2816496580927726 * h, trial, w.k5);
  prepareStage6(w, h);
  rhs(time + 0.3333333333333333 * h, trial, w.k6);
  prepareStage7(w, h);
  rhs(time + 0.25 * h, trial, w.k7);
  prepareStage8(w, h);
  rhs(time + 0.3076923076923077 * h, trial, w.k8);
  prepareStage9(w, h);
  rhs(time + 0.6512820512820513 * h, trial, w.k9);
  prepareStage10(w, h);
  rhs(time + 0.6 * h, trial, w.k10);
  prepareStage11(w, h);
  rhs(time + 0.8571428571428571 * h, trial, w.k11);
  prepareStage12(w, h);
  rhs(time + h, trial, w.k12);
  return finishStep(w, h, relativeTolerance);
}

/**
 * The new state, and its error: the embedded formulas of order 5 and 3 combined as in the book, section II.10,
 * equation (10.17), in the root mean square over the components.
 */
function finishStep(w: Workspace, h: number, relativeTolerance: number): number {
  const { n, pool, rows } = w;
  const { next, tolerance, k1, k6, k7, k8, k9, k10, k11, k12 } = rows;
  const b1 = 0.054293734116568765 * h;
  const b6 = 4.450312892752409 * h;
  const b7 = 1.8915178993145003 * h;
  const b8 = -5.801203960010585 * h;
  const b9 = 0.3111643669578199 * h;
  const b10 = -0.1521609496625161 * h;
  const b11 = 0.20136540080403034 * h;
  const b12 = 0.04471061572777259 * h;
  const e1 = 0.01312004499419488 * h;
  const e6 = -1.2251564463762044 * h;
  const e7 = -0.4957589496572502 * h;
  const e8 = 1.6643771824549864 * h;
  const e9 = -0.35032884874997366 * h;
  const e10 = 0.3341791187130175 * h;
  const e11 = 0.08192320648511571 * h;
  const e12 = -0.022355307863886294 * h;
  const f1 = 0.2440944881889764 * h;
  const f9 = 0.7338466882816118 * h;
  const f12 = 0.022058823529411766 * h;
  let sum5 = 0;
  let sum3 = 0;
  for (let i = 0; i < n; i++) {
    const s1 = pool[k1 + i]!;
    const s6 = pool[k6 + i]!;
    const s7 = pool[k7 + i]!;
    const s8 = pool[k8 + i]!;
    const s9 = pool[k9 + i]!;
    const s10 = pool[k10 + i]!;
    const s11 = pool[k11 + i]!;
    const s12 = pool[k12 + i]!;
    const y = pool[i]!;
    const change = b1 * s1 + b6 * s6 + b7 * s7 + b8 * s8 + b9 * s9 + b10 * s10 + b11 * s11 + b12 * s12;
    const after = y + change;
    pool[next + i] = after;
    const scale = 1 / (pool[tolerance + i]! + relativeTolerance * Math.max(Math.abs(y), Math.abs(after)));
    const error5 = scale * (e1 * s1 + e6 * s6 + e7 * s7 + e8 * s8 + e9 * s9 + e10 * s10 + e11 * s11 + e12 * s12);
    const error3 = scale * (change - f1 * s1 - f9 * s9 - f12 * s12);
    sum5 += error5 * error5;
    sum3 += error3 * error3;
  }
  const denominator = sum5 + 0.01 * sum3;
  return denominator === 0 ? 0 : sum5 / Math.sqrt(denominator * n);
}

function prepareStage2(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1 } = rows;
  const a1 = 0.05260015195876773 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] = pool[i]! + a1 * pool[k1 + i]!;
  }
}

function prepareStage3(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k2 } = rows;
  const a1 = 0.0197250569845379 * h;
  const a2 = 0.0591751709536137 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] = pool[i]! + a1 * pool[k1 + i]! + a2 * pool[k2 + i]!;
  }
}

function prepareStage4(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k3 } = rows;
  const a1 = 0.02958758547680685 * h;
  const a3 = 0.08876275643042054 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] = pool[i]! + a1 * pool[k1 + i]! + a3 * pool[k3 + i]!;
  }
}

function prepareStage5(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k3, k4 } = rows;
  const a1 = 0.2413651341592667 * h;
  const a3 = -0.8845494793282861 * h;
  const a4 = 0.924834003261792 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] = pool[i]! + a1 * pool[k1 + i]! + a3 * pool[k3 + i]! + a4 * pool[k4 + i]!;
  }
}

function prepareStage6(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k4, k5 } = rows;
  const a1 = 0.037037037037037035 * h;
  const a4 = 0.17082860872947386 * h;
  const a5 = 0.12546768756682242 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] = pool[i]! + a1 * pool[k1 + i]! + a4 * pool[k4 + i]! + a5 * pool[k5 + i]!;
  }
}

function prepareStage7(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k4, k5, k6 } = rows;
  const a1 = 0.037109375 * h;
  const a4 = 0.17025221101954405 * h;
  const a5 = 0.06021653898045596 * h;
  const a6 = -0.017578125 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] = pool[i]! + a1 * pool[k1 + i]! + a4 * pool[k4 + i]! + a5 * pool[k5 + i]! + a6 * pool[k6 + i]!;
  }
}

function prepareStage8(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k4, k5, k6, k7 } = rows;
  const a1 = 0.03709200011850479 * h;
  const a4 = 0.17038392571223998 * h;
  const a5 = 0.10726203044637328 * h;
  const a6 = -0.015319437748624402 * h;
  const a7 = 0.008273789163814023 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] =
      pool[i]! + a1 * pool[k1 + i]! + a4 * pool[k4 + i]! + a5 * pool[k5 + i]! + a6 * pool[k6 + i]! + a7 * pool[k7 + i]!;
  }
}

function prepareStage9(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k4, k5, k6, k7, k8 } = rows;
  const a1 = 0.6241109587160757 * h;
  const a4 = -3.3608926294469414 * h;
  const a5 = -0.868219346841726 * h;
  const a6 = 27.59209969944671 * h;
  const a7 = 20.154067550477894 * h;
  const a8 = -43.48988418106996 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] =
      pool[i]! +
      a1 * pool[k1 + i]! +
      a4 * pool[k4 + i]! +
      a5 * pool[k5 + i]! +
      a6 * pool[k6 + i]! +
      a7 * pool[k7 + i]! +
      a8 * pool[k8 + i]!;
  }
}

function prepareStage10(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k4, k5, k6, k7, k8, k9 } = rows;
  const a1 = 0.47766253643826434 * h;
  const a4 = -2.4881146199716677 * h;
  const a5 = -0.590290826836843 * h;
  const a6 = 21.230051448181193 * h;
  const a7 = 15.279233632882423 * h;
  const a8 = -33.28821096898486 * h;
  const a9 = -0.020331201708508627 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] =
      pool[i]! +
      a1 * pool[k1 + i]! +
      a4 * pool[k4 + i]! +
      a5 * pool[k5 + i]! +
      a6 * pool[k6 + i]! +
      a7 * pool[k7 + i]! +
      a8 * pool[k8 + i]! +
      a9 * pool[k9 + i]!;
  }
}

function prepareStage11(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k4, k5, k6, k7, k8, k9, k10 } = rows;
  const a1 = -0.9371424300859873 * h;
  const a4 = 5.186372428844064 * h;
  const a5 = 1.0914373489967295 * h;
  const a6 = -8.149787010746927 * h;
  const a7 = -18.52006565999696 * h;
  const a8 = 22.739487099350505 * h;
  const a9 = 2.4936055526796523 * h;
  const a10 = -3.0467644718982196 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] =
      pool[i]! +
      a1 * pool[k1 + i]! +
      a4 * pool[k4 + i]! +
      a5 * pool[k5 + i]! +
      a6 * pool[k6 + i]! +
      a7 * pool[k7 + i]! +
      a8 * pool[k8 + i]! +
      a9 * pool[k9 + i]! +
      a10 * pool[k10 + i]!;
  }
}

function prepareStage12(w: Workspace, h: number): void {
  const { n, pool, rows } = w;
  const { trial, k1, k4, k5, k6, k7, k8, k9, k10, k11 } = rows;
  const a1 = 2.273310147516538 * h;
  const a4 = -10.53449546673725 * h;
  const a5 = -2.0008720582248625 * h;
  const a6 = -17.9589318631188 * h;
  const a7 = 27.94888452941996 * h;
  const a8 = -2.8589982771350235 * h;
  const a9 = -8.87285693353063 * h;
  const a10 = 12.360567175794303 * h;
  const a11 = 0.6433927460157636 * h;
  for (let i = 0; i < n; i++) {
    pool[trial + i] =
      pool[i]! +
      a1 * pool[k1 + i]! +
      a4 * pool[k4 + i]! +
      a5 * pool[k5 + i]! +
      a6 * pool[k6 + i]! +
      a7 * pool[k7 + i]! +
      a8 * pool[k8 + i]! +
      a9 * pool[k9 + i]! +
      a10 * pool[k10 + i]! +
      a11 * pool[k11 + i]!;
  }
}

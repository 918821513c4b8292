import { maximumBetween } from '../numerics/maximum.ts';
import { type Balance, LARGEST_DEPLETION, SMALLEST_DEPLETION } from './balance.ts';
import type { Cavity } from './cavity.ts';
import type { CouplingFigures } from './prediction.ts';

/**
 * The output reflectivity of most pulse energy, all else fixed. A pulse of depletion x needs the loss Γ(x)/x and gives
 * an energy in proportion to Γ(x) − L·x (Γ = ∫G dx, L the dissipative log loss): a maximum in one variable, whatever
 * the profiles. Where nothing that a pulse leaves counts in the next, it lies where G(x) = L, which for flat
 * profiles is Degnan's closed form (IEEE J. Quantum Electron. 25, 214 (1989)).
 * Empty where no reflectivity gives a pulse, or where there is no dissipative loss: then the optimum is R → 1.
 */
export function optimumCoupling(cavity: Cavity, balance: Balance): CouplingFigures {
  const loss = cavity.dissipativeLog;
  const useful = (x: number) => balance.gainIntegral(x) - loss * x;
  if (!(loss > 0) || !(useful(SMALLEST_DEPLETION) > 0)) return {};
  let high = SMALLEST_DEPLETION;
  while (useful(2 * high) > useful(high) && high < LARGEST_DEPLETION) high *= 2;
  const { at, value } = maximumBetween(useful, high / 2, 2 * high);
  const outputLog = balance.gainIntegral(at) / at - loss;
  if (!(outputLog > 0)) return {};
  return { optimum_reflectivity: Math.exp(-outputLog), optimum_energy_J: cavity.energyUnit * value };
}

/**
 * The same by trial, where time matters during the pulse: `energyAt` gives the pulse energy at an output log ln(1/R),
 * 0 where none is emitted. Searched around the optimum of the depletion form.
 */
export function optimumByTrial(energyAt: (outputLog: number) => number, near: CouplingFigures): CouplingFigures {
  if (near.optimum_reflectivity === undefined) return {};
  const guess = -Math.log(near.optimum_reflectivity);
  const { at, value } = maximumBetween(energyAt, guess / 8, guess * 4, 1e-5);
  return value > 0 ? { optimum_reflectivity: Math.exp(-at), optimum_energy_J: value } : {};
}

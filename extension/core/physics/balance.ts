import { rootBetween } from '../numerics/root.ts';
import type { Cavity } from './cavity.ts';
import { drain, type Store } from './store.ts';

/**
 * A train in balance: every pulse takes what the pump brings between two openings. For a given depletion x per pulse
 * each ring's ions follow in closed form, so a whole train is one equation in x, and the loss it needs is an explicit
 * function of x. Source: Chesler, Karr & Geusic, Proc. IEEE 58, 1899 (1970), here ring by ring.
 */
export interface Balance {
  /** The store just before each pulse of depletion x; x = 0: no opening fires. */
  store(x: number): Store;
  /** ∫₀ˣ G dx′ of that pulse. */
  gainIntegral(x: number): number;
}

/**
 * `fresh`: what one period's pumping alone stores; `lost`: the part of what a pulse leaves that has decayed by the
 * next opening, above 0, at most 1.
 */
export function balanceOf(cavity: Cavity, fresh: Store, lost: number): Balance {
  const { intensity, weight } = cavity.rings;
  const { ground, reduction, crossSection } = cavity;
  const kept = 1 - lost;
  const ions = (k: number, used: number) => {
    const taken = (kept * used) / reduction;
    return (fresh.ions[k]! + ground * taken) / (lost + taken);
  };
  return {
    store(x) {
      const used = (k: number) => -Math.expm1(-intensity[k]! * x);
      const before = { ions: fresh.ions.map((_, k) => ions(k, used(k))), total: 0, overfilled: false };
      const taken = before.total - drain(cavity, before, used).total;
      return { ...before, total: (fresh.total - kept * taken) / lost };
    },
    gainIntegral(x) {
      let sum = 0;
      for (let k = 0; k < weight.length; k++) {
        const used = -Math.expm1(-intensity[k]! * x);
        sum += (weight[k]! * (ions(k, used) - ground) * used) / intensity[k]!;
      }
      return 2 * crossSection * sum;
    },
  };
}

/** One pulse from a given store, with nothing left of it for the next. */
export function singleShot(cavity: Cavity, store: Store): Balance {
  return balanceOf(cavity, store, 1);
}

/** The depletion per pulse of a train in balance at a round-trip log loss; undefined where no train lasts. */
export function balancedDepletion(balance: Balance, loss: number): number | undefined {
  const field = (x: number) => balance.gainIntegral(x) - loss * x;
  let high = SMALLEST_DEPLETION;
  if (!(field(high) > 0)) return undefined;
  while (field(high) > 0 && high < LARGEST_DEPLETION) high *= 4;
  return rootBetween(field, high / 4, high);
}

/** Range of depletions searched: below, no pulse worth the name; above, nothing is left to take. */
export const SMALLEST_DEPLETION = 1e-6;
export const LARGEST_DEPLETION = 1e9;

import type { Cavity } from './cavity.ts';

/**
 * Photons in the mode behind the closed switch, where spontaneous emission into it balances the loss:
 * G/(δ + δ_closed − G); 0 for a switch that blocks wholly. The gain must be below what the switch holds.
 */
export function photonsBehindSwitch(cavity: Cavity, gain: number): number {
  const excess = cavity.loss + cavity.closedLog - gain;
  return excess === Number.POSITIVE_INFINITY ? 0 : gain / excess;
}

/**
 * Photons from which the field grows as if without a source once the switch is open: those there, and
 * G/(G − δ) for the spontaneous emission to come. From dφ/dt = [(G − δ)φ + G]/t_r with G still constant.
 * Source: Siegman, Lasers (1986), ch. 26.
 */
export function effectiveStart(cavity: Cavity, gain: number, photons: number): number {
  return photons + gain / (gain - cavity.loss);
}

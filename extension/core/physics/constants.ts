/** J s, exact. Source: BIPM, The International System of Units, 9th ed. (2019). */
export const PLANCK_CONSTANT = 6.62607015e-34;
/** m/s, exact. Source: as above. */
export const SPEED_OF_LIGHT = 299792458;

/** Energy of a photon in J; vacuum wavelength in m, above 0. */
export function photonEnergy(wavelength: number): number {
  return (PLANCK_CONSTANT * SPEED_OF_LIGHT) / wavelength;
}

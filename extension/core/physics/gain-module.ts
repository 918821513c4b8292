/** A gain module as the physics sees it: SI units, every default and table figure filled in. */
export interface GainModule {
  readonly medium: GainMedium;
  readonly pump: Pump;
  readonly resonator: Resonator;
  readonly qSwitch: QSwitch;
  readonly surfaces: readonly Surface[];
}

/** Radius in m: the disc's for `flat`, the 1/e² intensity radius for `gaussian`. */
export interface Beam {
  readonly profile: 'flat' | 'gaussian';
  readonly radius: number;
}

export interface GainMedium {
  /** m, in vacuum. */
  readonly wavelength: number;
  /** m. */
  readonly length: number;
  /** m. */
  readonly diameter?: number;
  /** m², manifold-effective. */
  readonly emissionCrossSection: number;
  /** m², at the laser line; 0 where the lower level is empty. */
  readonly absorptionCrossSection: number;
  /** m⁻³; needed where the absorption cross-section is not 0. */
  readonly ionDensity?: number;
  /** s. */
  readonly upperLevelLifetime: number;
  /** s; present only where the design itself gives it. */
  readonly lowerLevelLifetime?: number;
  /** κ = γ − 1 for a lower level that never empties: f_l/f_u; needed beside the lifetime. */
  readonly lowerLevelWeight?: number;
  /** γ, 1 to 2. */
  readonly inversionReductionFactor: number;
  readonly refractiveIndex: number;
  /** The group index, or the refractive index where none is known. */
  readonly groupIndex: number;
}

export interface Pump {
  readonly kind: 'pulsed' | 'continuous';
  /** m. */
  readonly wavelength: number;
  /** W reaching the medium while the pump is on. */
  readonly power: number;
  /** s, pulsed only. */
  readonly duration?: number;
  readonly absorbedFraction: number;
  /** Upper-level ions per absorbed pump photon. */
  readonly quantumEfficiency: number;
  readonly beam: Beam;
}

export interface Resonator {
  /** m, mirror to mirror, mechanical. */
  readonly length: number;
  readonly outputReflectivity: number;
  /** Fraction per round trip, output coupler not counted. */
  readonly roundTripLoss: number;
  /** The laser mode in the medium. */
  readonly beam: Beam;
}

export interface QSwitch {
  readonly kind: 'electro_optic' | 'acousto_optic' | 'rotating' | 'saturable_absorber' | 'none';
  /** Fraction per round trip; absent: the switch is taken to block wholly, and hold-off can't be judged. */
  readonly closedLoss?: number;
  /** s, full ramp from closed to open; 0: at once. */
  readonly openingTime: number;
  /** s after the pump's start. */
  readonly opensAt: number;
  /** s. */
  readonly gate: number;
  /** Hz. */
  readonly repetitionRate: number;
  /** Elements between the mirrors besides the medium: Σ (n − 1) l in m. */
  readonly extraOpticalPath: number;
}

export interface Surface {
  readonly name: string;
  /** Where the design names it. */
  readonly path: string;
  readonly place: 'inside' | 'outside';
  readonly face: 'transmitting' | 'reflecting';
  /** m. */
  readonly beamRadius: number;
  readonly threshold: DamageThreshold;
  readonly hotSpotFactor: number;
  readonly safetyFactor: number;
}

/** J/m², s, m. */
export interface DamageThreshold {
  readonly fluence: number;
  readonly pulseWidth: number;
  readonly wavelength: number;
}

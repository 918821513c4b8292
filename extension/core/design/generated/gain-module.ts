// Generated from schemas/gain-module.schema.json; see schemas/generate.mjs.
import type {Quantity} from '../../quantity/quantity.ts';

/**
 * One Q-switched gain module: medium, pump, resonator, switch, the surfaces that the beam meets and what the pulse must be.
 */
export interface GainModuleFile {
  /**
   * Version of this file format.
   */
  format: 1;
  /**
   * What the module is, as it should head the readout.
   */
  title?: string;
  gain_medium: GainMediumSection;
  pump: PumpSection;
  resonator: ResonatorSection;
  q_switch: QSwitchSection;
  /**
   * Surfaces and coatings that the beam meets, each judged against its damage threshold.
   */
  surfaces?: SurfaceSection[];
  requirements?: RequirementsSection;
}
/**
 * The laser medium and the line it lases on. Properties left out come from the property table.
 */
export interface GainMediumSection {
  /**
   * A row of the property table, named by composition.
   */
  material: string;
  /**
   * Laser wavelength in vacuum.
   */
  wavelength?: Quantity;
  /**
   * Length of the medium along the beam, passed twice per round trip.
   */
  length: Quantity;
  /**
   * Clear diameter of the medium. Truncates nothing; the beams are checked against it.
   */
  diameter?: Quantity;
  /**
   * Effective stimulated-emission cross-section at the laser line: manifold-effective for four-level media.
   */
  emission_cross_section?: Quantity;
  /**
   * Reabsorption cross-section at the laser line, of ions in the lower manifold; 0 for a four-level line.
   */
  absorption_cross_section?: Quantity;
  /**
   * Density of active ions. Needed where the absorption cross-section is not 0.
   */
  ion_density?: Quantity;
  /**
   * Fluorescence lifetime of the upper level.
   */
  upper_level_lifetime?: Quantity;
  /**
   * Lifetime of the lower level. Given here, it selects the finite-lifetime model.
   */
  lower_level_lifetime?: Quantity;
  /**
   * How many units of inversion one emitted photon takes, γ: 1 for an empty lower level, 1 + f_l/f_u for a bottlenecked one. Given here, it holds for the whole pulse.
   */
  inversion_reduction_factor?: Quantity;
  /**
   * Refractive index at the laser wavelength.
   */
  refractive_index?: Quantity;
  /**
   * Group index at the laser wavelength; sets the round-trip time.
   */
  group_index?: Quantity;
}
/**
 * How the medium is pumped: either the optical power that reaches it or the diodes that give it.
 */
export interface PumpSection {
  /**
   * `pulsed`: one burst of `duration` before each opening; `continuous`: always on.
   */
  kind: 'pulsed' | 'continuous';
  /**
   * Pump wavelength in vacuum.
   */
  wavelength: Quantity;
  /**
   * Optical pump power that reaches the medium, while the pump is on.
   */
  power?: Quantity;
  diode?: DiodeSection;
  /**
   * Length of the pump pulse. Pulsed pump only.
   */
  duration?: Quantity;
  /**
   * Fraction of the pump power at the medium that the ions absorb.
   */
  absorbed_fraction: Quantity;
  /**
   * Ions in the upper level per absorbed pump photon.
   */
  quantum_efficiency?: Quantity;
  beam: BeamSection;
}
/**
 * Pump diodes: power = (current − threshold_current) × slope_efficiency × count × delivery_efficiency.
 */
export interface DiodeSection {
  /**
   * Drive current of each diode or stack.
   */
  current: Quantity;
  /**
   * Current at which a diode begins to lase.
   */
  threshold_current: Quantity;
  /**
   * Optical power of one diode or stack per ampere above threshold.
   */
  slope_efficiency: Quantity;
  /**
   * Number of diodes or stacks, all at the same current.
   */
  count: number;
  /**
   * Fraction of the diodes' light that reaches the medium.
   */
  delivery_efficiency?: Quantity;
}
/**
 * Transverse profile and radius.
 */
export interface BeamSection {
  /**
   * Transverse profile: `flat` disc or `gaussian`.
   */
  profile: 'flat' | 'gaussian';
  /**
   * Disc radius of a flat profile, 1/e² intensity radius of a Gaussian one.
   */
  radius: Quantity;
}
/**
 * The linear resonator around the medium.
 */
export interface ResonatorSection {
  /**
   * Mirror to mirror, mechanical; the media's indices are added to it.
   */
  length: Quantity;
  /**
   * Power reflectivity of the output coupler.
   */
  output_reflectivity: Quantity;
  /**
   * Fraction lost per round trip with the switch open; all but the output coupler.
   */
  round_trip_loss: Quantity;
  beam: BeamSection;
}
/**
 * What holds the resonator's loss up while ions are stored, and when it lets go.
 */
export interface QSwitchSection {
  /**
   * `none` is gain switching: the pump alone makes the pulse.
   */
  kind: 'electro_optic' | 'acousto_optic' | 'rotating' | 'saturable_absorber' | 'none';
  /**
   * Extra fraction lost per round trip while the switch is closed; a loss q per pass gives 1 − (1 − q)².
   */
  closed_loss?: Quantity;
  /**
   * Full ramp of the transmission from closed to open.
   */
  opening_time?: Quantity;
  /**
   * Opening after the pump's start.
   */
  opens_at?: Quantity;
  /**
   * How long the switch stays open.
   */
  gate?: Quantity;
  /**
   * Rate of the openings; with a saturable absorber or none, of the pump pulses.
   */
  repetition_rate: Quantity;
  absorber?: AbsorberSection;
}
/**
 * The saturable absorber of a passive switch.
 */
export interface AbsorberSection {
  /**
   * A row of the property table, named by composition.
   */
  material: string;
  /**
   * Transmission of a single pass, unsaturated.
   */
  initial_transmission: Quantity;
  /**
   * Absorption cross-section of the ground state at the laser wavelength.
   */
  ground_state_cross_section?: Quantity;
  /**
   * Absorption cross-section of the excited state: the loss that stays when the absorber is bleached.
   */
  excited_state_cross_section?: Quantity;
  /**
   * Recovery time of the absorber.
   */
  lifetime?: Quantity;
  /**
   * Radius of the laser mode in the absorber, of the same profile as in the medium.
   */
  beam_radius?: Quantity;
  /**
   * Length of the absorber along the beam.
   */
  length?: Quantity;
  /**
   * Refractive index of the absorber.
   */
  refractive_index?: Quantity;
}
/**
 * One surface.
 */
export interface SurfaceSection {
  /**
   * What the surface is called in problems and in the readout.
   */
  name: string;
  /**
   * `inside` the resonator (circulating light) or `outside` it (the output pulse).
   */
  place: 'inside' | 'outside';
  /**
   * `transmitting`: crossed in both directions; `reflecting`: a mirror, judged by the incident fluence.
   */
  face?: 'transmitting' | 'reflecting';
  /**
   * Beam radius at the surface, of the mode's profile.
   */
  beam_radius: Quantity;
  damage_threshold: DamageThresholdSection;
  /**
   * Peak fluence of the real beam over that of its smooth profile.
   */
  hot_spot_factor?: Quantity;
  /**
   * Margin wanted between threshold and fluence; below it a warning is given.
   */
  safety_factor?: Quantity;
}
/**
 * Measured damage threshold, with the pulse it was measured with.
 */
export interface DamageThresholdSection {
  /**
   * Peak fluence of the laser-induced damage threshold (ISO 21254), at normal incidence unless the test says otherwise.
   */
  fluence: Quantity;
  /**
   * Full width at half maximum of the test's pulses.
   */
  pulse_width: Quantity;
  /**
   * Wavelength of the test. Thresholds are not scaled across wavelengths.
   */
  wavelength: Quantity;
}
/**
 * What the pulse must be. Each figure takes `min`, `max` or both.
 */
export interface RequirementsSection {
  pulse_energy?: EnergyRange;
  pulse_width?: TimeRange;
  peak_power?: PowerRange;
  average_power?: PowerRange;
  repetition_rate?: FrequencyRange;
  build_up_time?: TimeRange;
  first_pulse_energy?: EnergyRange;
  hold_off_margin?: FactorRange;
  timing_jitter?: TimeRange;
  energy_stability?: FactorRange;
  divergence?: AngleRange;
}
/**
 * `min`, `max` or both.
 */
export interface EnergyRange {
  /**
   * The least that will do.
   */
  min?: Quantity;
  /**
   * The most that will do.
   */
  max?: Quantity;
}
/**
 * `min`, `max` or both.
 */
export interface TimeRange {
  /**
   * The least that will do.
   */
  min?: Quantity;
  /**
   * The most that will do.
   */
  max?: Quantity;
}
/**
 * `min`, `max` or both.
 */
export interface PowerRange {
  /**
   * The least that will do.
   */
  min?: Quantity;
  /**
   * The most that will do.
   */
  max?: Quantity;
}
/**
 * `min`, `max` or both.
 */
export interface FrequencyRange {
  /**
   * The least that will do.
   */
  min?: Quantity;
  /**
   * The most that will do.
   */
  max?: Quantity;
}
/**
 * `min`, `max` or both.
 */
export interface FactorRange {
  /**
   * The least that will do.
   */
  min?: Quantity;
  /**
   * The most that will do.
   */
  max?: Quantity;
}
/**
 * `min`, `max` or both.
 */
export interface AngleRange {
  /**
   * The least that will do.
   */
  min?: Quantity;
  /**
   * The most that will do.
   */
  max?: Quantity;
}

/**
 * What a design is predicted to do. Names carry their SI unit and are those of `giantpulse predict --format json`;
 * a figure that does not apply is absent, never zero or null.
 */
export interface Prediction {
  /** Which path produced the pulse. */
  readonly model: 'depletion' | 'time_integration';
  /** Absent when no pulse is emitted. */
  readonly pulse?: PulseFigures;
  readonly state: StateFigures;
  readonly train: TrainFigures;
  readonly coupling: CouplingFigures;
  readonly surfaces: readonly SurfaceFigures[];
  readonly requirements: readonly RequirementFigures[];
  readonly validity: readonly ValidityNote[];
}

export interface PulseFigures {
  readonly energy_J: number;
  readonly peak_power_W: number;
  /** Full width at half maximum. */
  readonly width_fwhm_s: number;
  /** Energy over peak power. */
  readonly width_equivalent_s: number;
  /** From the first instant of opening to the peak. */
  readonly build_up_time_s?: number;
}

export interface StateFigures {
  /** G(0): round-trip logarithmic small-signal gain, switch open, just before the pulse. */
  readonly round_trip_gain_log?: number;
  /** δ = −ln R − ln(1 − loss): switch open, absorber not counted. */
  readonly round_trip_loss_log: number;
  readonly inversion_ratio?: number;
  readonly stored_energy_J?: number;
  readonly extraction_efficiency?: number;
}

export interface TrainFigures {
  readonly repetition_rate_Hz?: number;
  readonly average_power_W?: number;
  readonly first_pulse_energy_J?: number;
  readonly pulse_after_pause_energy_J?: number;
  readonly fires_at_s?: number;
  readonly pulses_per_pump_pulse?: number;
}

export interface CouplingFigures {
  readonly optimum_reflectivity?: number;
  readonly optimum_energy_J?: number;
}

export interface SurfaceFigures {
  readonly name: string;
  readonly peak_fluence_J_per_cm2: number;
  /** Scaled to this pulse's width (the cautious branch); absent where scaling is refused. */
  readonly threshold_J_per_cm2?: number;
  /** Scaled threshold over peak fluence times hot-spot factor. */
  readonly margin?: number;
}

export interface RequirementFigures {
  /** Key under `requirements`, e.g. `pulse_energy`. */
  readonly name: string;
  /** Absent where the figure is not predicted. */
  readonly met?: boolean;
  /** SI, as are the wanted limits. */
  readonly predicted?: number;
  readonly minimum?: number;
  readonly maximum?: number;
}

export interface ValidityNote {
  readonly code: string;
  readonly message: string;
}

/** A pulse's course in time, from where it rises out of the noise to where it has died; arrays of one length. */
export interface Waveform {
  /** s, zero at the peak. */
  readonly time_s: readonly number[];
  readonly power_W: readonly number[];
  /** Mode-weighted round-trip gain over its value before the pulse. */
  readonly inversion: readonly number[];
}

import type { Prediction } from '../core/physics/prediction.ts';
import type { Figure, FigureGroup } from '../protocol/readout.ts';
import { type Kind, show } from './show.ts';

/** The figures an engineer looks for first; without a prediction all of them, with no value. */
export function headlineFigures(prediction: Prediction | undefined): readonly Figure[] {
  const { pulse, train } = prediction ?? {};
  return [
    figure('Pulse energy', pulse?.energy_J, 'energy'),
    figure('Peak power', pulse?.peak_power_W, 'power'),
    figure('Pulse width (FWHM)', pulse?.width_fwhm_s, 'time'),
    figure('Average power', train?.average_power_W, 'power'),
  ];
}

/** Everything else that is predicted; a figure that does not apply is left out. */
export function figureGroups(prediction: Prediction, holdOffMargin: number | undefined): readonly FigureGroup[] {
  const { pulse, state, train, coupling } = prediction;
  const groups = [
    group('Pulse', [
      figure('Build-up time', pulse?.build_up_time_s, 'time'),
      figure('Energy over peak power', pulse?.width_equivalent_s, 'time'),
      figure('Fires after pump start', train.fires_at_s, 'time'),
      figure('Pulses per pump pulse', train.pulses_per_pump_pulse, 'ratio'),
    ]),
    group('Store and hold-off', [
      figure('Stored energy', state.stored_energy_J, 'energy'),
      figure('Extraction efficiency', state.extraction_efficiency, 'percent'),
      figure('Inversion ratio', state.inversion_ratio, 'ratio'),
      figure('Round-trip gain (log)', state.round_trip_gain_log, 'ratio'),
      figure('Round-trip loss (log)', state.round_trip_loss_log, 'ratio'),
      figure('Hold-off margin', holdOffMargin, 'ratio'),
    ]),
    group('Output coupling', [
      figure('Optimum reflectivity', coupling.optimum_reflectivity, 'percent'),
      figure('Energy at the optimum', coupling.optimum_energy_J, 'energy'),
    ]),
    group('Pulse train', [
      figure('Repetition rate', train.repetition_rate_Hz, 'frequency'),
      figure('First pulse', train.first_pulse_energy_J, 'energy'),
      figure('Pulse after a pause', train.pulse_after_pause_energy_J, 'energy'),
    ]),
  ];
  return groups.filter(({ figures }) => figures.length > 0);
}

/** Which path produced the pulse, in words. */
export function modelName(prediction: Prediction): string {
  return { depletion: 'depletion model', time_integration: 'time integration' }[prediction.model];
}

function figure(label: string, value: number | undefined, kind: Kind): Figure {
  const text = show(value, kind);
  return text === undefined ? { label } : { label, value: text, ...(value !== undefined && { amount: value }) };
}

function group(name: string, figures: readonly Figure[]): FigureGroup {
  return { name, figures: figures.filter(({ value }) => value !== undefined) };
}

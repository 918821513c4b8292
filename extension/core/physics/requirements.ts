import type { Prediction, RequirementFigures } from './prediction.ts';

/** A figure wanted between limits, SI. */
export interface Requirement {
  readonly name: string;
  readonly minimum?: number;
  readonly maximum?: number;
}

type Figures = Pick<Prediction, 'pulse' | 'train'> & { readonly holdOffMargin?: number };

/** The predicted figure that a requirement is about, SI; undefined where there is none. */
export function figureFor(name: string, { pulse, train, holdOffMargin }: Figures): number | undefined {
  const figures: Readonly<Record<string, number | undefined>> = {
    pulse_energy: pulse?.energy_J,
    pulse_width: pulse?.width_fwhm_s,
    peak_power: pulse?.peak_power_W,
    build_up_time: pulse?.build_up_time_s,
    average_power: train.average_power_W,
    repetition_rate: train.repetition_rate_Hz,
    first_pulse_energy: train.first_pulse_energy_J,
    hold_off_margin: holdOffMargin,
  };
  return figures[name];
}

/** Each requirement against the prediction. */
export function judgeRequirements(requirements: readonly Requirement[], figures: Figures): RequirementFigures[] {
  return requirements.map((requirement) => {
    const predicted = figureFor(requirement.name, figures);
    const { minimum = Number.NEGATIVE_INFINITY, maximum = Number.POSITIVE_INFINITY } = requirement;
    return {
      ...requirement,
      ...(predicted !== undefined && { predicted, met: predicted >= minimum && predicted <= maximum }),
    };
  });
}

import { type Cavity, cavityOf, roundTripGain } from './cavity.ts';
import { optimumByTrial, optimumCoupling } from './coupling.ts';
import { surfaceFigures } from './damage.ts';
import { fire } from './fire.ts';
import type { GainModule } from './gain-module.ts';
import type { CouplingFigures, Prediction, PulseFigures, StateFigures, TrainFigures } from './prediction.ts';
import { judgeRequirements, type Requirement } from './requirements.ts';
import { settledPulse, type Train, trainOf } from './train.ts';

/** A prediction and what it was worked out from. */
export interface Outcome {
  readonly figures: Omit<Prediction, 'validity'>;
  readonly cavity: Cavity;
  readonly train: Train;
  /** (δ + δ_closed)/G just before opening; absent where no closed loss is given. */
  readonly holdOffMargin?: number;
}

/**
 * Predicts an actively switched module: the settled pulse, its train, the best coupling, surfaces and requirements.
 * Undefined for a passive or absent switch, which this release does not model. Conventions: `docs/model.md`.
 * The optimum coupling takes some 30 pulses where the switch is slow, and can be left out.
 */
export function predict(
  module: GainModule,
  requirements: readonly Requirement[],
  wanted: { readonly coupling: boolean } = { coupling: true },
): Outcome | undefined {
  if (module.qSwitch.kind === 'saturable_absorber' || module.qSwitch.kind === 'none') return undefined;
  const cavity = cavityOf(module);
  const train = trainOf(cavity);
  const pulse = pulseFigures(train);
  const trainFigures = figuresOfTrain(module, train);
  const gain = roundTripGain(cavity, train.store.ions);
  const margin = (cavity.loss + cavity.closedLog) / (train.unheldGain ?? gain);
  const holdOff = Number.isFinite(margin) && gain > 0 ? { holdOffMargin: margin } : {};
  return {
    figures: {
      model: train.settled?.model ?? 'depletion',
      ...(pulse && { pulse }),
      state: stateFigures(cavity, train, gain),
      train: trainFigures,
      coupling: wanted.coupling ? coupling(cavity, train) : {},
      surfaces: pulse
        ? module.surfaces.map((surface) => surfaceFigures(module, surface, pulse.energy_J, pulse.width_fwhm_s))
        : [],
      requirements: judgeRequirements(requirements, { ...(pulse && { pulse }), train: trainFigures, ...holdOff }),
    },
    cavity,
    train,
    ...holdOff,
  };
}

function coupling(cavity: Cavity, train: Train): CouplingFigures {
  const figures = optimumCoupling(cavity, train.balance);
  if (train.settled?.model !== 'time_integration') return figures;
  return optimumByTrial((outputLog) => {
    const trial = { ...cavity, outputLog, loss: outputLog + cavity.dissipativeLog };
    const fired = cavity.module.pump.kind === 'continuous' ? settledPulse(trial) : fire(trial, train.store);
    return fired?.energy ?? 0;
  }, figures);
}

function pulseFigures({ settled }: Train): PulseFigures | undefined {
  return (
    settled && {
      energy_J: settled.energy,
      peak_power_W: settled.peakPower,
      width_fwhm_s: settled.width,
      width_equivalent_s: settled.energy / settled.peakPower,
      ...(settled.buildUp !== undefined && { build_up_time_s: settled.buildUp }),
    }
  );
}

function stateFigures(cavity: Cavity, { store, settled }: Train, gain: number): StateFigures {
  const stored = cavity.photon * store.total;
  return {
    round_trip_gain_log: gain,
    round_trip_loss_log: cavity.loss,
    inversion_ratio: gain / cavity.loss,
    stored_energy_J: stored,
    ...(settled && stored > 0 && { extraction_efficiency: settled.energy / stored }),
  };
}

function figuresOfTrain(module: GainModule, train: Train): TrainFigures {
  const rate = module.qSwitch.repetitionRate;
  const { settled, first, afterPause, meanEnergy } = train;
  return {
    repetition_rate_Hz: rate,
    ...(settled && { average_power_W: meanEnergy * rate }),
    ...(first && { first_pulse_energy_J: first.energy }),
    ...(afterPause && { pulse_after_pause_energy_J: afterPause.energy }),
  };
}

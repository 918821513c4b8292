import { integratePulse } from '../../extension/core/physics/rate-equations.ts';
import { type Case, gaussian, oneRing } from './cases.ts';
import { coarsest } from './coarsest.ts';
import { type Formulation, odexPulse } from './odex-pulse.ts';
import { odexSettings } from './odex-settings.ts';
import { inTurn } from './stopwatch.ts';
import { type Row, time } from './table.ts';

export function bothIntegrators(): Row[] {
  return [oneRing(), gaussian()].flatMap((each) => [1e-6, 1e-8].flatMap((error) => compare(each, error)));
}

function compare(each: Case, error: number): Row[] {
  const { cavity, depletion, pulse, name } = each;
  const choice = coarsest((tolerance) => ours(each, tolerance), pulse, ['endsAt', 'peak', 'width'], error);
  if (!choice) throw new Error(`the integrator does not meet an error of ${error}`);
  const odex = (formulation: Formulation) => {
    const settings = odexSettings(each, formulation, true, error);
    return () => odexPulse(each, settings);
  };
  const times = inTurn(
    [() => integratePulse(cavity, depletion.gain, 0, 1, undefined, choice.tolerance), odex('log'), odex('raw')],
    2.5,
  );
  const [t = Number.NaN, log = Number.NaN, raw = Number.NaN] = times;
  const target = { least: 2 };
  const title = `${name}, ${error.toExponential(0)}; odex:`;
  return [
    { what: `${title} ln(φ+seed)`, ours: time(t), other: time(log), ratio: log / t, target },
    { what: `${' '.repeat(title.length)} φ itself`, ours: time(t), other: time(raw), ratio: raw / t, target },
  ];
}

/** In the units of the depletion form. */
function ours({ cavity, depletion }: Case, tolerance: number) {
  const found = integratePulse(cavity, depletion.gain, 0, 1, undefined, tolerance);
  return (
    found && {
      endsAt: found.depletion,
      peak: found.peakPhotons * cavity.photonField,
      width: found.width / cavity.roundTripTime,
      evaluations: found.statistics.evaluations,
    }
  );
}

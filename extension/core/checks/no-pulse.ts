import { formatQuantity } from '../quantity/format.ts';
import type { Check, Finding } from './check.ts';

/** The switch opens and no giant pulse follows. */
export const noPulse: Check = {
  code: 'no-pulse',
  title: 'No pulse is emitted',
  run: ({ design, outcome }) => (outcome.figures.pulse ? [] : [reason(outcome, design)]),
};

function reason(
  { cavity, figures }: Parameters<Check['run']>[0]['outcome'],
  design: Parameters<Check['run']>[0]['design'],
): Finding {
  const { round_trip_gain_log: gain = 0, round_trip_loss_log: loss } = figures.state;
  const { pump, qSwitch } = cavity.module;
  if (!(pump.power > 0)) {
    const path = design.values.pump?.diode ? 'pump.diode.current' : 'pump.power';
    return {
      severity: 'error',
      message: 'The pump gives no power: nothing is stored and no pulse follows. Raise the current above threshold.',
      path,
    };
  }
  const ratio = (gain / loss).toPrecision(3);
  if (gain > loss) {
    const gate = formatQuantity(qSwitch.gate, 'time');
    return {
      severity: 'error',
      message: `Gain exceeds loss ${ratio} times, but the pulse does not end before the switch closes again (gate ${gate}). Lengthen the gate, lower the repetition rate or raise the gain.`,
      path: design.values.q_switch?.gate ? 'q_switch.gate' : 'q_switch.repetition_rate',
    };
  }
  const more =
    gain > 0 && cavity.ground === 0
      ? ` About ${(loss / gain).toPrecision(3)} times the pump would reach threshold.`
      : '';
  return {
    severity: 'error',
    message: `Below threshold: the stored gain reaches ${gain.toPrecision(3)} against a loss of ${loss.toPrecision(3)} per round trip (logarithmic), ${ratio} times.${more} Raise the pump, or lower the loss.`,
    path: design.values.pump?.diode ? 'pump.diode.current' : 'pump.power',
  };
}

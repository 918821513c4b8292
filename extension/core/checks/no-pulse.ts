import { formatQuantity } from '../quantity/format.ts';
import type { Check, CheckContext, Finding } from './check.ts';

/** The switch opens and no giant pulse follows. */
export const noPulse: Check = {
  code: 'no-pulse',
  title: 'No pulse is emitted',
  impossible: true,
  run: (context) => (context.outcome.figures.pulse ? [] : [reason(context)]),
};

function reason({ design, outcome: { cavity, figures } }: CheckContext): Finding {
  const { round_trip_gain_log: gain = 0, round_trip_loss_log: loss } = figures.state;
  const { qSwitch } = cavity.module;
  const ratio = (gain / loss).toPrecision(3);
  if (gain > loss) {
    const gate = formatQuantity(qSwitch.gate, 'time');
    return {
      severity: 'error',
      message: `No pulse: the gain is ${ratio} times the loss, but the pulse has not ended when the switch closes again after ${gate}. Lengthen the gate, lower the repetition rate, or raise the gain.`,
      path: design.values.q_switch?.gate ? 'q_switch.gate' : 'q_switch.repetition_rate',
    };
  }
  const rates = `the round-trip log gain is ${gain.toPrecision(3)}, the loss ${loss.toPrecision(3)}`;
  const more =
    gain <= 0
      ? ' The medium still absorbs at the laser wavelength: raise the pump, or shorten the medium.'
      : cavity.ground === 0
        ? ` ${(loss / gain).toPrecision(3)} times the pump would reach threshold. Raise the pump, or lower the loss.`
        : ' Raise the pump, or lower the loss.';
  return {
    severity: 'error',
    message: `No pulse, below threshold: ${rates}.${more}`,
    path: design.values.pump?.diode ? 'pump.diode.current' : 'pump.power',
  };
}

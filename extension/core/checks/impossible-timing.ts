import { formatQuantity } from '../quantity/format.ts';
import type { Check, Finding } from './check.ts';

/** Events of one period that do not fit into it. */
export const impossibleTiming: Check = {
  code: 'impossible-timing',
  title: 'The timing does not fit into the period',
  impossible: true,
  run({ design, module: { pump, qSwitch } }) {
    const period = 1 / qSwitch.repetitionRate;
    const text = formatQuantity(period, 'time');
    const findings: Finding[] = [];
    const late = (path: string, what: string, value: number) => {
      if (value <= period * (1 + 1e-9)) return;
      const message = `${what} (${formatQuantity(value, 'time')}) is longer than the period of ${text}. Shorten it, or lower the repetition rate.`;
      findings.push({ severity: 'error', message, path });
    };
    if (pump.kind === 'pulsed') {
      late('pump.duration', 'The pump pulse', pump.duration ?? 0);
      if (design.values.q_switch?.opens_at) late('q_switch.opens_at', 'The delay to the opening', qSwitch.opensAt);
    }
    late('q_switch.gate', 'The gate', qSwitch.gate);
    late('q_switch.opening_time', 'The opening ramp', qSwitch.openingTime);
    return findings;
  },
};

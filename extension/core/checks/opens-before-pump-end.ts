import { formatQuantity } from '../quantity/format.ts';
import type { Check } from './check.ts';

/** The switch opens while the pump still runs. */
export const opensBeforePumpEnd: Check = {
  code: 'opens-before-pump-end',
  title: 'The switch opens before the pump ends',
  run({ module: { pump, qSwitch } }) {
    const { duration = 0 } = pump;
    if (pump.kind !== 'pulsed' || !(qSwitch.opensAt < duration * (1 - 1e-9))) return [];
    return [
      {
        severity: 'warning',
        message: `The switch opens at ${formatQuantity(qSwitch.opensAt, 'time')}, the pump ends at ${formatQuantity(duration, 'time')}: the last ${formatQuantity(duration - qSwitch.opensAt, 'time')} of pumping add nothing to this pulse and are left out of the prediction.`,
        path: 'q_switch.opens_at',
      },
    ];
  },
};

import { formatPercent } from '../quantity/format.ts';
import type { Check } from './check.ts';

/** Common practice, no source: the part of the upper-level lifetime above which decay during the pulse shows in the figures. */
const LARGEST_PART = 0.02;

/** Build-up and pulse take a noticeable part of the upper level's lifetime, while the model freezes pump and decay. */
export const longPulse: Check = {
  code: 'long-pulse',
  title: 'Pump and decay matter during the pulse',
  run({ outcome: { figures }, module: { medium, qSwitch } }) {
    const { width_fwhm_s = 0, build_up_time_s = 0 } = figures.pulse ?? {};
    const part = (width_fwhm_s + build_up_time_s) / medium.upperLevelLifetime;
    if (part <= LARGEST_PART) return [];
    return [
      {
        severity: 'information',
        message: `Build-up and pulse take ${formatPercent(part, 2)} of the upper level's lifetime. The model leaves out pumping and decay in that time: expect errors of that order.`,
        path: qSwitch.openingTime > build_up_time_s / 2 ? 'q_switch.opening_time' : 'q_switch.repetition_rate',
      },
    ];
  },
};

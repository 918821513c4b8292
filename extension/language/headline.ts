import type { Analysis } from '../core/analyse.ts';
import { show } from './show.ts';

/** The pulse in a few words, as a status bar has room for, or what stands in its way. */
export function headlineText({ prediction, problems }: Analysis): string {
  const pulse = prediction?.pulse;
  if (pulse !== undefined) {
    return `${show(pulse.energy_J, 'energy')} · ${show(pulse.width_fwhm_s, 'time')} · ${show(pulse.peak_power_W, 'power')}`;
  }
  const errors = problems.filter(({ severity }) => severity === 'error').length;
  if (prediction !== undefined || errors === 0) return 'no pulse';
  return errors === 1 ? '1 error' : `${errors} errors`;
}

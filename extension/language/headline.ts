import type { Analysis } from '../core/analyse.ts';
import { show } from './show.ts';

/** The pulse in a few words, or that there is none. */
export function headlineText({ prediction }: Analysis): string {
  const { pulse } = prediction ?? {};
  if (pulse === undefined) return 'no pulse';
  return `${show(pulse.energy_J, 'energy')} · ${show(pulse.width_fwhm_s, 'time')}`;
}

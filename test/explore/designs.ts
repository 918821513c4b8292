import { readFileSync } from 'node:fs';
import { type Analysis, analyse } from '../../extension/core/analyse.ts';

export const demo = readFileSync(new URL('../../extension/demo/hail_lidar.gainmodule.yaml', import.meta.url), 'utf8');

/** The same module with a switch that opens at once, so that the depletion model predicts it. */
export const quick = demo.replace('  opening_time: 5 ns\n', '');

/** Energy, peak and width that a text gives, by the same door as everything else. */
export function pulseOf(text: string): { energy: number; peak: number; width: number } {
  const pulse = analysed(text).prediction?.pulse;
  if (pulse === undefined) throw new Error('no pulse');
  return { energy: pulse.energy_J, peak: pulse.peak_power_W, width: pulse.width_fwhm_s };
}

export function analysed(text: string): Analysis {
  return analyse(text);
}

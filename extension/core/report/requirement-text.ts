import type { DimensionName } from '../quantity/dimension.ts';
import { formatQuantity } from '../quantity/format.ts';

const DIMENSION_OF: Readonly<Record<string, DimensionName>> = {
  pulse_energy: 'energy',
  pulse_width: 'time',
  peak_power: 'power',
  average_power: 'power',
  repetition_rate: 'frequency',
  build_up_time: 'time',
  first_pulse_energy: 'energy',
  timing_jitter: 'time',
  divergence: 'angle',
};

/** A requirement's name as it is spoken of: `hold-off margin`. */
export function requirementName(name: string): string {
  return name.replaceAll('_', ' ').replace('hold off', 'hold-off').replace('build up', 'build-up');
}

/** A value of a requirement (SI) in engineering units. */
export function formatRequirement(name: string, value: number): string {
  return formatQuantity(value, DIMENSION_OF[name] ?? 'ratio');
}

/** A requirement's limits: `8.00 mJ to 14.0 mJ`, `at most 12.0 ns`. */
export function formatLimits(name: string, minimum: number | undefined, maximum: number | undefined): string {
  const low = minimum === undefined ? '' : formatRequirement(name, minimum);
  const high = maximum === undefined ? '' : formatRequirement(name, maximum);
  if (low && high) return `${low} to ${high}`;
  return low ? `at least ${low}` : `at most ${high}`;
}

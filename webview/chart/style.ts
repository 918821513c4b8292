import type { Axis } from '../../extension/protocol/chart.ts';

export type { ChartTheme } from './theme.ts';

/** `Pulse energy (mJ)`. */
export function named({ label, unit }: Pick<Axis, 'label' | 'unit'>): string {
  return unit === '' ? label : `${label} (${unit})`;
}

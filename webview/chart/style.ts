import type { Axis } from '../../extension/protocol/chart.ts';
import type { ChartTheme } from './theme.ts';

/** `Pulse energy (mJ)`. */
export function named({ label, unit }: Pick<Axis, 'label' | 'unit'>): string {
  return unit === '' ? label : `${label} (${unit})`;
}

/** The box that shows the values pointed at. */
export function tooltipStyle(theme: ChartTheme) {
  return {
    backgroundColor: theme.surface,
    borderColor: theme.border,
    borderWidth: 1,
    titleColor: theme.text,
    bodyColor: theme.text,
    titleFont: { family: theme.font },
    bodyFont: { family: theme.font },
  };
}

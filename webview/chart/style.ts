import type { Axis } from '../../extension/protocol/chart.ts';
import type { ChartTheme } from './theme.ts';

/** What belongs to a pinned state is drawn in these dots, in every chart and in its legend. */
export const pinnedDash: readonly number[] = [2, 2];

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

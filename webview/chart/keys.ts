import type { Chart } from '../../extension/protocol/chart.ts';
import type { CanvasChart } from './canvas-chart.ts';
import { named } from './style.ts';

/** Arrow keys, Home and End go along a chart's values and say them; Escape and leaving end it. */
export function followKeys(
  box: HTMLElement,
  drawn: CanvasChart,
  chart: () => Chart | undefined,
  told: HTMLElement,
): void {
  let at: number | undefined;
  const go = (to: number | undefined): void => {
    const shown = chart();
    at = to === undefined || shown === undefined ? undefined : Math.max(0, Math.min(drawn.length - 1, to));
    drawn.point(at);
    told.textContent = at === undefined || shown === undefined ? '' : valuesAt(shown, at);
  };
  box.addEventListener('keydown', (event) => {
    const steps: Readonly<Record<string, number>> = { ArrowLeft: -1, ArrowUp: -1, ArrowRight: 1, ArrowDown: 1 };
    const step = steps[event.key];
    const first = event.key === 'ArrowRight' || event.key === 'ArrowDown' ? 0 : drawn.length - 1;
    if (step !== undefined) go(at === undefined ? first : at + step * (event.shiftKey ? 10 : 1));
    else if (event.key === 'Home') go(0);
    else if (event.key === 'End') go(drawn.length - 1);
    else if (event.key === 'Escape') go(undefined);
    else return;
    event.preventDefault();
  });
  box.addEventListener('blur', () => go(undefined));
}

function valuesAt(chart: Chart, index: number): string {
  if (chart.kind === 'bars') {
    const bar = chart.bars[index];
    if (bar === undefined) return '';
    const against = bar.limit === undefined ? '' : `, threshold ${bar.limit.toPrecision(3)}`;
    return `${bar.label}: ${bar.value.toPrecision(3)}${against} ${chart.axis.unit}`;
  }
  const { x, left, right, lines } = chart;
  const parts = lines.map(({ label, axis, values }) => {
    const { unit } = axis === 'left' ? left : right;
    return `${label} ${values[index]?.toPrecision(3) ?? ''} ${unit}`.trim();
  });
  return `${named(x)} ${x.values[index]?.toPrecision(3) ?? ''}: ${parts.join(', ')}`;
}

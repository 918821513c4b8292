import type { Chart, Plugin } from 'chart.js';
import type { LineChart } from '../../extension/protocol/chart.ts';
import { pinnedDash } from './style.ts';
import type { ChartTheme } from './theme.ts';

/**
 * Draws the curves of a pinned state behind those of `frame`, thin and dotted, in the frame's units.
 * They are no datasets: their points lie at other places, and pointing at the chart must tell values of one place.
 */
export function pinnedPlugin(pinned: LineChart, frame: LineChart, theme: ChartTheme): Plugin<'line'> {
  const across = pinned.x.scale / frame.x.scale;
  return {
    id: 'pinned',
    beforeDatasetsDraw(chart: Chart) {
      const { ctx, chartArea, scales } = chart;
      const x = scales['x'];
      if (x === undefined) return;
      ctx.save();
      ctx.beginPath();
      ctx.rect(chartArea.left, chartArea.top, chartArea.width, chartArea.height);
      ctx.clip();
      ctx.lineWidth = 1.25;
      ctx.setLineDash([...pinnedDash]);
      for (const { axis, values } of pinned.lines) {
        const y = scales[axis];
        if (y === undefined) continue;
        const up = pinned[axis].scale / frame[axis].scale;
        ctx.strokeStyle = theme[axis];
        ctx.beginPath();
        values.forEach((value, index) => {
          ctx.lineTo(x.getPixelForValue((pinned.x.values[index] ?? 0) * across), y.getPixelForValue(value * up));
        });
        ctx.stroke();
      }
      ctx.restore();
    },
  };
}

/** The highest pinned value on an axis, in the frame's unit: the axis must reach it. */
export function highestPinned(pinned: LineChart, frame: LineChart, axis: 'left' | 'right'): number {
  const up = pinned[axis].scale / frame[axis].scale;
  const values = pinned.lines.filter((line) => line.axis === axis).flatMap((line) => line.values);
  return Math.max(0, ...values) * up;
}

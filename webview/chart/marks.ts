import type { Chart, Plugin } from 'chart.js';
import type { Mark } from '../../extension/protocol/chart.ts';
import type { ChartTheme } from './theme.ts';

const dashes: Readonly<Record<Mark['kind'], readonly number[]>> = { present: [2, 3], optimum: [10, 3, 2, 3] };
const lineHeight = 15;

/** Draws marks as vertical lines, each with its label beside it and a dash of its own. */
export function marksPlugin(marks: readonly Mark[], theme: ChartTheme): Plugin<'line'> {
  return {
    id: 'marks',
    afterDatasetsDraw(chart: Chart) {
      const { ctx, chartArea, scales } = chart;
      const axis = scales['x'];
      if (axis === undefined) return;
      ctx.save();
      ctx.strokeStyle = theme.text;
      ctx.font = `11px ${theme.font}`;
      ctx.textBaseline = 'top';
      marks.forEach(({ kind, label, x }, index) => {
        const place = axis.getPixelForValue(x);
        if (place < chartArea.left - 1 || place > chartArea.right + 1) return;
        ctx.setLineDash([...dashes[kind]]);
        ctx.beginPath();
        ctx.moveTo(place, chartArea.top);
        ctx.lineTo(place, chartArea.bottom);
        ctx.stroke();
        const width = ctx.measureText(label).width;
        const before = place + width + 8 > chartArea.right;
        const left = Math.max(chartArea.left + 2, before ? place - width - 5 : place + 5);
        const top = chartArea.top + 3 + index * lineHeight;
        // On its own ground, so that no curve runs through the words.
        ctx.fillStyle = theme.ground;
        ctx.fillRect(left - 2, top - 1, width + 4, lineHeight - 1);
        ctx.fillStyle = theme.text;
        ctx.fillText(label, left, top);
      });
      ctx.restore();
    },
  };
}

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
      let top = chartArea.top + 3;
      for (const { kind, label, x } of marks) {
        const place = axis.getPixelForValue(x);
        if (place < chartArea.left - 1 || place > chartArea.right + 1) continue;
        ctx.setLineDash([...dashes[kind]]);
        ctx.beginPath();
        ctx.moveTo(place, chartArea.top);
        ctx.lineTo(place, chartArea.bottom);
        ctx.stroke();
        for (const line of linesOf(label, chartArea.width - 6, (words) => ctx.measureText(words).width)) {
          const width = ctx.measureText(line).width;
          const before = place + width + 8 > chartArea.right;
          const left = Math.max(chartArea.left + 2, before ? place - width - 5 : place + 5);
          // On its own ground, so that no curve runs through the words.
          ctx.fillStyle = theme.ground;
          ctx.fillRect(left - 2, top - 1, width + 4, lineHeight - 1);
          ctx.fillStyle = theme.text;
          ctx.fillText(line, left, top);
          top += lineHeight;
        }
      }
      ctx.restore();
    },
  };
}

/** A label in as many lines as it takes to keep inside the chart. */
function linesOf(label: string, room: number, widthOf: (words: string) => number): readonly string[] {
  const lines: string[] = [];
  for (const word of label.split(' ')) {
    const longer = `${lines.at(-1) ?? ''} ${word}`.trim();
    if (lines.length > 0 && widthOf(longer) <= room) lines[lines.length - 1] = longer;
    else lines.push(word);
  }
  return lines;
}

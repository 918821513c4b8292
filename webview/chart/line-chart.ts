import {
  Chart,
  type ChartConfiguration,
  LinearScale,
  LineController,
  LineElement,
  LogarithmicScale,
  PointElement,
  Tooltip,
} from 'chart.js';
import type { Axis, LineChart } from '../../extension/protocol/chart.ts';
import { createCanvasChart, type DrawnChart } from './canvas-chart.ts';
import { marksPlugin } from './marks.ts';
import { named, tooltipStyle } from './style.ts';
import type { ChartTheme } from './theme.ts';

type Point = { x: number; y: number };

/** Draws curves; `pinned` is the same chart of another state, drawn thin and dotted behind it. */
export function createLineChart(canvas: HTMLCanvasElement): DrawnChart {
  Chart.register(LineController, LineElement, PointElement, LinearScale, LogarithmicScale, Tooltip);
  const drawn = createCanvasChart<'line', Point[]>(canvas);
  return {
    ...drawn,
    get length() {
      return drawn.length;
    },
    show(chart, pinned) {
      if (chart.kind !== 'lines') return;
      const behind = pinned?.kind === 'lines' ? pinned : undefined;
      // Marks belong to one state: their plugin is made anew with the chart.
      drawn.clear();
      drawn.draw((theme) => configure(chart, behind, theme));
    },
  };
}

function configure(
  chart: LineChart,
  pinned: LineChart | undefined,
  theme: ChartTheme,
): ChartConfiguration<'line', Point[]> {
  const { x, left, right, marks } = chart;
  return {
    type: 'line',
    plugins: [marksPlugin(marks, theme)],
    data: { datasets: [...curves(chart, chart, theme), ...(pinned === undefined ? [] : curves(pinned, chart, theme))] },
    options: {
      animation: false,
      parsing: false,
      responsive: true,
      maintainAspectRatio: false,
      interaction: { mode: 'index', intersect: false },
      scales: {
        x: {
          ...axis(x, theme),
          type: x.logarithmic ? 'logarithmic' : 'linear',
          min: x.values[0] ?? 0,
          max: x.values.at(-1) ?? 1,
        },
        left: { ...axis(left, theme), type: 'linear', position: 'left', beginAtZero: true },
        right: {
          ...axis(right, theme),
          type: 'linear',
          position: 'right',
          beginAtZero: true,
          grid: { drawOnChartArea: false, color: theme.grid },
        },
      },
      plugins: {
        tooltip: {
          ...tooltipStyle(theme),
          callbacks: {
            title: (items) => `${named(x)}: ${items[0]?.parsed.x?.toPrecision(3) ?? ''}`,
            label: ({ dataset, parsed }) => `${dataset.label ?? ''}: ${parsed.y?.toPrecision(3) ?? ''}`,
          },
        },
      },
    },
  };
}

/** The curves of `drawn` in the units of `frame`. */
function curves(drawn: LineChart, frame: LineChart, theme: ChartTheme) {
  const isPinned = drawn !== frame;
  return drawn.lines.map(({ label, axis: side, values }) => {
    const across = drawn.x.scale / frame.x.scale;
    const up = drawn[side].scale / frame[side].scale;
    const data = values.map((y, index): Point => ({ x: (drawn.x.values[index] ?? 0) * across, y: y * up }));
    return {
      label: `${isPinned ? 'pinned: ' : ''}${label}${frame[side].unit === '' ? '' : ` (${frame[side].unit})`}`,
      data,
      yAxisID: side,
      borderColor: theme[side],
      borderWidth: isPinned ? 1 : theme.lineWidth,
      borderDash: isPinned ? [1, 3] : side === 'left' ? [] : [7, 4],
      pointRadius: 0,
      pointHitRadius: 8,
    };
  });
}

function axis(shown: Axis, theme: ChartTheme) {
  return {
    title: { display: true, text: named(shown), color: theme.text, font: { family: theme.font, size: 12 } },
    ticks: { color: theme.text, maxTicksLimit: 7, includeBounds: false, font: { family: theme.font, size: 11 } },
    grid: { color: theme.grid },
    border: { color: theme.text },
  };
}

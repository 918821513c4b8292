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
import { highestPinned, pinnedPlugin } from './pinned.ts';
import { named, tooltipStyle } from './style.ts';
import type { ChartTheme } from './theme.ts';

type Point = { x: number; y: number };

/** Draws curves; `pinned` is the same chart of another state, drawn behind them. */
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
  const reach = (side: 'left' | 'right') =>
    pinned === undefined ? {} : { suggestedMax: highestPinned(pinned, chart, side) };
  return {
    type: 'line',
    plugins: [...(pinned === undefined ? [] : [pinnedPlugin(pinned, chart, theme)]), marksPlugin(marks, theme)],
    data: { datasets: curves(chart, theme) },
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
        left: { ...axis(left, theme), ...reach('left'), type: 'linear', position: 'left', beginAtZero: true },
        right: {
          ...axis(right, theme),
          ...reach('right'),
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

function curves(chart: LineChart, theme: ChartTheme) {
  return chart.lines.map(({ label, axis: side, values }) => ({
    label: named({ label, unit: chart[side].unit }),
    data: values.map((y, index): Point => ({ x: chart.x.values[index] ?? 0, y })),
    yAxisID: side,
    borderColor: theme[side],
    borderWidth: theme.lineWidth,
    borderDash: side === 'left' ? [] : [7, 4],
    pointRadius: 0,
    // Points show where they are pointed at, each axis with a shape of its own.
    pointStyle: side === 'left' ? ('circle' as const) : ('rectRot' as const),
    pointHoverRadius: 5,
    pointHoverBackgroundColor: theme.ground,
    pointHoverBorderColor: theme[side],
    pointHoverBorderWidth: 2,
  }));
}

function axis(shown: Axis, theme: ChartTheme) {
  return {
    title: { display: true, text: named(shown), color: theme.text, font: { family: theme.font, size: 12 } },
    ticks: { color: theme.text, maxTicksLimit: 7, includeBounds: false, font: { family: theme.font, size: 11 } },
    grid: { color: theme.grid },
    border: { color: theme.text },
  };
}

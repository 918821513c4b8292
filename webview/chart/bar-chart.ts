import {
  BarController,
  BarElement,
  CategoryScale,
  Chart,
  type ChartConfiguration,
  LinearScale,
  type Plugin,
  Tooltip,
} from 'chart.js';
import type { Bar, BarChart } from '../../extension/protocol/chart.ts';
import { createCanvasChart, type DrawnChart } from './canvas-chart.ts';
import { named, tooltipStyle } from './style.ts';
import type { ChartTheme } from './theme.ts';

const longestLabel = 24;

/** Draws a bar a surface, its threshold as a solid mark and what keeps the wanted margin as a dashed one. */
export function createBarChart(canvas: HTMLCanvasElement): DrawnChart {
  Chart.register(BarController, BarElement, CategoryScale, LinearScale, Tooltip);
  const drawn = createCanvasChart<'bar', number[]>(canvas);
  return {
    ...drawn,
    get length() {
      return drawn.length;
    },
    show(chart) {
      if (chart.kind !== 'bars') return;
      drawn.clear();
      drawn.draw((theme) => configure(chart, theme));
    },
  };
}

function configure({ bars, axis }: BarChart, theme: ChartTheme): ChartConfiguration<'bar', number[]> {
  const most = Math.max(...bars.map(({ value, limit = 0 }) => Math.max(value, limit)));
  const text = { color: theme.text, font: { family: theme.font, size: 11 } };
  return {
    type: 'bar',
    plugins: [limitsPlugin(bars, theme)],
    data: {
      labels: bars.map(({ label }) => (label.length > longestLabel ? `${label.slice(0, longestLabel - 1)}…` : label)),
      datasets: [
        {
          label: named(axis),
          data: bars.map(({ value }) => value),
          backgroundColor: bars.map(({ verdict }) => (verdict === 'bad' ? theme.bad : theme.left)),
          borderColor: theme.text,
          borderWidth: 1,
          maxBarThickness: 22,
        },
      ],
    },
    options: {
      animation: false,
      indexAxis: 'y',
      responsive: true,
      maintainAspectRatio: false,
      interaction: { mode: 'index', axis: 'y', intersect: false },
      scales: {
        x: {
          beginAtZero: true,
          max: most * 1.05,
          title: { display: true, text: named(axis), ...text },
          ticks: { ...text, maxTicksLimit: 7, includeBounds: false },
          grid: { color: theme.grid },
        },
        y: { ticks: text, grid: { display: false } },
      },
      plugins: {
        tooltip: {
          ...tooltipStyle(theme),
          callbacks: {
            title: (items) => bars[items[0]?.dataIndex ?? -1]?.label ?? '',
            label: ({ dataIndex }) => told(bars[dataIndex], axis.unit),
          },
        },
      },
    },
  };
}

function told(bar: Bar | undefined, unit: string): string {
  if (bar === undefined) return '';
  const against = bar.limit === undefined ? '' : ` of ${bar.limit.toPrecision(3)}`;
  return `${bar.value.toPrecision(3)}${against} ${unit}`;
}

function limitsPlugin(bars: readonly Bar[], theme: ChartTheme): Plugin<'bar'> {
  return {
    id: 'limits',
    afterDatasetsDraw(chart) {
      const { ctx, scales } = chart;
      const across = scales['x'];
      if (across === undefined) return;
      ctx.save();
      ctx.strokeStyle = theme.text;
      ctx.lineWidth = 2;
      bars.forEach(({ limit, wanted }, index) => {
        const middle = chart.getDatasetMeta(0).data[index]?.y;
        if (middle === undefined) return;
        const mark = (value: number | undefined, dash: readonly number[]): void => {
          if (value === undefined) return;
          ctx.setLineDash([...dash]);
          ctx.beginPath();
          ctx.moveTo(across.getPixelForValue(value), middle - 14);
          ctx.lineTo(across.getPixelForValue(value), middle + 14);
          ctx.stroke();
        };
        mark(wanted, [3, 2]);
        mark(limit, []);
      });
      ctx.restore();
    },
  };
}

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
import { named, pinnedDash, tooltipStyle } from './style.ts';
import type { ChartTheme } from './theme.ts';

const longestLine = 20;

/** Draws a bar a surface, its threshold as a solid mark, what keeps the wanted margin as a dashed one, and the pinned value as a dotted line below. */
export function createBarChart(canvas: HTMLCanvasElement): DrawnChart {
  Chart.register(BarController, BarElement, CategoryScale, LinearScale, Tooltip);
  const drawn = createCanvasChart<'bar', number[]>(canvas);
  return {
    ...drawn,
    get length() {
      return drawn.length;
    },
    show(chart, pinned) {
      if (chart.kind !== 'bars') return;
      const before = pinned?.kind === 'bars' ? pinnedBars(pinned, chart) : [];
      drawn.clear();
      drawn.draw((theme) => configure(chart, before, theme));
    },
  };
}

/** The pinned value of each bar of `frame`, in its unit; nothing for a surface that was not there. */
function pinnedBars(pinned: BarChart, frame: BarChart): readonly (number | undefined)[] {
  const values = new Map(pinned.bars.map(({ label, value }) => [label, value]));
  const up = pinned.axis.scale / frame.axis.scale;
  return frame.bars.map(({ label }) => {
    const value = values.get(label);
    return value === undefined ? undefined : value * up;
  });
}

function configure(
  { bars, axis }: BarChart,
  before: readonly (number | undefined)[],
  theme: ChartTheme,
): ChartConfiguration<'bar', number[]> {
  const most = Math.max(...bars.map(({ value, limit = 0 }, index) => Math.max(value, limit, before[index] ?? 0)));
  const colours = bars.map(({ verdict }) => (verdict === 'bad' ? theme.bad : theme.left));
  const text = { color: theme.text, font: { family: theme.font, size: 11 } };
  return {
    type: 'bar',
    plugins: [limitsPlugin(bars, before, theme)],
    data: {
      labels: bars.map(({ label }) => twoLines(label)),
      datasets: [
        {
          label: named(axis),
          data: bars.map(({ value }) => value),
          backgroundColor: theme.hollow ? theme.ground : colours,
          borderColor: theme.hollow ? colours : theme.text,
          borderWidth: theme.hollow ? 2 : 1,
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
          // In lines of their own, so that a narrow page does not cut the words.
          title: { display: true, text: named(axis).split(/(?<=,) /), ...text },
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

/** A surface's name in two lines at most. */
function twoLines(label: string): string[] {
  const lines: string[] = [];
  for (const word of label.split(' ')) {
    const last = lines.at(-1);
    if (last !== undefined && `${last} ${word}`.length <= longestLine) lines[lines.length - 1] = `${last} ${word}`;
    else lines.push(word);
  }
  const [first = '', second, third] = lines;
  const cut = (line: string, isEnd: boolean): string =>
    isEnd && line.length <= longestLine ? line : `${line.slice(0, longestLine - 1)}…`;
  return second === undefined ? [cut(first, true)] : [cut(first, true), cut(second, third === undefined)];
}

function limitsPlugin(bars: readonly Bar[], before: readonly (number | undefined)[], theme: ChartTheme): Plugin<'bar'> {
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
        const pinned = before[index];
        if (pinned === undefined) return;
        ctx.setLineDash([...pinnedDash]);
        ctx.beginPath();
        ctx.moveTo(across.getPixelForValue(0), middle + 17);
        ctx.lineTo(across.getPixelForValue(pinned), middle + 17);
        ctx.stroke();
      });
      ctx.restore();
    },
  };
}

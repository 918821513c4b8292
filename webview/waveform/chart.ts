import {
  Chart,
  type ChartConfiguration,
  LinearScale,
  LineController,
  LineElement,
  PointElement,
  Tooltip,
} from 'chart.js';
import type { WaveformChart } from '../../extension/protocol/readout.ts';
import { type ChartTheme, chartTheme, onThemeChange } from './theme.ts';

type Point = { x: number; y: number };
type LineChart = Chart<'line', Point[]>;

export interface WaveformView {
  show(waveform: WaveformChart): void;
  clear(): void;
}

/** Draws into `canvas`, which must stand in a box of its own size. */
export function createChart(canvas: HTMLCanvasElement): WaveformView {
  Chart.register(LineController, LineElement, PointElement, LinearScale, Tooltip);
  let chart: LineChart | undefined;
  let shown: WaveformChart | undefined;

  const draw = (): void => {
    if (shown === undefined) return;
    const configuration = configure(shown, chartTheme());
    if (chart === undefined) {
      chart = new Chart(canvas, configuration);
      return;
    }
    chart.data = configuration.data;
    if (configuration.options !== undefined) chart.options = configuration.options;
    chart.update('none');
  };
  onThemeChange(draw);

  return {
    show(waveform) {
      shown = waveform;
      canvas.setAttribute('aria-label', waveform.summary);
      draw();
    },
    clear() {
      shown = undefined;
      chart?.destroy();
      chart = undefined;
    },
  };
}

function configure(waveform: WaveformChart, theme: ChartTheme): ChartConfiguration<'line', Point[]> {
  const { time, power, inversion, timeUnit, powerUnit } = waveform;
  const points = (values: readonly number[]): Point[] => values.map((y, index) => ({ x: time[index] ?? 0, y }));
  const line = { borderWidth: theme.lineWidth, pointRadius: 0, pointHitRadius: 8 };
  const powerName = `Output power (${powerUnit})`;
  return {
    type: 'line',
    data: {
      datasets: [
        { ...line, label: powerName, data: points(power), yAxisID: 'power', borderColor: theme.power },
        {
          ...line,
          label: 'Inversion (before = 1)',
          data: points(inversion),
          yAxisID: 'inversion',
          borderColor: theme.inversion,
          borderDash: [7, 4],
        },
      ],
    },
    options: {
      animation: false,
      parsing: false,
      responsive: true,
      maintainAspectRatio: false,
      interaction: { mode: 'index', intersect: false },
      scales: {
        x: { ...axis(`Time from peak (${timeUnit})`, theme), min: time[0] ?? 0, max: time.at(-1) ?? 1 },
        power: { ...axis(powerName, theme), position: 'left', beginAtZero: true },
        inversion: {
          ...axis('Inversion (before = 1)', theme),
          position: 'right',
          min: Math.min(0, ...inversion),
          max: 1,
          grid: { drawOnChartArea: false, color: theme.grid },
        },
      },
      plugins: {
        tooltip: {
          backgroundColor: theme.surface,
          borderColor: theme.border,
          borderWidth: 1,
          titleColor: theme.text,
          bodyColor: theme.text,
          titleFont: { family: theme.font },
          bodyFont: { family: theme.font },
          callbacks: { title: (items) => `${items[0]?.parsed.x?.toPrecision(3) ?? ''} ${timeUnit}` },
        },
      },
    },
  };
}

function axis(title: string, theme: ChartTheme) {
  return {
    type: 'linear' as const,
    title: { display: true, text: title, color: theme.text, font: { family: theme.font, size: 12 } },
    ticks: { color: theme.text, maxTicksLimit: 7, includeBounds: false, font: { family: theme.font, size: 11 } },
    grid: { color: theme.grid },
    border: { color: theme.text },
  };
}

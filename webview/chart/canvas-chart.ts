import { Chart, type ChartConfiguration, type ChartType } from 'chart.js';
import type { Chart as ChartData } from '../../extension/protocol/chart.ts';
import { type ChartTheme, chartTheme, onThemeChange } from './theme.ts';

/** A chart on a canvas of the page, drawn anew for every state and every theme. */
export interface CanvasChart {
  /** Places along the chart that the keyboard can go to. */
  readonly length: number;
  /** Shows the values at a place as if pointed at; nothing for undefined. */
  point(index: number | undefined): void;
  /** What is drawn, on the editor's ground, as a PNG's data URL. */
  picture(): string;
  clear(): void;
}

/** One that draws what the protocol calls a chart, if it is of its kind. */
export interface DrawnChart extends CanvasChart {
  show(chart: ChartData, pinned: ChartData | undefined): void;
}

type Configure<Type extends ChartType, Data extends unknown[]> = (theme: ChartTheme) => ChartConfiguration<Type, Data>;

/** `canvas` must stand in a box of its own size. `draw` is called for each new configuration, and again when the theme changes. */
export function createCanvasChart<Type extends ChartType, Data extends unknown[]>(
  canvas: HTMLCanvasElement,
): CanvasChart & { draw(configure: Configure<Type, Data>): void } {
  let chart: Chart<Type, Data> | undefined;
  let configuring: Configure<Type, Data> | undefined;

  const redraw = (): void => {
    if (configuring === undefined) return;
    const configuration = configuring(chartTheme());
    if (chart === undefined) {
      chart = new Chart(canvas, configuration);
      return;
    }
    chart.data = configuration.data;
    if (configuration.options !== undefined) chart.options = configuration.options;
    chart.update('none');
  };
  onThemeChange(redraw);

  return {
    get length() {
      return chart?.data.datasets[0]?.data.length ?? 0;
    },
    draw(configure) {
      configuring = configure;
      redraw();
    },
    point(index) {
      if (chart === undefined) return;
      const elements =
        index === undefined ? [] : chart.data.datasets.map((_, datasetIndex) => ({ datasetIndex, index }));
      const [first] = elements;
      const at = first && chart.getDatasetMeta(0).data[first.index];
      chart.tooltip?.setActiveElements(elements, { x: at?.x ?? 0, y: at?.y ?? 0 });
      chart.setActiveElements(elements);
      chart.update('none');
    },
    picture() {
      const copy = document.createElement('canvas');
      copy.width = canvas.width;
      copy.height = canvas.height;
      const context = copy.getContext('2d');
      if (context === null) return '';
      context.fillStyle = chartTheme().ground;
      context.fillRect(0, 0, copy.width, copy.height);
      context.drawImage(canvas, 0, 0);
      return copy.toDataURL('image/png');
    },
    clear() {
      configuring = undefined;
      chart?.destroy();
      chart = undefined;
    },
  };
}

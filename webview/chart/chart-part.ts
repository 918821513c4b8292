import type { Chart, ChartId } from '../../extension/protocol/chart.ts';
import { element, refill, section } from '../dom.ts';
import { button, checkbox } from '../ui/index.ts';
import { createBarChart } from './bar-chart.ts';
import { dataTable } from './data-table.ts';
import { followKeys } from './keys.ts';
import { legend } from './legend.ts';
import { createLineChart } from './line-chart.ts';

export interface ChartActions {
  tableShown(id: ChartId, shown: boolean): void;
  export(id: ChartId, format: 'csv' | 'svg'): void;
  picture(id: ChartId, data: string): void;
}

export interface ChartPart {
  readonly root: HTMLElement;
  /** Without a chart the box stays, empty and with the reason: the page keeps its layout. */
  show(chart: Chart | undefined, pinned: Chart | undefined, reason: string): void;
  /** What is shown belongs to an earlier text; the new one is being worked out. */
  wait(): void;
}

/** One chart with its legend, its exports, and on request its figures as a table. */
export function createChartPart(id: ChartId, heading: string, tableShown: boolean, actions: ChartActions): ChartPart {
  const { root, body } = section(`chart-${id}`, heading);
  const canvas = element('canvas', { role: 'img', 'aria-label': heading });
  const drawn = id === 'surfaces' ? createBarChart(canvas) : createLineChart(canvas);
  const empty = element('p', { class: 'empty' });
  const waiting = element('p', { class: 'waiting' });
  const key = element('div', {});
  const data = element('div', { id: `data-${id}`, hidden: '' });
  const told = element('p', { class: 'told', 'aria-live': 'polite' });
  let shown: Chart | undefined;
  let open = tableShown;

  const showTable = (): void => {
    data.hidden = !open || shown === undefined;
    if (data.hidden || shown === undefined) data.replaceChildren();
    else refill(data, dataTable(shown));
  };
  const toggle = checkbox({
    label: 'Data table',
    checked: tableShown,
    controls: data.id,
    onChange(checked) {
      open = checked;
      showTable();
      actions.tableShown(id, checked);
    },
  });
  const exports = [
    button({ label: 'CSV', title: `${heading}: save as CSV`, onPress: () => actions.export(id, 'csv') }),
    button({ label: 'SVG', title: `${heading}: save as SVG`, onPress: () => actions.export(id, 'svg') }),
    button({ label: 'PNG', title: `${heading}: save as PNG`, onPress: () => actions.picture(id, drawn.picture()) }),
  ];
  const tools = element('div', { class: 'tools' }, toggle, ...exports);
  const drawing = element('div', { class: 'chart', role: 'group', tabindex: '0' }, canvas, empty);
  followKeys(drawing, drawn, () => shown, told);
  body.append(element('div', { class: 'bar' }, key, tools), waiting, drawing, told, data);

  return {
    root,
    show(chart, pinned, reason) {
      shown = chart;
      root.classList.remove('stale');
      root.removeAttribute('aria-busy');
      waiting.textContent = '';
      told.textContent = '';
      canvas.hidden = chart === undefined;
      tools.hidden = chart === undefined;
      empty.hidden = chart !== undefined;
      empty.textContent = reason;
      canvas.setAttribute('aria-label', chart?.summary ?? reason);
      drawing.setAttribute('aria-label', chart === undefined ? heading : `${heading}. Arrow keys go along the values.`);
      const overlay = pinned?.kind === chart?.kind ? pinned : undefined;
      key.replaceChildren(...(chart === undefined ? [] : [legend(chart, overlay !== undefined)]));
      if (chart === undefined) drawn.clear();
      else drawn.show(chart, overlay);
      showTable();
    },
    wait() {
      if (shown === undefined) return;
      root.classList.add('stale');
      root.setAttribute('aria-busy', 'true');
      waiting.textContent = 'Of the previous text: the new curve is being worked out.';
    },
  };
}

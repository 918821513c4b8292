import type { WaveformChart } from '../../extension/protocol/readout.ts';
import { element, section } from '../dom.ts';
import { checkbox } from '../ui/index.ts';
import { createChart } from './chart.ts';
import { dataTable } from './data-table.ts';
import { legend } from './legend.ts';

export interface WaveformPart {
  readonly root: HTMLElement;
  /** Without a waveform the box stays, empty: the page keeps its layout. */
  show(waveform: WaveformChart | undefined): void;
}

/** The chart with its legend and, on request, its figures as a table. */
export function createWaveform(tableShown: boolean, onToggle: (shown: boolean) => void): WaveformPart {
  const { root, body } = section('waveform', 'Waveform');
  const canvas = element('canvas', { role: 'img', 'aria-label': 'No pulse is predicted.' });
  const chart = createChart(canvas);
  const empty = element('p', { class: 'empty' }, 'No pulse to draw');
  const data = element('div', { id: 'waveform-data' });
  let shown: WaveformChart | undefined;

  const showTable = (visible: boolean): void => {
    data.hidden = !visible || shown === undefined;
    data.replaceChildren(...(data.hidden || shown === undefined ? [] : [dataTable(shown)]));
  };
  let visible = tableShown;
  const toggle = checkbox({
    label: 'Data table',
    checked: tableShown,
    controls: data.id,
    onChange(checked) {
      visible = checked;
      showTable(checked);
      onToggle(checked);
    },
  });
  const drawing = element('div', { class: 'chart' }, canvas, empty);
  body.append(element('div', { class: 'bar' }, legend(), toggle), drawing, data);

  return {
    root,
    show(waveform) {
      shown = waveform;
      canvas.hidden = waveform === undefined;
      empty.hidden = waveform !== undefined;
      if (waveform === undefined) chart.clear();
      else chart.show(waveform);
      showTable(visible);
    },
  };
}

import type { Chart } from '../../extension/protocol/chart.ts';
import { element } from '../dom.ts';
import { pinnedDash } from './style.ts';

const svg = 'http://www.w3.org/2000/svg';

/** Text beside a sample of each line or mark, dashed as in the chart. */
export function legend(chart: Chart, pinned: boolean): HTMLElement {
  const entries =
    chart.kind === 'lines'
      ? [...chart.lines.map(({ label, axis }) => entry(axis, axis === 'left' ? '' : '7 4', 'M0 4h29', label))]
      : [
          entry('limit', '', 'M14 0v14', 'damage threshold'),
          entry('limit', '3 2', 'M14 0v14', 'keeps the wanted safety factor'),
        ];
  if (pinned) entries.push(entry('pinned', pinnedDash.join(' '), 'M0 4h29', 'as pinned'));
  return element('ul', { class: 'legend' }, ...entries);
}

function entry(name: string, dashes: string, path: string, label: string): HTMLElement {
  return element('li', {}, sample(name, dashes, path), label);
}

function sample(name: string, dashes: string, path: string): SVGSVGElement {
  const picture = document.createElementNS(svg, 'svg');
  picture.setAttribute('class', `sample ${name}`);
  picture.setAttribute('viewBox', `0 0 29 ${name === 'limit' ? 14 : 8}`);
  picture.setAttribute('aria-hidden', 'true');
  const line = document.createElementNS(svg, 'path');
  line.setAttribute('d', path);
  if (dashes !== '') line.setAttribute('stroke-dasharray', dashes);
  picture.append(line);
  return picture;
}

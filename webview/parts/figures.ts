import type { Figure, FigureGroup } from '../../extension/protocol/readout.ts';
import { element } from '../dom.ts';

const absent = '—';

/** The readings across the top: large digits, small unit. */
export function headline(figures: readonly Figure[]): HTMLElement {
  const cells = figures.map(({ label, value }) =>
    element('div', { class: 'reading' }, element('dt', {}, label), element('dd', {}, ...reading(value))),
  );
  return element('dl', { class: 'headline' }, ...cells);
}

function reading(value: string | undefined): readonly (Node | string)[] {
  if (value === undefined) return [element('span', { class: 'none' }, absent)];
  const space = value.lastIndexOf(' ');
  if (space < 0) return [value];
  return [value.slice(0, space), element('span', { class: 'unit' }, ` ${value.slice(space + 1)}`)];
}

export function groups(all: readonly FigureGroup[]): HTMLElement {
  return element('div', { class: 'groups' }, ...all.map(group));
}

function group({ name, figures }: FigureGroup): HTMLElement {
  const rows = figures.map(({ label, value }) =>
    element('div', { class: 'row' }, element('dt', {}, label), element('dd', {}, value ?? absent)),
  );
  return element('div', { class: 'group' }, element('h3', {}, name), element('dl', {}, ...rows));
}

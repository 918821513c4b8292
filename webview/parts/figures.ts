import type { Figure, FigureGroup, ReadoutState } from '../../extension/protocol/readout.ts';
import { element } from '../dom.ts';
import { change } from './change.ts';

const absent = '—';

/** Amounts by their labels, to compare with. */
export type Amounts = ReadonlyMap<string, number>;

export function amountsOf(state: ReadoutState | undefined): Amounts {
  const figures = [...(state?.headline ?? []), ...(state?.groups ?? []).flatMap((group) => group.figures)];
  return new Map(figures.flatMap(({ label, amount }) => (amount === undefined ? [] : [[label, amount] as const])));
}

/** The readings across the top: large digits, small unit. */
export function headline(figures: readonly Figure[], pinned: Amounts): HTMLElement {
  const cells = figures.map(({ label, value, amount }) =>
    element(
      'div',
      { class: 'reading' },
      element('dt', {}, label),
      element('dd', {}, ...reading(value)),
      ...against(change(amount, pinned.get(label))),
    ),
  );
  return element('dl', { class: 'headline' }, ...cells);
}

function against(changed: HTMLElement | undefined): readonly HTMLElement[] {
  return changed === undefined ? [] : [element('dd', { class: 'against' }, changed)];
}

function reading(value: string | undefined): readonly (Node | string)[] {
  if (value === undefined) return [element('span', { class: 'none' }, absent)];
  const space = value.lastIndexOf(' ');
  if (space < 0) return [value];
  return [value.slice(0, space), element('span', { class: 'unit' }, ` ${value.slice(space + 1)}`)];
}

export function groups(all: readonly FigureGroup[], pinned: Amounts): HTMLElement {
  return element('div', { class: 'groups' }, ...all.map((one) => group(one, pinned)));
}

function group({ name, figures }: FigureGroup, pinned: Amounts): HTMLElement {
  const rows = figures.map(({ label, value, amount }) => {
    const changed = change(amount, pinned.get(label));
    const shown = element('dd', {}, value ?? absent, ...(changed === undefined ? [] : [' ', changed]));
    return element('div', { class: 'row' }, element('dt', {}, label), shown);
  });
  return element('div', { class: 'group' }, element('h3', {}, name), element('dl', {}, ...rows));
}

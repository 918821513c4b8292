import type { ParameterRow } from '../../extension/protocol/readout.ts';
import { element, quantity, refill, scrolling } from '../dom.ts';

const absent = '—';

export interface ParametersPart {
  readonly root: HTMLElement;
  show(rows: readonly ParameterRow[]): void;
  /** Marks the row of a line of the text. */
  cursor(line: number): void;
}

/** What +1 % of each value does; a row's button goes to its line, and the line that is edited marks its row. */
export function createParameters(reveal: (line: number) => void): ParametersPart {
  const root = element('div', {});
  let rows: readonly { readonly line: number; readonly button: HTMLElement }[] = [];
  let at = 0;
  const mark = (): HTMLElement | undefined => {
    let marked: HTMLElement | undefined;
    for (const { line, button } of rows) {
      const row = button.closest('tr') ?? undefined;
      if (line === at) row?.setAttribute('aria-current', 'true');
      else row?.removeAttribute('aria-current');
      if (line === at) marked ??= row;
    }
    return marked;
  };
  const columns = [
    { heading: 'Value' },
    { heading: 'As written', numeric: true },
    { heading: 'Energy', numeric: true },
    { heading: 'Peak power', numeric: true },
    { heading: 'Width', numeric: true },
    { heading: 'Tightest margin', numeric: true },
  ];
  return {
    root,
    show(parameters) {
      rows = parameters.map(({ path, line }) => {
        const button = element(
          'button',
          { type: 'button', class: 'link', title: `Go to line ${line}` },
          ...breakable(path),
        );
        button.addEventListener('click', () => reveal(line));
        return { line, button };
      });
      const cells = parameters.map(({ value, energy, peak, width, margin }, index) => [
        rows[index]?.button,
        quantity(value),
        ...[energy, peak, width, margin].map((effect) => quantity(effect ?? absent)),
      ]);
      refill(root, scrolling('What +1 % of each value does to the pulse', columns, cells, 'sideways named'));
      mark();
    },
    cursor(line) {
      if (line === at) return;
      at = line;
      const row = mark();
      // Never away from a chart that is being watched: only while this table is what the page shows.
      const { top, bottom } = root.getBoundingClientRect();
      const middle = window.innerHeight / 2;
      if (top < middle && bottom > middle) row?.scrollIntoView({ block: 'nearest' });
    },
  };
}

/** A path that may continue on the next line between the words of its names. */
function breakable(path: string): readonly (Node | string)[] {
  return path.split(/(?<=[._])/).flatMap((name) => [name, element('wbr', {})]);
}

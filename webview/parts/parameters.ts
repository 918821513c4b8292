import type { ParameterRow } from '../../extension/protocol/readout.ts';
import { element, scrolling } from '../dom.ts';

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
  const mark = (): void => {
    for (const { line, button } of rows) {
      const row = button.closest('tr');
      if (line === at) row?.setAttribute('aria-current', 'true');
      else row?.removeAttribute('aria-current');
    }
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
        const button = element('button', { type: 'button', class: 'link', title: `Go to line ${line}` }, path);
        button.addEventListener('click', () => reveal(line));
        return { line, button };
      });
      const cells = parameters.map(({ value, energy, peak, width, margin }, index) => [
        rows[index]?.button,
        value,
        energy ?? absent,
        peak ?? absent,
        width ?? absent,
        margin ?? absent,
      ]);
      root.replaceChildren(scrolling('What +1 % of each value does to the pulse', columns, cells));
      mark();
    },
    cursor(line) {
      at = line;
      mark();
    },
  };
}

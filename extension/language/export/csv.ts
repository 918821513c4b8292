import type { Axis, Chart } from '../../protocol/chart.ts';

/** A chart's data as comma-separated values (RFC 4180): units in the header, points as decimal marks, CRLF at line ends. */
export function chartCsv(chart: Chart): string {
  if (chart.kind === 'bars') {
    const unit = chart.axis.unit.replace('²', '2');
    const head = [
      'surface',
      `peak_fluence_${name(unit)}`,
      `threshold_${name(unit)}`,
      `wanted_at_most_${name(unit)}`,
      'verdict',
    ];
    const rows = chart.bars.map(({ label, value, limit, wanted, verdict }) => [
      label,
      value,
      limit ?? '',
      wanted ?? '',
      verdict,
    ]);
    return csv([head, ...rows]);
  }
  const { x, left, right, lines } = chart;
  const head = [heading(x), ...lines.map(({ label, axis }) => heading({ ...(axis === 'left' ? left : right), label }))];
  return csv([head, ...x.values.map((value, index) => [value, ...lines.map(({ values }) => values[index] ?? '')])]);
}

export type Cell = string | number;

export function csv(rows: readonly (readonly Cell[])[]): string {
  return rows.map((row) => `${row.map(cell).join(',')}\r\n`).join('');
}

/** `Pulse width (FWHM)` in ns as `pulse_width_fwhm_ns`. */
function heading({ label, unit }: Axis): string {
  return [lowered(name(label)), name(unit)].filter((part) => part !== '').join('_');
}

function name(text: string): string {
  const words = text.replaceAll('%', 'percent').replaceAll('/', '_per_').replaceAll('µ', 'u');
  return words.replace(/[^A-Za-z0-9]+/g, '_').replace(/^_+|_+$/g, '');
}

function lowered(words: string): string {
  return words.charAt(0).toLowerCase() + words.slice(1).replace('FWHM', 'fwhm');
}

/** Text that a spreadsheet would take for a formula is kept text by an apostrophe. */
function cell(value: Cell): string {
  if (typeof value === 'number') return String(value);
  const safe = /^[=+\-@\t\r]/.test(value) ? `'${value}` : value;
  return /[",\r\n]/.test(safe) ? `"${safe.replaceAll('"', '""')}"` : safe;
}

import type { BarChart, Chart, LineChart } from '../../extension/protocol/chart.ts';
import { type Column, scrolling } from '../dom.ts';
import { named } from './style.ts';

/** Rows in the table: enough to follow a curve, few enough to read. */
const rowsWanted = 60;

/** The chart's figures as a table that scrolls in its own box, reachable by keyboard. */
export function dataTable(chart: Chart): HTMLElement {
  return chart.kind === 'lines' ? lineTable(chart) : barTable(chart);
}

function lineTable({ title, x, left, right, lines }: LineChart): HTMLElement {
  const step = Math.max(1, Math.ceil(x.values.length / rowsWanted));
  const [first] = lines;
  const top = first === undefined ? 0 : first.values.indexOf(Math.max(...first.values));
  // The highest value is what people look for: its row is there in any case.
  const kept = x.values.map((_, index) => index).filter((index) => index === top || index % step === 0);
  const columns: Column[] = [
    { heading: named(x), numeric: true },
    ...lines.map(({ label, axis }) => ({
      heading: named({ label, unit: (axis === 'left' ? left : right).unit }),
      numeric: true,
    })),
  ];
  const rows = kept.map((index) => [digits(x.values[index]), ...lines.map(({ values }) => digits(values[index]))]);
  return scrolling(`${title}: data`, columns, rows, 'scroll');
}

function barTable({ title, axis, bars }: BarChart): HTMLElement {
  const columns: Column[] = [
    { heading: 'Surface' },
    { heading: named(axis), numeric: true },
    { heading: 'Threshold', numeric: true },
    { heading: 'Wanted at most', numeric: true },
  ];
  const rows = bars.map(({ label, value, limit, wanted }) => [label, digits(value), digits(limit), digits(wanted)]);
  return scrolling(`${title}: data`, columns, rows, 'scroll');
}

function digits(value: number | undefined): string {
  if (value === undefined) return '—';
  const size = Math.abs(value);
  if (size === 0 || size >= 1e4) return String(Math.round(value)).replace('-', '−');
  return (size >= 1e-3 ? value.toPrecision(4) : value.toExponential(2)).replaceAll('-', '−');
}

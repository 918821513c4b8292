import type { WaveformChart } from '../../extension/protocol/readout.ts';
import { scrolling } from '../dom.ts';

/** Rows in the table: enough to follow the pulse, few enough to read. */
const rowsWanted = 60;

/** The chart's figures as a table that scrolls in its own box, reachable by keyboard. */
export function dataTable(waveform: WaveformChart): HTMLElement {
  const { time, power, inversion, timeUnit, powerUnit } = waveform;
  const step = Math.max(1, Math.ceil(time.length / rowsWanted));
  const peak = power.indexOf(Math.max(...power));
  const rows = time.flatMap((instant, index) =>
    index === peak || (index % step === 0 && Math.abs(index - peak) >= step / 2)
      ? [[digits(instant), digits(power[index]), digits(inversion[index])]]
      : [],
  );
  const columns = [
    { heading: `Time (${timeUnit})`, numeric: true },
    { heading: `Power (${powerUnit})`, numeric: true },
    { heading: 'Inversion', numeric: true },
  ];
  const label = 'Waveform data: time from the peak, output power, inversion';
  return scrolling(label, columns, rows, 'scroll');
}

function digits(value: number | undefined): string {
  return value === undefined ? '—' : value.toFixed(3);
}

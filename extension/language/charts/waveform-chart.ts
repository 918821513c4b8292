import { type Analysis, waveform } from '../../core/analyse.ts';
import type { LineChart } from '../../protocol/chart.ts';
import { inDisplayUnit } from '../display-units.ts';
import { headlineFigures } from '../figures.ts';

/** Enough that the curve looks smooth on a wide screen. */
const POINTS = 301;

/** Output power and inversion over time; undefined without a pulse. */
export function waveformChart(analysis: Analysis): LineChart | undefined {
  const course = analysis.prediction?.pulse && waveform(analysis, POINTS);
  if (course === undefined || course.time_s.length === 0) return undefined;
  const time = inDisplayUnit(course.time_s, 's');
  const power = inDisplayUnit(course.power_W, 'W');
  const [energy, peak, width] = headlineFigures(analysis.prediction).map(({ value }) => value ?? 'not predicted');
  const left = course.inversion.at(-1);
  const remaining =
    left === undefined ? '' : ` The gain falls to ${(left * 100).toFixed(0)} % of its value before the pulse.`;
  return {
    kind: 'lines',
    id: 'waveform',
    title: 'Waveform',
    x: { label: 'Time from the peak', unit: time.unit, scale: time.scale, values: time.values, logarithmic: false },
    left: { label: 'Output power', unit: power.unit, scale: power.scale },
    right: { label: 'Inversion', unit: '', scale: 1 },
    lines: [
      { label: 'Output power', axis: 'left', values: power.values },
      { label: 'Inversion', axis: 'right', values: course.inversion.map((value) => Number(value.toFixed(5))) },
    ],
    marks: [],
    summary: `Pulse waveform: output power rises to ${peak}, ${width} wide at half maximum, ${energy} in all.${remaining}`,
  };
}

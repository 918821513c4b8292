import { failuresOf } from '../../core/explore/goals.ts';
import type { Outcome } from '../../core/physics/predict.ts';
import { DIMENSIONS } from '../../core/quantity/dimension.ts';
import { formatPercent, formatQuantity } from '../../core/quantity/format.ts';
import type { Axis, LineChart, Mark } from '../../protocol/chart.ts';
import { type DisplaySeries, inDisplayUnit } from '../display-units.ts';
import { show } from '../show.ts';
import type { Curve } from './curves.ts';

/** A value of a curve with what the design would do there; only values that give a pulse are kept. */
export interface Point {
  /** SI. */
  readonly value: number;
  readonly outcome: Outcome;
}

/** Relative difference of energy below which a higher repetition rate is the better choice. */
const AS_GOOD = 1e-3;

/**
 * Energy and width over a swept value. The optimum is that of the output coupling where the curve is over reflectivity
 * (`optimum`); elsewhere it is the point of most energy at which nothing fails (requirements, wanted margins, hold-off),
 * and among rates whose energies differ by less than 0.1 % the highest.
 */
export function curveChart(curve: Curve, points: readonly Point[], optimum: number | undefined): LineChart | undefined {
  const energies = points.map(({ outcome }) => outcome.figures.pulse?.energy_J ?? 0);
  const widths = points.map(({ outcome }) => outcome.figures.pulse?.width_fwhm_s ?? 0);
  if (points.length < 2) return undefined;
  const x = axisSeries(
    curve,
    points.map(({ value }) => value),
  );
  const energy = inDisplayUnit(energies, 'J');
  const width = inDisplayUnit(widths, 's');
  const best = curve.id === 'reflectivity' ? optimum : bestWithoutFailure(curve, points);
  const word = curve.id === 'reflectivity' ? 'optimum' : 'best without a failed check';
  const marks: Mark[] = [
    { kind: 'present', label: `present ${shown(curve, curve.present)}`, x: curve.present / x.scale },
    ...(best === undefined
      ? []
      : [{ kind: 'optimum' as const, label: `${word} ${shown(curve, best)}`, x: best / x.scale }]),
  ];
  return {
    kind: 'lines',
    id: curve.id,
    title: curve.title,
    x: { label: curve.label, unit: x.unit, scale: x.scale, values: x.values, logarithmic: curve.logarithmic },
    left: axis('Pulse energy', energy),
    right: axis('Pulse width (FWHM)', width),
    lines: [
      { label: 'Pulse energy', axis: 'left', values: energy.values },
      { label: 'Pulse width (FWHM)', axis: 'right', values: width.values },
    ],
    marks,
    summary: summary(curve, points, energies, marks),
  };
}

function axis(label: string, { unit, scale }: DisplaySeries): Axis {
  return { label, unit, scale };
}

function axisSeries({ percent, dimension }: Curve, values: readonly number[]): DisplaySeries {
  if (percent) return { unit: '%', scale: 0.01, values: values.map((value) => Number((value * 100).toPrecision(6))) };
  return inDisplayUnit(values, DIMENSIONS[dimension].siUnit);
}

function shown({ percent, dimension }: Curve, value: number): string {
  return percent ? formatPercent(value) : formatQuantity(value, dimension);
}

/** SI. */
function bestWithoutFailure({ id }: Curve, points: readonly Point[]): number | undefined {
  const sound = points.flatMap(({ value, outcome }) => {
    const energy = outcome.figures.pulse?.energy_J;
    return energy === undefined || failuresOf(outcome).length > 0 ? [] : [{ value, energy }];
  });
  const most = Math.max(...sound.map(({ energy }) => energy));
  const best = sound.filter(({ energy }) => energy >= most * (id === 'repetition_rate' ? 1 - AS_GOOD : 1));
  return best.at(-1)?.value;
}

function summary(curve: Curve, points: readonly Point[], energies: readonly number[], marks: readonly Mark[]): string {
  const [first, last] = [points[0], points.at(-1)];
  const present = points.find(({ value }) => value === curve.present)?.outcome.figures.pulse;
  const range = first && last ? `from ${shown(curve, first.value)} to ${shown(curve, last.value)}` : '';
  const least = show(Math.min(...energies), 'energy');
  const most = show(Math.max(...energies), 'energy');
  const here = present
    ? ` At present, ${shown(curve, curve.present)}: ${show(present.energy_J, 'energy')}, ${show(present.width_fwhm_s, 'time')}.`
    : '';
  const optimum = marks.find(({ kind }) => kind === 'optimum')?.label;
  const best = optimum === undefined ? '' : ` ${optimum.charAt(0).toUpperCase()}${optimum.slice(1)}.`;
  return `${curve.title}, ${range}: energy between ${least} and ${most}.${here}${best}`;
}

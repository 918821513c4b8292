import type { Analysis } from '../../core/analyse.ts';
import { allows, parameterAt } from '../../core/explore/parameters.ts';
import type { DimensionName } from '../../core/quantity/dimension.ts';
import type { ChartId } from '../../protocol/chart.ts';

/** A value of the design to be swept over a range. */
export interface Curve {
  readonly id: ChartId;
  readonly title: string;
  readonly label: string;
  readonly path: string;
  readonly dimension: DimensionName;
  /** Shown as a percentage. */
  readonly percent: boolean;
  readonly logarithmic: boolean;
  /** SI. */
  readonly present: number;
  /** SI, ascending, the present value among them. */
  readonly values: readonly number[];
}

const POINTS = 40;

/** Output reflectivity, pump and repetition rate over the ranges that an engineer would ask about; what can't be is left out. */
export function curvesOf(analysis: Analysis): readonly Curve[] {
  const reflectivity = curve(analysis, 'resonator.output_reflectivity', reflectivities, {
    id: 'reflectivity',
    title: 'Energy and width against output reflectivity',
    label: 'Output reflectivity',
    dimension: 'ratio',
    percent: true,
    logarithmic: false,
  });
  const diode = parameterAt(analysis, 'pump.diode.current') !== undefined;
  const pump = curve(analysis, diode ? 'pump.diode.current' : 'pump.power', (present) => upToTwice(analysis, present), {
    id: 'pump',
    title: `Energy and width against ${diode ? 'diode current' : 'pump power'}`,
    label: diode ? 'Diode current' : 'Pump power',
    dimension: diode ? 'current' : 'power',
    percent: false,
    logarithmic: false,
  });
  const rate = curve(analysis, 'q_switch.repetition_rate', (present) => decades(analysis, present), {
    id: 'repetition_rate',
    title: 'Energy and width against repetition rate',
    label: 'Repetition rate',
    dimension: 'frequency',
    percent: false,
    logarithmic: true,
  });
  return [reflectivity, pump, rate].filter((one) => one !== undefined);
}

function curve(
  analysis: Analysis,
  path: string,
  range: (present: number) => readonly number[],
  rest: Omit<Curve, 'path' | 'present' | 'values'>,
): Curve | undefined {
  const present = parameterAt(analysis, path)?.value;
  if (present === undefined) return undefined;
  const values = [...range(present).filter((value) => allows(analysis.design, path, value)), present];
  return { ...rest, path, present, values: [...new Set(values)].sort((a, b) => a - b) };
}

/** From 2 % to 98 %, and closer towards 100 %, where low-gain modules live. */
function reflectivities(): readonly number[] {
  const even = Array.from({ length: POINTS }, (_, index) => 0.02 + (0.96 * index) / (POINTS - 1));
  return [...even, 0.985, 0.99, 0.995];
}

/** From a twentieth of the pump to twice of it; a diode's current counts from its threshold. */
function upToTwice({ design }: Analysis, present: number): readonly number[] {
  const { diode } = design.values.pump ?? {};
  const from = diode?.threshold_current?.value ?? 0;
  return Array.from({ length: POINTS }, (_, index) => from + ((present - from) * (2 * (index + 1))) / POINTS);
}

/** A decade to either side, as long as pumping, opening and gate fit into the period. */
function decades({ outcome, design }: Analysis, present: number): readonly number[] {
  const { pump, qSwitch } = outcome?.cavity.module ?? {};
  const gate = design.values.q_switch?.gate?.value ?? 0;
  const busy = pump?.kind === 'pulsed' ? Math.max(pump.duration ?? 0, qSwitch?.opensAt ?? 0) + gate : gate;
  return Array.from({ length: POINTS + 1 }, (_, index) => present * 10 ** ((2 * index) / POINTS - 1)).filter(
    (rate) => rate * busy < 1,
  );
}

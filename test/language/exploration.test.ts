import { describe, expect, test } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import { exploration } from '../../extension/language/exploration/exploration.ts';
import type { LineChart } from '../../extension/protocol/chart.ts';
import { isExplorationState } from '../../extension/protocol/guard.ts';
import { demo, pulseOf } from '../explore/designs.ts';
import { bench } from './bench.ts';

const always = async () => true;
const explored = async (text: string) => exploration(bench(text).subject, always);

async function chartOf(text: string, id: string): Promise<LineChart> {
  const chart = (await explored(text))?.charts.find((one) => one.id === id);
  if (chart?.kind !== 'lines') throw new Error(`no ${id}`);
  return chart;
}

const SWEPT = [
  ['reflectivity', '50 % ± 2 %', (value: number) => `${value} % ± 2 %`],
  ['pump', '600 W ± 3 %', (value: number) => `${value} W`],
  ['repetition_rate', '20 Hz', (value: number) => `${value} Hz`],
] as const;

describe.each(SWEPT)('the curve over %s', (id, before, after) => {
  test('is what the edited text predicts', async () => {
    const { x, lines, left, right } = await chartOf(demo, id);
    const unit = id === 'reflectivity' ? 0.01 : 1;
    let compared = 0;
    for (const [index, value] of x.values.entries()) {
      if (index % 9 !== 0) continue;
      const { energy, width } = pulseOf(demo.replace(before, after((value * x.scale) / unit)));
      expect((lines[0]?.values[index] ?? 0) * left.scale).toBeCloseTo(energy, 7);
      expect(((lines[1]?.values[index] ?? 0) * right.scale) / width).toBeCloseTo(1, 4);
      compared += 1;
    }
    expect(compared).toBeGreaterThan(2);
  });

  test('marks the present point, which lies on it', async () => {
    const { x, marks, lines, left, summary } = await chartOf(demo, id);
    const present = marks.find(({ kind }) => kind === 'present');
    const at = x.values.findIndex((value) => Math.abs(value - (present?.x ?? -1)) < 1e-6 * value);
    expect((lines[0]?.values[at] ?? 0) * left.scale).toBeCloseTo(pulseOf(demo).energy, 7);
    expect(summary).toContain('At present');
    expect(x.values.every((value, index) => index === 0 || value > x.values[index - 1]!)).toBe(true);
  });
});

test('the optimum coupler is the top of the curve', async () => {
  const { x, lines, marks } = await chartOf(demo, 'reflectivity');
  const energies = lines[0]?.values ?? [];
  const top = energies.indexOf(Math.max(...energies));
  const optimum = marks.find(({ kind }) => kind === 'optimum')?.x ?? 0;
  expect(optimum).toBeGreaterThan(x.values[top - 1]!);
  expect(optimum).toBeLessThan(x.values[top + 1]!);
});

test('the best pump is the strongest at which nothing fails', async () => {
  const { x, marks } = await chartOf(demo, 'pump');
  const best = marks.find(({ kind }) => kind === 'optimum')?.x ?? 0;
  const failsAt = (watts: number) =>
    analyse(demo.replace('600 W ± 3 %', `${watts * x.scale} W`)).problems.some(
      ({ severity }) => severity !== 'information',
    );
  const at = x.values.findIndex((value) => Math.abs(value - best) < 1e-9);
  expect(failsAt(best)).toBe(false);
  expect(failsAt(x.values[at + 1]!)).toBe(true);
});

test('where every point fails there is no best one', async () => {
  const { marks, summary } = await chartOf(demo.replace('min: 8 mJ, max: 14 mJ', 'max: 14 uJ'), 'pump');
  expect(marks.map(({ kind }) => kind)).toEqual(['present']);
  expect(summary).not.toContain('best');
});

test('with diodes the curve is over their current, from above their threshold', async () => {
  const diodes = 'diode: { current: 90 A, threshold_current: 12 A, slope_efficiency: 1.1 W/A, count: 7 }';
  const { x } = await chartOf(demo.replace('power: 600 W ± 3 %', diodes), 'pump');
  expect([x.label, x.unit]).toEqual(['Diode current', 'A']);
  expect(x.values[0]).toBeGreaterThan(12);
});

test('rates end where pump, delay and gate fill the period', async () => {
  const fast = demo.replace('20 Hz', '2 kHz').replace('average_power: { min: 150 mW }', 'average_power: { min: 1 mW }');
  const { x } = await chartOf(fast, 'repetition_rate');
  expect(x.logarithmic).toBe(true);
  expect(Math.max(...x.values) * x.scale * 210e-6).toBeLessThan(1);
});

describe('parameters', () => {
  test('are the values that move the pulse, in the order of the file, each with its line', async () => {
    const { parameters = [] } = (await explored(demo)) ?? {};
    const lines = parameters.map(({ line }) => line);
    expect(lines).toEqual([...lines].sort((a, b) => a - b));
    const power = parameters.find(({ path }) => path === 'pump.power');
    expect(power).toMatchObject({ value: '600 W ± 3 %', energy: '+1.9 %' });
    expect(demo.split('\n')[(power?.line ?? 0) - 1]).toContain('power: 600 W');
    expect(parameters.map(({ path }) => path)).not.toContain('q_switch.gate');
    // Of the surfaces only the tightest one's own values move the tightest margin.
    expect(
      parameters.filter(({ path }) => path.startsWith('surfaces[')).every(({ path }) => path.startsWith('surfaces[1]')),
    ).toBe(true);
  });
});

test('the whole of it passes the guard, also after JSON', async () => {
  expect(isExplorationState(JSON.parse(JSON.stringify(await explored(demo))))).toBe(true);
});

test('without a pulse there is none', async () => {
  expect(await explored('')).toBeUndefined();
  expect(await explored(demo.replace('600 W', '6 W'))).toBeUndefined();
});

test('it stops as soon as it is no longer wanted', async () => {
  let asked = 0;
  const result = await exploration(bench(demo).subject, async () => {
    asked += 1;
    return asked < 3;
  });
  expect(result).toBeUndefined();
  expect(asked).toBe(3);
});

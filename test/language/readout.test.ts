import { describe, expect, test } from 'vitest';
import { inDisplayUnit } from '../../extension/language/display-units.ts';
import { failedReadout, readout } from '../../extension/language/readout.ts';
import { raised, show } from '../../extension/language/show.ts';
import { isReadoutState } from '../../extension/protocol/guard.ts';
import { bench, transmitter } from './bench.ts';

const readoutOf = (text: string) => readout(bench(text).subject);

function waveformOf(text: string) {
  const [chart] = readoutOf(text).charts;
  if (chart?.kind !== 'lines' || chart.id !== 'waveform') return undefined;
  const [power, inversion] = chart.lines;
  return { chart, time: chart.x.values, power: power?.values ?? [], inversion: inversion?.values ?? [] };
}

describe('a readout', () => {
  test('has the figures in words, and the chart in display units', () => {
    const state = readoutOf(transmitter);
    expect(isReadoutState(state)).toBe(true);
    expect(state.absence).toBeUndefined();
    expect(state.headline.map(({ label }) => label)).toEqual([
      'Pulse energy',
      'Peak power',
      'Pulse width (FWHM)',
      'Average power',
    ]);
    const { chart, time, power, inversion } = waveformOf(transmitter)!;
    expect([chart.x.unit, chart.left.unit]).toEqual(['ns', 'MW']);
    const peak = Math.max(...power);
    expect(show(peak * 1e6, 'power')).toBe(state.headline[1]?.value);
    expect(time[power.indexOf(peak)]).toBeCloseTo(0, 0);
    expect(inversion[0]).toBeLessThanOrEqual(1);
    expect(chart.summary).toContain(state.headline[1]?.value);
  });

  test('gives every figure in SI too, as the prediction has it', () => {
    const { pulse } = bench(transmitter).subject.analysis.prediction ?? {};
    expect(
      readoutOf(transmitter)
        .headline.slice(0, 3)
        .map(({ amount }) => amount),
    ).toEqual([pulse?.energy_J, pulse?.peak_power_W, pulse?.width_fwhm_s]);
  });

  test('shows fluence against threshold, hot spots counted', () => {
    const chart = readoutOf(transmitter).charts.find(({ id }) => id === 'surfaces');
    const [surface] = bench(transmitter).subject.analysis.prediction?.surfaces ?? [];
    expect(chart?.kind === 'bars' && chart.bars[0]?.value).toBeCloseTo((surface?.peak_fluence_J_per_cm2 ?? 0) * 1.5, 4);
    expect(chart?.kind === 'bars' && chart.bars[0]?.limit).toBeCloseTo(surface?.threshold_J_per_cm2 ?? 0, 4);
    expect(chart?.kind === 'bars' && chart.bars[0]?.wanted).toBeCloseTo((surface?.threshold_J_per_cm2 ?? 0) / 2, 4);
  });

  test('lists what is accepted with its reason, still judged as it is', () => {
    const text = transmitter
      .replace('hot_spot_factor: 1.5', 'hot_spot_factor: 6')
      .replace('beam_radius: 0.9 mm', 'beam_radius: 0.9 mm # accept fluence-over-threshold: sacrificial');
    const state = readoutOf(text);
    expect(state.problems[0]).toMatchObject({ severity: 'information', accepted: 'sacrificial' });
    expect(state.surfaces[0]?.verdict).toBe('bad');
  });

  test('judges surfaces as their findings do', () => {
    const verdictWith = (hotSpot: string, safety: string) =>
      readoutOf(
        transmitter
          .replace('hot_spot_factor: 1.5', `hot_spot_factor: ${hotSpot}`)
          .replace('safety_factor: 2', `safety_factor: ${safety}`),
      ).surfaces[0]?.verdict;
    expect(verdictWith('1.5', '2')).toBe('good');
    expect(verdictWith('1.5', '4')).toBe('look');
    expect(verdictWith('6', '2')).toBe('bad');
  });

  test('judges requirements: met, missed, not predicted', () => {
    const text = transmitter
      .replace('max: 12 ns', 'max: 5 ns')
      .replace('peak_power: { min: 0.7 MW }', 'timing_jitter: { max: 1 ns }');
    const verdicts = Object.fromEntries(readoutOf(text).requirements.map(({ name, verdict }) => [name, verdict]));
    expect(verdicts).toEqual({ 'Pulse energy': 'good', 'Pulse width': 'bad', 'Timing jitter': 'unknown' });
  });

  test('without a pulse says what to mend, on which line, and keeps the headline', () => {
    const state = readoutOf(
      transmitter.replace('length: 60 mm', 'length: 60').replace('power: 600 W', 'power: 600 mm'),
    );
    expect(state.absence).toMatch(/^No pulse is predicted: .*length.*\(and 1 more error, below\)$/);
    expect(state.problems.map(({ line }) => line)).toEqual([6, 14]);
    expect(state.headline).toHaveLength(4);
    expect(state.headline.some(({ value }) => value !== undefined)).toBe(false);
    expect(isReadoutState(state)).toBe(true);
  });

  test('below threshold says that nothing is emitted', () => {
    const state = readoutOf(transmitter.replace('power: 600 W', 'power: 6 W'));
    expect(state.absence).toMatch(/^No pulse is predicted: /);
    expect(state.charts).toEqual([]);
    expect(isReadoutState(state)).toBe(true);
  });

  test.each(['', 'format: 1', '\u0000', '[[[[', 'title: 7'])('of %j is a whole state', (text) => {
    const state = readoutOf(text);
    expect(isReadoutState(state)).toBe(true);
    expect(state.absence).toBeDefined();
  });

  test('after a fault of ours shows the fault and no figure', () => {
    const state = failedReadout({ uri: 'file:///a%20b.gainmodule.yaml', version: 2, failure: 'a mirror fell off' });
    expect(isReadoutState(state)).toBe(true);
    expect(state.title).toBe('a b.gainmodule.yaml');
    expect(state.absence).toContain('a mirror fell off');
  });
});

describe('display units', () => {
  test.each([
    [[0, 1.2e6], 'W', 'MW', 1e6, [0, 1.2]],
    [[-2e-8, 0, 4e-8], 's', 'ns', 1e-9, [-20, 0, 40]],
    [[3e-13], 's', 'fs', 1e-15, [300]],
    [[999.9], 'W', 'W', 1, [999.9]],
    [[0, 0], 'W', 'W', 1, [0, 0]],
  ])('%j %s', (values, unit, shown, scale, scaled) => {
    expect(inDisplayUnit(values, unit)).toEqual({ unit: shown, scale, values: scaled });
  });

  test('a series of very small numbers keeps its digits', () => {
    const { values } = inDisplayUnit([1.23456e-21, 0.5e-21], 's');
    expect(values.every((value) => Number.isFinite(value))).toBe(true);
  });
});

test('exponents in units are raised, numbers and names are left as they are', () => {
  expect(raised('2.06 J/cm2')).toBe('2.06 J/cm²');
  expect(raised('1.38e20 cm-3')).toBe('1.38e20 cm⁻³');
  expect(raised('2.8e-19 cm2')).toBe('2.8e-19 cm²');
  expect(raised('50 %')).toBe('50 %');
});

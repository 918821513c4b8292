import { describe, expect, test } from 'vitest';
import { exported } from '../../extension/language/export/exported.ts';
import { linearScale, logarithmicScale } from '../../extension/language/export/ticks.ts';
import { chartIds } from '../../extension/protocol/chart.ts';
import type { ExportParams } from '../../extension/protocol/requests.ts';
import { demo } from '../explore/designs.ts';
import { bench } from './bench.ts';

const odd = demo.replace('exit window', '"=1+1, <exit> & \\"window\\""');
const uri = 'file:///a';
const text = async (params: ExportParams, design = demo) =>
  (await exported(bench(design).subject, params, async () => true)) ?? '';

describe('comma-separated values', () => {
  test('have units in the header, and every row as many cells', async () => {
    const headers: Record<string, string> = {};
    for (const what of chartIds) {
      const rows = (await text({ uri, what, format: 'csv' })).split('\r\n');
      expect(rows.at(-1)).toBe('');
      headers[what] = rows[0] ?? '';
      if (what !== 'surfaces') expect(new Set(rows.slice(0, -1).map((row) => row.split(',').length)).size).toBe(1);
    }
    expect(headers).toEqual({
      waveform: 'time_from_the_peak_ns,output_power_MW,inversion',
      reflectivity: 'output_reflectivity_percent,pulse_energy_mJ,pulse_width_fwhm_ns',
      pump: 'pump_power_kW,pulse_energy_mJ,pulse_width_fwhm_ns',
      repetition_rate: 'repetition_rate_Hz,pulse_energy_mJ,pulse_width_fwhm_ns',
      surfaces: 'surface,peak_fluence_J_per_cm2,threshold_J_per_cm2,wanted_at_most_J_per_cm2,verdict',
    });
  });

  test('the waveform integrates to the energy', async () => {
    const rows = (await text({ uri, what: 'waveform', format: 'csv' })).trim().split('\r\n').slice(1);
    const points = rows.map((row) => row.split(',').map(Number));
    const energy = points.reduce((sum, [time = 0, power = 0], index) => {
      const [before = time, last = power] = points[index - 1] ?? [];
      return sum + ((time - before) * (power + last)) / 2;
    }, 0);
    // ns times MW are mJ; the last half per cent lies in the tail and between the points.
    expect(energy).toBeCloseTo((bench(demo).subject.analysis.prediction?.pulse?.energy_J ?? 0) * 1e3, 1);
  });

  test('no text can be taken for a formula, commas and quotes are kept', async () => {
    const rows = (await text({ uri, what: 'surfaces', format: 'csv' }, odd)).split('\r\n');
    expect(rows[3]).toMatch(/^"'=1\+1, <exit> & ""window""",/);
  });
});

describe('figures', () => {
  test('as text carry the caution', async () => {
    const figures = await text({ uri, what: 'figures', format: 'text' });
    expect(figures).toContain('Pulse energy: 13.1 mJ');
    expect(figures).toContain('exit window: ');
    expect(figures).toMatch(/Pulse width at most 12\.0 ns: met/);
    expect(figures).toContain('laser safety officer');
    expect(figures.match(/Pulse energy:/g)).toHaveLength(1);
  });

  test('as values have SI beside what is shown', async () => {
    expect(await text({ uri, what: 'figures', format: 'csv' })).toMatch(/\r\nPulse energy,13\.1 mJ,0\.0130\d+\r\n/);
  });

  test('of a design without a pulse say why', async () => {
    expect(await text({ uri, what: 'figures', format: 'text' }, 'format: 1')).toContain('No pulse is predicted');
  });
});

describe('pictures', () => {
  test.each(chartIds)('%s is well-formed XML that names its axes and keeps inside the picture', async (what) => {
    const svg = await text({ uri, what, format: 'svg' }, odd);
    expect(tagsLeftOpen(svg)).toEqual([]);
    expect(svg).not.toMatch(/NaN|Infinity|undefined|<exit>/);
    const across = [...svg.matchAll(/\bx[12]?="(-?[\d.]+)"/g)].map((match) => Number(match[1]));
    expect(Math.min(...across)).toBeGreaterThanOrEqual(0);
    expect(Math.max(...across)).toBeLessThanOrEqual(760);
    expect(svg).toContain('<desc>');
    if (what !== 'surfaces' && what !== 'waveform') expect(svg).toContain('>present ');
  });

  test('the same design gives the same picture', async () => {
    expect(await text({ uri, what: 'pump', format: 'svg' })).toBe(await text({ uri, what: 'pump', format: 'svg' }));
  });
});

/** Elements that are not closed in the order they were opened; attributes must be quoted and text escaped. */
function tagsLeftOpen(svg: string): readonly string[] {
  const open: string[] = [];
  const rest = svg.replace(
    /<(\/?)([a-z]+)((?: [\w:-]+="[^"<&]*(?:&(?:amp|lt|gt|quot);[^"<&]*)*")*) ?(\/?)>/gi,
    (_, end, name, __, empty) => {
      if (end) expect(open.pop()).toBe(name);
      else if (!empty) open.push(name);
      return '';
    },
  );
  expect(rest.replace(/&(?:amp|lt|gt|quot);/g, '')).not.toMatch(/[<>&]/);
  return open;
}

describe('ticks', () => {
  test.each([
    [[0, 13.1], 0, ['0', '5', '10', '15']],
    [[95, 99], 95, ['95', '96', '97', '98', '99']],
    [[-20, 60], -20, ['-20', '0', '20', '40', '60']],
  ])('of %j', (values, from, texts) => {
    const scale = linearScale(values, 4);
    expect(scale.from).toBe(from);
    expect(scale.ticks.map((tick) => tick.text)).toEqual(texts);
    for (const value of values) expect(scale.at(value)).toBeLessThanOrEqual(1 + 1e-9);
  });

  test('of a logarithmic axis', () => {
    expect(logarithmicScale([2, 200]).ticks.map((tick) => tick.text)).toEqual([
      '2',
      '5',
      '10',
      '20',
      '50',
      '100',
      '200',
    ]);
    expect(logarithmicScale([2, 200]).at(20)).toBeCloseTo(0.5, 12);
  });

  test('of nothing are still an axis', () => {
    for (const values of [[], [0.2, 0.2], [0, 0]]) expect(linearScale(values, 4).ticks.length).toBeGreaterThan(1);
  });
});

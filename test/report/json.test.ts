import { describe, expect, test } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import { predictionJson } from '../../extension/core/report/json.ts';
import { DESIGNS, demo, design } from './designs.ts';

function parsed(text: string, file = 'f.gainmodule.yaml'): unknown {
  return JSON.parse(predictionJson(file, text, analyse(text)));
}

/** Paths of all leaves and empty branches; `[]` for any place in a list. */
function paths(value: unknown, path = ''): string[] {
  if (typeof value !== 'object' || value === null) return [path];
  const entries = Array.isArray(value)
    ? value.map((item: unknown) => [`${path}[]`, item] as const)
    : Object.entries(value).map(([key, item]: [string, unknown]) => [path ? `${path}.${key}` : key, item] as const);
  return entries.length === 0 ? [path] : [...new Set(entries.flatMap(([inner, item]) => paths(item, inner)))];
}

const POSITIONS = ['start.line', 'start.column', 'end.line', 'end.column'].map((key) => `findings[].range.${key}`);
const FINDINGS = ['code', 'severity', 'message', 'path'].map((key) => `findings[].${key}`);

/** What `format.md` allows, in its order. */
const KEYS = [
  ...['file', 'title', 'model'],
  ...['energy_J', 'peak_power_W', 'width_fwhm_s', 'width_equivalent_s', 'build_up_time_s'].map((key) => `pulse.${key}`),
  ...['round_trip_gain_log', 'round_trip_loss_log', 'inversion_ratio', 'stored_energy_J', 'extraction_efficiency'].map(
    (key) => `state.${key}`,
  ),
  ...[
    'repetition_rate_Hz',
    'average_power_W',
    'first_pulse_energy_J',
    'pulse_after_pause_energy_J',
    'fires_at_s',
    'pulses_per_pump_pulse',
  ].map((key) => `train.${key}`),
  ...['coupling.optimum_reflectivity', 'coupling.optimum_energy_J'],
  ...['name', 'peak_fluence_J_per_cm2', 'threshold_J_per_cm2', 'margin'].map((key) => `surfaces[].${key}`),
  ...['requirements[].name', 'requirements[].met'],
  ...['validity[].code', 'validity[].message'],
  ...[...FINDINGS, ...POSITIONS],
];
/** Branches that may be there and empty. */
const BRANCHES = ['surfaces', 'requirements', 'validity', 'findings', 'coupling'];

function leaves(value: unknown): unknown[] {
  return typeof value === 'object' && value !== null ? Object.values(value).flatMap(leaves) : [value];
}

describe('prediction as JSON', () => {
  test.each(DESIGNS)('%s has only the agreed keys, no null, no zero and nothing that is no number', (_, text) => {
    const object = parsed(text);
    expect(paths(object).filter((path) => ![...KEYS, ...BRANCHES].includes(path))).toEqual([]);
    expect(leaves(object)).not.toContain(null);
    expect(leaves(object)).not.toContain(0);
  });

  test('of the demo has every key of an actively switched pulsed module', () => {
    const absent = ['fires_at_s', 'pulses_per_pump_pulse', 'pulse_after_pause_energy_J'].map((key) => `train.${key}`);
    const none = ['validity[].code', 'validity[].message', ...FINDINGS, ...POSITIONS];
    expect(paths(parsed(demo))).toEqual([
      ...KEYS.filter((key) => ![...absent, ...none].includes(key)),
      'validity',
      'findings',
    ]);
  });

  test('of the demo has the stated figures', () => {
    expect(parsed(demo, 'demo.gainmodule.yaml')).toMatchObject({
      file: 'demo.gainmodule.yaml',
      title: 'Hail-sounding lidar transmitter, build C',
      model: 'depletion',
      train: { repetition_rate_Hz: 20 },
      requirements: [
        { name: 'pulse_energy', met: true },
        { name: 'pulse_width', met: true },
        { name: 'peak_power', met: true },
        { name: 'average_power', met: true },
        { name: 'hold_off_margin', met: true },
      ],
      findings: [],
    });
  });

  test('the module of the sheet gives the figures stated there', () => {
    const text = design('good/hail_lidar.gainmodule.yaml');
    const { prediction } = analyse(text);
    expect(prediction?.pulse?.energy_J.toExponential(2)).toBe('1.31e-2');
    // The sheet's 9.3 ns is what the phase index gives; the file's group index makes the round trip 0.4 % longer.
    expect(prediction?.pulse?.width_fwhm_s.toExponential(2)).toBe('9.37e-9');
    const phase = analyse(text.replace('group_index: 1.835', 'group_index: 1.82')).prediction;
    expect(phase?.pulse?.width_fwhm_s.toExponential(1)).toBe('9.3e-9');
    expect(prediction?.pulse?.peak_power_W.toExponential(2)).toBe('1.22e+6');
    expect(prediction?.train.average_power_W?.toPrecision(3)).toBe('0.262');
  });

  test('leaves out the pulse where there is none, and the prediction where the design is invalid', () => {
    const none = parsed(design('checks/no-pulse.gainmodule.yaml'));
    expect(none).not.toHaveProperty('pulse');
    expect(none).not.toHaveProperty('train.average_power_W');
    expect(none).not.toHaveProperty('state.extraction_efficiency');
    expect(none).toHaveProperty('state.inversion_ratio');
    expect(Object.keys(parsed('format: 1\n') ?? {})).toEqual(['file', 'findings']);
  });

  test('leaves out a margin that is not scaled, a verdict that is not known, a build-up that is not defined', () => {
    const surfaces = parsed(design('checks/threshold-conditions.gainmodule.yaml'));
    expect(surfaces).toHaveProperty(['surfaces', 0, 'margin']);
    expect(surfaces).not.toHaveProperty(['surfaces', 2, 'margin']);
    const requirements = parsed(design('checks/requirement-not-judged.gainmodule.yaml'));
    expect(requirements).toHaveProperty(['requirements', 0], { name: 'timing_jitter' });
    expect(parsed(design('checks/hold-off.gainmodule.yaml'))).not.toHaveProperty('pulse.build_up_time_s');
  });

  test('a finding has its path and a range that counts from 1', () => {
    expect(parsed(design('checks/no-pulse.gainmodule.yaml'))).toMatchObject({
      findings: [
        {
          code: 'no-pulse',
          severity: 'error',
          path: 'pump.power',
          range: { start: { line: 9, column: 10 }, end: { line: 9, column: 15 } },
        },
      ],
    });
  });

  test('ends with one line break and is indented for people', () => {
    const text = predictionJson('f', demo, analyse(demo));
    expect(text).toMatch(/^\{\n {2}"file": "f",\n/);
    expect(text).toMatch(/[^\n]\n$/);
  });
});

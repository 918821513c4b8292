import { describe, expect, test } from 'vitest';
import {
  isExportParams,
  isHostMessage,
  isPageMemory,
  isPageMessage,
  isReadoutState,
  serverOptions,
} from '../../extension/protocol/guard.ts';
import type { ExplorationState, ReadoutState } from '../../extension/protocol/readout.ts';

const state: ReadoutState = {
  uri: 'file:///design.gainmodule.yaml',
  version: 3,
  title: 'Lidar transmitter',
  model: 'depletion model',
  headline: [{ label: 'Pulse energy', value: '13.1 mJ' }, { label: 'Average power' }],
  groups: [{ name: 'Pulse', figures: [{ label: 'Build-up time', value: '40 ns' }] }],
  charts: [
    {
      kind: 'lines',
      id: 'waveform',
      title: 'Waveform',
      x: { label: 'Time', unit: 'ns', scale: 1e-9, values: [-1, 0, 1], logarithmic: false },
      left: { label: 'Power', unit: 'MW', scale: 1e6 },
      right: { label: 'Inversion', unit: '', scale: 1 },
      lines: [{ label: 'Power', axis: 'left', values: [0, 1, 0] }],
      marks: [{ kind: 'present', label: 'present', x: 0 }],
      summary: 'A pulse.',
    },
    {
      kind: 'bars',
      id: 'surfaces',
      title: 'Surfaces',
      axis: { label: 'Fluence', unit: 'J/cm²', scale: 1e4 },
      bars: [{ label: 'rod', value: 1, limit: 9, wanted: 4.5, verdict: 'good' }],
      summary: 'One surface.',
    },
  ],
  surfaces: [{ name: 'output coupler', fluence: '1.2 J/cm²', threshold: '9 J/cm²', margin: '7.5 ×', verdict: 'good' }],
  requirements: [{ name: 'Pulse width', required: '≤ 12 ns', predicted: '9.3 ns', verdict: 'good' }],
  validity: ['The pulse is short.'],
  problems: [{ severity: 'warning', code: 'unusual-value', message: 'Odd.', line: 4 }],
};

function withLine(values: readonly number[]): unknown {
  return { ...state, charts: [{ ...state.charts[0], lines: [{ label: 'Power', axis: 'left', values }] }] };
}

const exploration: ExplorationState = {
  uri: state.uri,
  version: 3,
  charts: [],
  parameters: [{ path: 'pump.power', value: '600 W', line: 12, energy: '+1.9 %' }],
};

describe('what the editor tells the page', () => {
  test('a whole state and a reason are accepted', () => {
    expect(isReadoutState(state)).toBe(true);
    expect(isHostMessage({ type: 'state', state })).toBe(true);
    expect(isHostMessage({ type: 'unavailable', reason: 'closed' })).toBe(true);
    expect(isHostMessage({ type: 'state', state, pinned: { state, exploration } })).toBe(true);
    expect(isHostMessage({ type: 'exploration', exploration })).toBe(true);
    expect(isHostMessage({ type: 'cursor', line: 3 })).toBe(true);
  });

  test('a state that went through JSON is still one', () => {
    expect(isReadoutState(JSON.parse(JSON.stringify(state)))).toBe(true);
  });

  test.each([
    ['no version', { ...state, version: undefined }],
    ['a figure that is a number', { ...state, headline: [{ label: 'Pulse energy', value: 13.1 }] }],
    ['an unheard-of verdict', { ...state, surfaces: [{ name: 'a', fluence: 'b', verdict: 'fine' }] }],
    ['a line before the first', { ...state, problems: [{ severity: 'error', code: 'a', message: 'b', line: 0 }] }],
    ['a severity of LSP', { ...state, problems: [{ severity: 1, code: 'a', message: 'b', line: 1 }] }],
    ['arrays of two lengths', withLine([0, 1])],
    ['a figure that is not finite', withLine([0, Number.NaN, 0])],
    ['an unheard-of chart', { ...state, charts: [{ ...state.charts[0], kind: 'pie' }] }],
    ['a chart of another id', { ...state, charts: [{ ...state.charts[1], id: 'spectrum' }] }],
    [
      'a bar without a length',
      { ...state, charts: [{ ...state.charts[1], bars: [{ label: 'rod', verdict: 'good' }] }] },
    ],
    ['a list instead of an object', []],
    ['nothing', null],
  ])('a state with %s is refused', (_, broken) => {
    expect(isReadoutState(broken)).toBe(false);
    expect(isHostMessage({ type: 'state', state: broken })).toBe(false);
  });

  test('an unknown tag, or a tag alone, is refused', () => {
    expect(isHostMessage({ type: 'ready' })).toBe(false);
    expect(isHostMessage({ type: 'unavailable' })).toBe(false);
    expect(isHostMessage('state')).toBe(false);
    expect(isHostMessage({ type: 'constructor' })).toBe(false);
    expect(isHostMessage({ type: 'state', state, pinned: { state: {} } })).toBe(false);
    expect(isHostMessage({ type: 'exploration', exploration: { ...exploration, parameters: [{}] } })).toBe(false);
    expect(isHostMessage({ type: 'cursor', line: 0 })).toBe(false);
  });
});

describe('what the page asks of the editor', () => {
  test.each([
    { type: 'ready' },
    { type: 'copy' },
    { type: 'reveal', line: 1 },
    { type: 'pin', pin: true },
    { type: 'export', chart: 'pump', format: 'svg' },
    { type: 'picture', chart: 'waveform', data: 'data:image/png;base64,AAAA' },
  ])('%o is accepted', (message) => {
    expect(isPageMessage(message)).toBe(true);
  });

  test.each([
    { type: 'pin' },
    { type: 'export', chart: 'pump', format: 'exe' },
    { type: 'export', chart: '../pump', format: 'csv' },
    { type: 'picture', chart: 'waveform', data: 'data:text/html;base64,AAAA' },
    { type: 'picture', chart: 'waveform', data: 'https://a.b/c.png' },
    { type: 'reveal', line: 0 },
    { type: 'reveal', line: 1.5 },
    { type: 'reveal', line: '1' },
    { type: 'state', state },
    {},
    null,
    'ready',
  ])('%o is refused', (message) => {
    expect(isPageMessage(message)).toBe(false);
  });
});

test('what the page remembers needs both its parts', () => {
  expect(isPageMemory({ uri: 'file:///a', tables: ['pump'] })).toBe(true);
  expect(isPageMemory({ uri: 'file:///a', tables: ['none'] })).toBe(false);
  expect(isPageMemory({ uri: 'file:///a' })).toBe(false);
  expect(isPageMemory(undefined)).toBe(false);
});

test('options of any other shape are left out, not trusted', () => {
  expect(serverOptions({ checksUri: 'file:///checks.md' })).toEqual({ checksUri: 'file:///checks.md' });
  expect(serverOptions({ checksUri: 1 })).toEqual({});
  expect(serverOptions(undefined)).toEqual({});
  expect(serverOptions({ settings: { inlayHints: { pump: false, resonator: 'no' } } })).toEqual({
    settings: { codeLens: { prediction: true }, inlayHints: { pump: false, resonator: true, qSwitch: true } },
  });
});

test.each([
  [{ uri: 'a', what: 'pump', format: 'svg' }, true],
  [{ uri: 'a', what: 'figures', format: 'text' }, true],
  [{ uri: 'a', what: 'figures', format: 'svg' }, false],
  [{ uri: 'a', what: 'pump', format: 'text' }, false],
  [{ uri: 1, what: 'pump', format: 'svg' }, false],
  [null, false],
])('export of %j: %s', (params, accepted) => {
  expect(isExportParams(params)).toBe(accepted);
});

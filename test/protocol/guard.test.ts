import { describe, expect, test } from 'vitest';
import {
  isHostMessage,
  isPageMemory,
  isPageMessage,
  isReadoutState,
  serverOptions,
} from '../../extension/protocol/guard.ts';
import type { ReadoutState } from '../../extension/protocol/readout.ts';

const state: ReadoutState = {
  uri: 'file:///design.gainmodule.yaml',
  version: 3,
  title: 'Lidar transmitter',
  model: 'depletion model',
  headline: [{ label: 'Pulse energy', value: '13.1 mJ' }, { label: 'Average power' }],
  groups: [{ name: 'Pulse', figures: [{ label: 'Build-up time', value: '40 ns' }] }],
  waveform: {
    timeUnit: 'ns',
    powerUnit: 'MW',
    summary: 'A pulse.',
    time: [-1, 0, 1],
    power: [0, 1, 0],
    inversion: [1, 0.5, 0.2],
  },
  surfaces: [{ name: 'output coupler', fluence: '1.2 J/cm²', threshold: '9 J/cm²', margin: '7.5 ×', verdict: 'good' }],
  requirements: [{ name: 'Pulse width', required: '≤ 12 ns', predicted: '9.3 ns', verdict: 'good' }],
  validity: ['The pulse is short.'],
  problems: [{ severity: 'warning', code: 'unusual-value', message: 'Odd.', line: 4 }],
};

describe('what the editor tells the page', () => {
  test('a whole state and a reason are accepted', () => {
    expect(isReadoutState(state)).toBe(true);
    expect(isHostMessage({ type: 'state', state })).toBe(true);
    expect(isHostMessage({ type: 'unavailable', reason: 'closed' })).toBe(true);
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
    ['arrays of two lengths', { ...state, waveform: { ...state.waveform, power: [0, 1] } }],
    ['a figure that is not finite', { ...state, waveform: { ...state.waveform, power: [0, Number.NaN, 0] } }],
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
  });
});

describe('what the page asks of the editor', () => {
  test.each([{ type: 'ready' }, { type: 'copy', text: 'a' }, { type: 'reveal', line: 1 }])(
    '%o is accepted',
    (message) => {
      expect(isPageMessage(message)).toBe(true);
    },
  );

  test.each([
    { type: 'copy' },
    { type: 'copy', text: 1 },
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
  expect(isPageMemory({ uri: 'file:///a', tableShown: false })).toBe(true);
  expect(isPageMemory({ uri: 'file:///a' })).toBe(false);
  expect(isPageMemory(undefined)).toBe(false);
});

test('options of any other shape are left out, not trusted', () => {
  expect(serverOptions({ checksUri: 'file:///checks.md' })).toEqual({ checksUri: 'file:///checks.md' });
  expect(serverOptions({ checksUri: 1 })).toEqual({});
  expect(serverOptions(undefined)).toEqual({});
});

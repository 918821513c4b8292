import { describe, expect, test } from 'vitest';
import { codeLenses } from '../../extension/language/code-lenses.ts';
import { headlineText } from '../../extension/language/headline.ts';
import { inlayHints } from '../../extension/language/inlay-hints.ts';
import { defaultSettings } from '../../extension/protocol/requests.ts';
import { demo } from '../explore/designs.ts';
import { bench } from './bench.ts';

const lensOf = (text: string) => codeLenses(bench(text).subject, undefined)[0]?.command?.title ?? '';

describe('the lens at the head', () => {
  test('tells energy, width, peak, average and the tightest margin', () => {
    expect(lensOf(demo)).toBe(
      '13.1 mJ · 9.37 ns · 1.22 MW peak · 262 mW average · margin 2.51 × on rod, antireflection coating',
    );
  });

  test('the tightest margin is the one with least to spare over what is wanted', () => {
    expect(lensOf(demo.replace('min: 1.5 }', 'min: 3.5 }'))).toMatch(/margin 3\.73 × of hold-off$/);
  });

  test.each([
    ['', 'No pulse predicted: The file is empty (line 1)'],
    [demo.replace('length: 60 mm', 'length: 60'), /^No pulse predicted: gain_medium\.length: .*unit.* \(line 8\)$/],
    [demo.replace('length: 60 mm', 'length: 60').replace('20 Hz', '20'), /\(line 8, and 1 more\)$/],
    [demo.replace('600 W ± 3 %', '6 W'), /^No pulse, below threshold: .* \(line \d+\)$/],
    [
      demo
        .replace('kind: electro_optic', 'kind: none')
        .replace(/ {2}(closed_loss|opening_time|opens_at|gate): .*\n/g, ''),
      /^No pulse predicted: This release predicts actively switched modules only/,
    ],
    [
      demo.replace('600 W ± 3 %', '*none'),
      /^No pulse predicted: No anchor &none stands before this alias \(line \d+\)$/,
    ],
    [demo.replace('material: Nd:YAG', 'material'), /^No pulse predicted: This line has no : of its own \(line 6\)$/],
    [demo.replace('closed_loss: 99.5 %', 'closed_loss: 100 %'), /[a-z]… \(line \d+\)$/],
  ])('stays, and says why there is no pulse', (text, title) => {
    const lenses = codeLenses(bench(text).subject, 'a.command');
    expect(lenses).toHaveLength(1);
    expect(lenses[0]?.range.start).toEqual({ line: 0, character: 0 });
    expect(lenses[0]?.command?.command).toBe('a.command');
    if (typeof title === 'string') expect(lenses[0]?.command?.title).toBe(title);
    else expect(lenses[0]?.command?.title).toMatch(title);
  });
});

test('the headline fits a status bar', () => {
  expect(headlineText(bench(demo).subject.analysis)).toBe('13.1 mJ · 9.37 ns · 1.22 MW');
  expect(headlineText(bench(demo.replace('60 mm', '60')).subject.analysis)).toBe('1 error');
  expect(headlineText(bench(demo.replace('600 W ± 3 %', '6 W')).subject.analysis)).toBe('no pulse');
});

describe('inlay hints', () => {
  const all = { start: 0, end: demo.length };
  const hintsOf = (text: string, settings = defaultSettings.inlayHints, shown = { start: 0, end: text.length }) => {
    const here = bench(text);
    return inlayHints(here.subject, shown, settings).map(({ label, position }) => {
      const line = here.document.getText().split('\n')[position.line] ?? '';
      return `${line.slice(0, position.character)}|${String(label)}`;
    });
  };

  test('stand where the figures are decided', () => {
    expect(hintsOf(demo)).toEqual([
      'pump:|stored 49.2 mJ',
      'resonator:|gain 1.62, loss 0.755',
      'q_switch:|inversion ratio 2.15',
    ]);
    expect(
      inlayHints(bench(demo).subject, all, defaultSettings.inlayHints).every(({ label }) => String(label).length < 25),
    ).toBe(true);
  });

  test('agree with the prediction, in every style of writing', () => {
    const flow = demo.replace(
      /pump:\n(?: {2}.*\n)+/,
      "'pump': { kind: pulsed, wavelength: 808 nm, power: 600 W, duration: 200 us, absorbed_fraction: 85 %, quantum_efficiency: 0.95, beam: { profile: flat, radius: 1.7 mm } } # all\n",
    );
    const [pump] = hintsOf(flow);
    expect(pump).toMatch(/# all\|stored 49\.2 mJ$/);
    expect(hintsOf(demo.replaceAll('\n', '\r\n'))).toHaveLength(3);
  });

  test('each has its setting', () => {
    for (const setting of ['pump', 'resonator', 'qSwitch'] as const) {
      expect(hintsOf(demo, { ...defaultSettings.inlayHints, [setting]: false })).toHaveLength(2);
    }
  });

  test('are given for what is shown only, and never without a prediction', () => {
    expect(hintsOf(demo, defaultSettings.inlayHints, { start: 0, end: demo.indexOf('resonator') - 2 })).toEqual([
      'pump:|stored 49.2 mJ',
    ]);
    expect(hintsOf(demo.replace('60 mm', '60'))).toEqual([]);
    expect(hintsOf('')).toEqual([]);
  });
});

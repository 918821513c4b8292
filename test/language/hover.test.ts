import { describe, expect, test } from 'vitest';
import { bench, hoverAt, transmitter } from './bench.ts';

const sound = bench(transmitter);

describe('on a key', () => {
  test('tells what it does, its value, what is allowed and usual, and the pulse', () => {
    const { text, about } = hoverAt(sound, sound.at('output_reflectivity')) ?? { text: '', about: '' };
    expect(about).toBe('output_reflectivity: 50 %');
    expect(text).toContain('Power reflectivity of the output coupler.');
    expect(text).toContain('`50 %`');
    expect(text).toMatch(/Allowed: above 0 %, below 100 %/);
    expect(text).toMatch(/Usual: 1 % to 99\.9 %/);
    expect(text).toMatch(
      /Predicted pulse: \*\*13\.\d mJ\*\* · 1\.2\d MW peak · 9\.\d+ ns FWHM · \d+(\.\d)? ns build-up · 26\d mW average/,
    );
    expect(text).toContain('Margins: damage 3.1');
    expect(text).toMatch(/hold-off 3\.\d+/);
  });

  test('tells the same on every character of key and value, and in a flow map', () => {
    const first = hoverAt(sound, sound.at('output_reflectivity'));
    for (let by = 1; by <= 'output_reflectivity: 50 %'.length; by++) {
      expect(hoverAt(sound, sound.at('output_reflectivity', by))).toEqual(first);
    }
    const inFlow = hoverAt(sound, sound.at('1.7 mm'));
    expect(inFlow?.about).toBe('radius: 1.7 mm');
    expect(inFlow?.text).toContain('pump.beam.radius');
  });

  test('says what holds if it is left out', () => {
    expect(hoverAt(sound, sound.at('gate: 10 us'))?.text).toContain('If left out: half the period.');
  });
});

describe('on a section', () => {
  test('lists what was filled in, with its source', () => {
    const found = hoverAt(sound, sound.at('gain_medium'));
    expect(found?.about).toBe('gain_medium');
    expect(found?.text).toMatch(/`absorption_cross_section`: 0 cm² \(property table, Nd:YAG at 1064 nm/);
    expect(hoverAt(sound, sound.at('q_switch'))?.text).toMatch(/`opens_at`: the pump's end \(default\)/);
  });

  test('answers on its key alone, not on the blanks and values that it spans', () => {
    expect(hoverAt(sound, sound.at('  material', 1))).toBeUndefined();
  });
});

test('at the head, the whole prediction', () => {
  for (const key of ['format', 'title']) {
    const text = hoverAt(sound, sound.at(`${key}:`))?.text ?? '';
    for (const figure of [
      'Pulse energy',
      'Stored energy',
      'Hold-off margin',
      'Optimum reflectivity',
      'Repetition rate',
    ]) {
      expect(text).toContain(figure);
    }
  }
});

test('on a requirement, predicted against wanted; on its section, all of them', () => {
  const one = hoverAt(sound, sound.at('pulse_width: { max'))?.text ?? '';
  expect(one).toMatch(/Pulse width at most 12\.0 ns, predicted 9\.\d+ ns: met/);
  expect(one).not.toContain('Pulse energy 8.00 mJ');
  expect(hoverAt(sound, sound.at('requirements:'))?.text).toMatch(/Pulse energy 8\.00 mJ to 14\.0 mJ, predicted/);
});

test('a missed requirement is named wherever one hovers', () => {
  const missed = bench(transmitter.replace('max: 12 ns', 'max: 5 ns'));
  expect(hoverAt(missed, missed.at('output_reflectivity'))?.text).toContain(
    'Requirements missed: Pulse width at most 5.00 ns.',
  );
});

test('on a surface, its fluence against its threshold', () => {
  const { text } = hoverAt(sound, sound.at('hot_spot_factor')) ?? { text: '' };
  expect(text).toMatch(
    /Peak fluence 2\.\d+ J\/cm² against a threshold of 9\.\d+ J\/cm² at this pulse's width: margin 3\.\d+ ×/,
  );
});

test('without a pulse it says so and still explains the key', () => {
  const broken = bench(transmitter.replace('length: 60 mm', 'length: 60'));
  const { text } = hoverAt(broken, broken.at('output_reflectivity')) ?? { text: '' };
  expect(text).toContain('Power reflectivity of the output coupler.');
  expect(text).toContain('**No pulse is predicted**: 1 error to mend first.');
});

test('an unknown key has a hover without a description, and markup in a design stays text', () => {
  const odd = bench(transmitter.replace('title:', 'x-[link](command:evil): a`b\ntitle:'));
  const { text } = hoverAt(odd, odd.at('x-[link]')) ?? { text: '' };
  expect(text).not.toContain('[link](command:evil)');
  expect(text).toContain("`a'b`");
});

test('outside every key and in text that is no design there is none', () => {
  expect(hoverAt(bench(''), 0)).toBeUndefined();
  expect(hoverAt(bench('\u0000\u0001'), 1)).toBeUndefined();
  expect(hoverAt(sound, transmitter.length)).toBeUndefined();
});

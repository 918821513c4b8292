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

describe('the value', () => {
  test.each([
    ['length: 60 mm', '`60 mm` = 0.06 m'],
    ['power: 600 W', '`600 W`\n'],
    ['output_reflectivity: 50 %', '`50 %` = 0.5'],
    ['emission_cross_section: 2.8e-19 cm2', '= 2.8e-23 m²'],
  ])('of %s in SI', (line, shown) => {
    expect(`${hoverAt(sound, sound.at(line))?.text}\n`).toContain(shown);
  });

  test('with its tolerance', () => {
    const here = bench(transmitter.replace('length: 180 mm', 'length: 180 mm ± 0.5 mm'));
    expect(hoverAt(here, here.at('length: 180'))?.text).toContain('= 0.18 ± 0.0005 m');
  });
});

describe('sensitivity', () => {
  test('to the pump power: +1 % of it moves energy by what two predictions of the text say', () => {
    const text = hoverAt(sound, sound.at('power: 600'))?.text ?? '';
    const row = /\| \+1 % \| \+([\d.]+) % \| \+([\d.]+) % \| −([\d.]+) % \| −([\d.]+) % \|/.exec(text);
    const energy = (watts: number) =>
      bench(transmitter.replace('power: 600 W', `power: ${watts} W`)).subject.analysis.prediction?.pulse?.energy_J ?? 0;
    expect(Number(row?.[1])).toBeCloseTo((energy(603) / energy(597) - 1) * 100, 1);
    expect(text).not.toContain('percentage point');
  });

  test('to reflectivity and loss, also for a percentage point', () => {
    for (const key of ['output_reflectivity', 'round_trip_loss']) {
      expect(hoverAt(sound, sound.at(key))?.text).toMatch(/\| \+1 percentage point \|/);
    }
    const text = hoverAt(sound, sound.at('output_reflectivity'))?.text ?? '';
    const rows = [...text.matchAll(/\| \+1 (?:%|percentage point) \| ([+−][\d.]+) %/g)].map((match) =>
      Number(match[1]?.replace('−', '-')),
    );
    // One percentage point of 50 % is 2 % of it.
    expect(rows[1]! / rows[0]!).toBeCloseTo(2, 0);
  });

  test('tells the spread that tolerances cause, and which one rules', () => {
    const here = bench(
      transmitter.replace('600 W', '600 W ± 3 %').replace('length: 180 mm', 'length: 180 mm ± 0.5 mm'),
    );
    const text = hoverAt(here, here.at('power: 600'))?.text ?? '';
    expect(text).toMatch(/Its tolerance alone: energy ± \d/);
    expect(text).toMatch(/All tolerances, root sum of squares: energy ± [\d.]+ % \(all of it from `pump\.power`\)/);
    for (const place of ['title:', 'pulse_width: { max']) {
      expect(hoverAt(here, here.at(place))?.text).toContain('All tolerances, root sum of squares');
    }
  });

  test('is left out where there is no pulse', () => {
    const below = bench(transmitter.replace('power: 600 W', 'power: 6 W'));
    expect(hoverAt(below, below.at('power: 6'))?.text).not.toContain('| +1 %');
  });
});

describe('the property table', () => {
  test('is quoted with source and how far sources disagree', () => {
    const text = hoverAt(sound, sound.at('emission_cross_section'))?.text ?? '';
    expect(text).toMatch(
      /Property table, Nd:YAG at 1064 nm: [\d.]+e-19 cm² \(published values from [\d.e-]+ cm² to [\d.e-]+ cm²\)/,
    );
  });

  test('tells the lines of the material', () => {
    expect(hoverAt(sound, sound.at('material: Nd'))?.text).toMatch(/lines at .*1064 nm/);
  });
});

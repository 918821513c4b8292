import { describe, expect, test } from 'vitest';
import { TextDocument } from 'vscode-languageserver-textdocument';
import { analyse } from '../../extension/core/analyse.ts';
import { completion } from '../../extension/language/completion/completion.ts';
import { demo } from '../explore/designs.ts';
import { bench } from './bench.ts';

/** What is offered where `|` stands. */
function at(text: string) {
  const offset = text.indexOf('|');
  const here = bench(text.replace('|', ''));
  const items = completion(here.subject, offset);
  const sorted = [...items].sort((a, b) => ((a.sortText ?? '') < (b.sortText ?? '') ? -1 : 1));
  return {
    labels: sorted.map(({ label }) => label),
    item: (label: string) => items.find((one) => one.label === label),
    apply(label: string): string {
      const edit = items.find((one) => one.label === label)?.textEdit;
      if (edit === undefined || !('range' in edit))
        throw new Error(`no ${label} among ${sorted.map((one) => one.label)}`);
      return TextDocument.applyEdits(here.document, [edit]);
    },
  };
}

const section = (name: string) => new RegExp(`^${name}:\n(?: {2}.*\n)+`, 'm');
const pumpOf = (lines: string) => demo.replace(section('pump'), `pump:\n${lines}\n`);

describe('keys', () => {
  test('of an empty file are those of the top, the required ones first', () => {
    expect(at('|').labels.slice(0, 5)).toEqual(['format', 'gain_medium', 'pump', 'resonator', 'q_switch']);
  });

  test('of a section come with what is missing first, and without what is there', () => {
    const { labels } = at(demo.replace('  length: 180 mm ± 0.5 mm\n', '  |\n'));
    expect(labels).toEqual(['length']);
    expect(at(demo.replace('  length: 180 mm ± 0.5 mm\n  output_reflectivity: 50 % ± 2 %\n', '  |\n')).labels).toEqual([
      'length',
      'output_reflectivity',
    ]);
    expect(at(demo.replace('  diameter: 5 mm\n', '  |\n')).labels).toEqual([
      'diameter',
      'absorption_cross_section',
      'ion_density',
      'group_index',
    ]);
  });

  test('follow the branch that the section is in', () => {
    const pulsed = at(pumpOf('  kind: pulsed\n  |')).labels;
    expect(pulsed.slice(0, 5)).toEqual(['wavelength', 'power', 'duration', 'absorbed_fraction', 'beam']);
    expect(pulsed).toContain('diode');
    const continuous = at(pumpOf('  kind: continuous\n  power: 20 W\n  |')).labels;
    expect(continuous).not.toContain('duration');
    expect(continuous).not.toContain('diode');
    const passive = at('q_switch:\n  kind: saturable_absorber\n  |\n').labels;
    expect(passive.slice(0, 2)).toEqual(['repetition_rate', 'absorber']);
    for (const key of ['closed_loss', 'opens_at', 'gate', 'opening_time']) expect(passive).not.toContain(key);
    expect(at('q_switch:\n  kind: electro_optic\n  |\n').labels).not.toContain('absorber');
    expect(at('gain_medium:\n  lower_level_lifetime: 200 ps\n  |').labels).not.toContain('inversion_reduction_factor');
  });

  test('in braces are those of what the braces belong to', () => {
    expect(at(demo.replace('{ profile: flat, radius: 1.7 mm }', '{ profile: flat, | }')).labels).toEqual(['radius']);
    expect(at(demo.replace('{ profile: flat, radius: 1.7 mm }', '{ | }')).labels).toEqual(['profile', 'radius']);
    expect(
      at(demo.replace('{ fluence: 5 J/cm2, pulse_width: 10 ns, wavelength: 1064 nm }', '{ fluence: 5 J/cm2, |')).labels,
    ).toEqual(['pulse_width', 'wavelength']);
    expect(at('{ format: 1, pump: { kind: pulsed, beam: { | } } }').labels).toEqual(['profile', 'radius']);
    expect(at('{ format: 1, pump: { kind: continuous, | } }').labels).not.toContain('duration');
    expect(at('{ surfaces: [ { name: a, place: inside }, { name: b, | } ] }').labels[0]).toBe('place');
    expect(at('pump: {\n  kind: pulsed,\n  beam: {\n    |\n  }\n}').labels).toEqual(['profile', 'radius']);
  });

  test('in a list are those of its items', () => {
    expect(at(demo.replace('    place: outside\n', '    |\n')).labels.slice(0, 1)).toEqual(['place']);
    expect(at('surfaces:\n  - |').labels.slice(0, 4)).toEqual(['name', 'place', 'beam_radius', 'damage_threshold']);
    expect(at('surfaces:\n  - name: a\n    |').labels.slice(0, 3)).toEqual([
      'place',
      'beam_radius',
      'damage_threshold',
    ]);
    expect(at('surfaces:\n- name: a\n  place: inside\n  |').labels.slice(0, 2)).toEqual([
      'beam_radius',
      'damage_threshold',
    ]);
    expect(at('surfaces:\n  |').labels).toEqual(['- name']);
  });

  test('replace what is half typed, also where the text around it is broken', () => {
    expect(at(demo.replace('  absorbed_fraction: 85 %', '  absor|')).apply('absorbed_fraction')).toContain(
      '\n  absorbed_fraction: \n',
    );
    expect(at('pump:\n  kind: pulsed\n  wav|\n  power 600\nresonator: [').labels).toContain('wavelength');
    expect(at(demo.replace('  length: 60 mm', '  le|ngth: 60 mm')).apply('length')).toBe(demo);
  });

  test('tell what they are for, in the words of the schema', () => {
    const item = at('resonator:\n  |').item('output_reflectivity');
    expect(item?.detail).toMatch(/^missing; ratio, usually 1 % to 99\.9 %/);
    expect(JSON.stringify(item?.documentation)).toContain('Power reflectivity of the output coupler.');
  });

  test('a section comes with its required keys, and reads', () => {
    for (const name of ['gain_medium', 'pump', 'resonator', 'q_switch']) {
      const text = at(demo.replace(section(name), '|\n')).apply(name);
      expect(
        analyse(text).problems.filter(({ severity, code }) => severity === 'error' && code !== 'requirement-missed'),
      ).toEqual([]);
    }
    expect(at(demo.replace('  beam: { profile: flat, radius: 1.7 mm }', '  |')).apply('beam')).toContain(
      '  beam: { profile: flat, radius: 1.7 mm }',
    );
  });
});

describe('values', () => {
  test('of a choice are all of them', () => {
    expect(at(demo.replace('kind: pulsed', 'kind: |')).labels).toEqual(['pulsed', 'continuous']);
    expect(at(demo.replace('profile: flat', 'profile: |')).labels).toEqual(['flat', 'gaussian']);
    expect(at('q_switch: { kind: | }').labels).toContain('acousto_optic');
  });

  test('of a quantity are the example and the usual range', () => {
    const { labels, item } = at(demo.replace('length: 180 mm ± 0.5 mm', 'length: |'));
    expect(labels).toEqual(['180 mm', '0.5 mm', '10 m']);
    expect(item('0.5 mm')?.detail).toBe('least that is usual');
  });

  test.each([
    ['length: 180 mm ± 0.5 mm', 'length: 18|', ['18 mm', '18 m', '18 um', '18 nm', '18 cm']],
    ['length: 180 mm ± 0.5 mm', 'length: 1.8 |', ['1.8 mm', '1.8 m', '1.8 um', '1.8 nm', '1.8 cm']],
    ['duration: 200 us', 'duration: 2e2 u|', ['2e2 us', '2e2 ns', '2e2 ms', '2e2 ps', '2e2 s', '2e2 fs']],
    ['fluence: 5 J/cm2', 'fluence: 5|', ['5 J/cm2', '5 mJ/cm2', '5 J/m2']],
  ])('behind a number are the units that fit: %s', (line, typed, units) => {
    const found = at(demo.replace(line, typed));
    expect(found.labels).toEqual(units);
    expect(found.apply(units[0] ?? '')).toBe(demo.replace(line, typed.replace(/: .*/, `: ${units[0]}`)));
  });

  test('of the material are those of the table, with their lines', () => {
    const { labels, item } = at(demo.replace('material: Nd:YAG', 'material: |'));
    expect(labels).toContain('Nd:YVO4');
    expect(item('Nd:YAG')?.detail).toMatch(/1064 nm/);
  });

  test('of the wavelengths are lines and pump lines of the chosen material', () => {
    const laser = at(demo.replace('wavelength: 1064 nm\n', 'wavelength: |\n'));
    expect(laser.labels[0]).toBe('1064 nm');
    expect(laser.item('1064 nm')?.detail).toBe('strongest line of Nd:YAG');
    expect(laser.labels.length).toBeGreaterThan(2);
    expect(at(demo.replace('wavelength: 808 nm', 'wavelength: |')).labels).toContain('808 nm');
    expect(at(demo.replace('Nd:YAG', 'Er:YAG').replace('wavelength: 1064 nm\n', 'wavelength: |\n')).labels[0]).not.toBe(
      '1064 nm',
    );
    expect(
      at(demo.replace('pulse_width: 10 ns, wavelength: 1064 nm', 'pulse_width: 10 ns, wavelength: |')).item('1064 nm')
        ?.detail,
    ).toBe("the laser's own");
  });

  test('of a property are the figure of the table, with its source', () => {
    const { item, labels } = at(demo.replace('upper_level_lifetime: 230 us', 'upper_level_lifetime: |'));
    expect(item(labels[0] ?? '')?.detail).toBe('property table');
    expect(item(labels[0] ?? '')?.documentation).toBeDefined();
  });

  test('keep quotes, comments and what follows', () => {
    expect(at(demo.replace('material: Nd:YAG', 'material: "|"')).apply('Nd:YVO4')).toContain('material: "Nd:YVO4"\n');
    expect(at(demo.replace('kind: pulsed', 'kind: pul|sed # one burst')).apply('continuous')).toContain(
      'kind: continuous # one burst\n',
    );
    expect(at(demo.replace('profile: flat, ', 'profile: |, ')).apply('gaussian')).toContain(
      '{ profile: gaussian, radius: 1.7 mm }',
    );
    expect(at(demo.replace('kind: pulsed', 'kind:|')).apply('continuous')).toContain('  kind: continuous\n');
  });

  test('with Windows line ends stay on their line', () => {
    expect(at(demo.replace('kind: pulsed', 'kind: |').replaceAll('\n', '\r\n')).apply('pulsed')).toBe(
      demo.replaceAll('\n', '\r\n'),
    );
  });
});

describe('acceptances', () => {
  const missed = demo.replace('max: 12 ns }', 'max: 9 ns }');

  test('are offered for what is found on the line', () => {
    const found = at(missed.replace('max: 9 ns }', 'max: 9 ns } # accept |'));
    expect(found.labels).toEqual(['requirement-missed']);
    expect(found.apply('requirement-missed')).toContain('# accept requirement-missed: \n');
    expect(at(missed.replace('  pulse_width:', '  # accept req|\n  pulse_width:')).labels).toEqual([
      'requirement-missed',
    ]);
  });

  test('nothing is offered in any other comment', () => {
    expect(at(demo.replace('kind: pulsed', 'kind: pulsed # |')).labels).toEqual([]);
    expect(at('# |').labels).toEqual([]);
  });
});

test('every key and value that is offered at its place in a sound design leaves it readable', () => {
  const lines = demo.split('\n');
  let tried = 0;
  for (const [index, line] of lines.entries()) {
    const key = /^(\s+)([a-z_]+): (?!\{)(.*)$/.exec(line);
    if (key === null) continue;
    const [, indent = '', name = ''] = key;
    const without = (text: string) => [...lines.slice(0, index), text, ...lines.slice(index + 1)].join('\n');
    const values = at(without(`${indent}${name}: |`));
    for (const label of values.labels) {
      const { problems } = analyse(values.apply(label));
      const onLine = problems.filter(
        ({ range, code }) =>
          values.apply(label).slice(0, range.start).split('\n').length === index + 1 &&
          [
            'unknown-unit',
            'wrong-dimension',
            'missing-unit',
            'not-a-quantity',
            'not-allowed',
            'yaml-syntax',
            'unknown-key',
            'wrong-type',
          ].includes(code),
      );
      expect(onLine, `${name}: ${label}`).toEqual([]);
      tried += 1;
    }
  }
  expect(tried).toBeGreaterThan(80);
});

test('nothing is thrown at any offset of any prefix', () => {
  const flow =
    '{ format: 1, gain_medium: { material: "Nd:YAG", length: 60 mm }, surfaces: [ { name: a, damage_threshold: { fluence: 5 J/cm2 } } ] }';
  for (const text of [
    flow,
    demo.slice(0, 700),
    '\r\n\r\n',
    '\t- a:\n\t',
    "it's: 'a",
    '[[[{',
    ']]}}',
    '- - - a: b',
    '"',
    'a: |\n  b',
  ]) {
    const here = bench(text);
    for (let offset = 0; offset <= text.length; offset++) completion(here.subject, offset);
    for (let end = 0; end <= text.length; end += 7) {
      const cut = bench(text.slice(0, end));
      completion(cut.subject, end);
    }
  }
  expect.assertions(0);
});

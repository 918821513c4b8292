import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { readDesign } from '../../extension/core/design/read.ts';

const demo = readFileSync(new URL('../designs/good/hail_lidar.gainmodule.yaml', import.meta.url), 'utf8');
const passive = readFileSync(new URL('../designs/good/passive_igniter.gainmodule.yaml', import.meta.url), 'utf8');

function slice(text: string, range: { readonly start: number; readonly end: number }): string {
  return text.slice(range.start, range.end);
}

describe('values', () => {
  test('quantities come in SI, with what was written', () => {
    const { values } = readDesign(demo);
    expect(values.pump?.power).toEqual({ value: 600, written: 600, unit: 'W' });
    expect(values.pump?.beam?.radius?.value).toBe(1.7e-3);
    expect(values.gain_medium?.emission_cross_section?.value).toBe(2.8e-23);
    expect(values.resonator?.output_reflectivity?.value).toBe(0.5);
    expect(values.q_switch?.kind).toBe('electro_optic');
    expect(values.surfaces?.[0]?.damage_threshold?.fluence?.value).toBe(1e5);
    expect(values.requirements?.pulse_energy?.max?.value).toBe(0.014);
    expect(values.format).toBe(1);
  });

  test('numbers are read from the text, so that no digit is lost on the way', () => {
    const { values } = readDesign(demo.replace('quantum_efficiency: 0.95 ', 'quantum_efficiency: 0.9500'));
    expect(values.pump?.quantum_efficiency).toEqual({ value: 0.95, written: 0.95, unit: '' });
    expect(
      readDesign(demo.replace('title: Hail-sounding lidar transmitter, build C', 'title: 0010')).values.title,
    ).toBe('0010');
  });

  test('aliases and merges count as if written out; what a section says itself wins', () => {
    const { values } = readDesign(passive);
    expect(values.resonator?.beam).toEqual({ profile: 'gaussian', radius: { value: 4e-4, written: 0.4, unit: 'mm' } });
    expect(values.pump?.beam?.radius?.value).toBe(5e-4);
    expect(values.pump?.beam?.profile).toBe('gaussian');
    expect(values.q_switch?.absorber?.beam_radius?.value).toBe(4e-4);
    expect(values.surfaces?.map((surface) => surface.safety_factor?.value)).toEqual([2, 3]);
    expect(values.surfaces?.[1]?.damage_threshold?.fluence?.value).toBe(8e4);
  });

  test('a broken file keeps all that can be used, and nothing that can not', () => {
    const text = demo
      .replace('power: 600 W', 'power: 600 mm')
      .replace('output_reflectivity: 50 %', 'output_reflectivity: 100 %')
      .replace('kind: electro_optic', 'kind: electric')
      .replace('closed_loss: 99.5 %', 'closed_loss: 99.5 %: x');
    const { values, problems } = readDesign(text);
    expect(problems.map(({ code }) => code)).toEqual(['wrong-dimension', 'out-of-range', 'not-allowed', 'yaml-syntax']);
    expect(values.pump?.power).toBeUndefined();
    expect(values.pump?.duration?.value).toBe(2e-4);
    expect(values.resonator).not.toHaveProperty('output_reflectivity');
    expect(values.q_switch).not.toHaveProperty('kind');
    expect(values.q_switch?.repetition_rate?.value).toBe(20);
  });

  test('a second colon or a wrong indentation costs one value, not the rest of its section', () => {
    for (const slip of ['closed_loss: 99.5 %: x', 'closed_loss: a: b: c', 'closed_loss: 99 %\n     closed: 3']) {
      const { values, problems } = readDesign(demo.replace('closed_loss: 99.5 %  ', `${slip}  `));
      expect(problems.map(({ code }) => code)).toEqual(['yaml-syntax']);
      expect(values.q_switch?.closed_loss).toBeUndefined();
      expect(Object.keys(values.q_switch ?? {})).toEqual(['kind', 'opens_at', 'gate', 'repetition_rate']);
      expect(Object.keys(values).length).toBe(8);
    }
  });

  test('a tolerance beyond all bounds does not come through', () => {
    const { values, problems } = readDesign(demo.replace('power: 600 W', 'power: 600 W ± 1e200 W'));
    expect(problems.map(({ code }) => code)).toEqual(['out-of-range']);
    expect(values.pump?.power).toBeUndefined();
  });

  test('names that every object answers to are keys like any other', () => {
    const text = '__proto__: 1\nconstructor: 2\ngain_medium: { toString: 1, __proto__: { length: 60 mm } }\n';
    const { values, problems } = readDesign(text);
    const unknown = problems.filter(({ code }) => code === 'unknown-key').map(({ path }) => path);
    expect(unknown).toEqual(['__proto__', 'constructor', 'gain_medium.toString', 'gain_medium.__proto__']);
    expect(values.gain_medium?.length).toBeUndefined();
  });
});

describe('ranges', () => {
  test('a value is underlined without its comment, a section at its key', () => {
    const design = readDesign(demo);
    expect(slice(demo, design.rangeOf('pump.power'))).toBe('600 W');
    expect(slice(demo, design.keyRangeOf('pump.power'))).toBe('power');
    expect(slice(demo, design.rangeOf('pump'))).toBe('pump');
    expect(slice(demo, design.rangeOf('surfaces[0].damage_threshold.fluence'))).toBe('10 J/cm2');
    expect(slice(demo, design.rangeOf('surfaces[0]'))).toBe('name: output coupler, inner face');
  });

  test('what is absent is shown at the section around it, and then at the first line', () => {
    const design = readDesign(demo);
    expect(slice(demo, design.rangeOf('pump.diode.current'))).toBe('pump');
    expect(slice(demo, design.rangeOf('surfaces[7].beam_radius'))).toBe('surfaces');
    expect(slice(demo, design.rangeOf('nothing'))).toBe('format: 1');
    expect(slice(demo, design.keyRangeOf(''))).toBe('format: 1');
    expect(readDesign('').rangeOf('pump')).toEqual({ start: 0, end: 0 });
  });

  test('an alias is shown where it stands, what it repeats is marked where it is written', () => {
    const design = readDesign(passive);
    expect(slice(passive, design.rangeOf('resonator.beam'))).toBe('*mode');
    expect(slice(passive, design.keyRangeOf('resonator.beam'))).toBe('beam');
    expect(slice(passive, design.rangeOf('q_switch.absorber.beam_radius'))).toBe('*waist');
    const wrong = passive.replace('&waist 0.4 mm', '&waist 0.4 W');
    expect(readDesign(wrong).problems.map(({ range }) => slice(wrong, range))).toEqual(['0.4 W']);
  });

  test('fixes apply to the text as it is, in quotes too', () => {
    const text = demo.replace('power: 600 W', `power: '600 w'`);
    const [problem] = readDesign(text).problems;
    const fix = problem?.fixes?.find(({ text: unit }) => unit === 'W');
    expect(fix).toBeDefined();
    if (fix === undefined) return;
    const mended = text.slice(0, fix.range.start) + fix.text + text.slice(fix.range.end);
    expect(mended).toBe(demo.replace('power: 600 W', `power: '600 W'`));
    expect(readDesign(mended).problems).toEqual([]);
  });

  test('where escapes shift the characters the whole value is marked, and no fix is offered', () => {
    const text = demo.replace('power: 600 W', 'power: "6\\u0030 w"');
    const [problem] = readDesign(text).problems;
    expect(problem && slice(text, problem.range)).toBe('"6\\u0030 w"');
    expect(problem?.fixes).toBeUndefined();
  });

  test('line ends of either kind and a byte-order mark shift nothing', () => {
    const text = `\ufeff${demo.replace('power: 600 W', 'power: 600 mm').replaceAll('\n', '\r\n')}`;
    expect(readDesign(text).problems.map(({ range }) => slice(text, range))).toEqual(['600 mm']);
  });
});

describe('nodes and their schema', () => {
  test('an offset finds the deepest key or value there', () => {
    const design = readDesign(demo);
    const pathAt = (word: string, within = 1): string | undefined => design.nodeAt(demo.indexOf(word) + within)?.path;
    expect(pathAt('power: 600 W')).toBe('pump.power');
    expect(pathAt('600 W')).toBe('pump.power');
    expect(pathAt('600 W', 5)).toBe('pump.power');
    expect(pathAt('radius: 1.7', 9)).toBe('pump.beam.radius');
    expect(pathAt('resonator:', 0)).toBe('resonator');
    expect(pathAt('fluence: 10')).toBe('surfaces[0].damage_threshold.fluence');
    expect(design.nodeAt(demo.length + 10)).toBeUndefined();
    const merged = readDesign(passive);
    expect(merged.nodeAt(passive.indexOf('*mode') + 1)?.path).toBe('pump.beam');
    expect(merged.nodeAt(passive.lastIndexOf('*mode') + 1)?.path).toBe('resonator.beam');
  });

  test('the schema of a path says what it is for', () => {
    const { schemaOf } = readDesign('');
    expect(schemaOf('pump.beam.radius')).toMatchObject({ kind: 'quantity', dimension: 'length' });
    expect(schemaOf('surfaces[3].damage_threshold.fluence')).toMatchObject({ kind: 'quantity', dimension: 'fluence' });
    expect(schemaOf('q_switch.closed_loss')).toMatchObject({ default: expect.stringContaining('not judged') });
    expect(schemaOf('resonator.beam')?.description).toBe('The laser mode in the gain medium.');
    expect(schemaOf('')?.kind).toBe('section');
    for (const path of [
      'pump.nothing',
      'pump[0]',
      'surfaces.name',
      'pump.power.more',
      'constructor',
      'pump.toString',
    ]) {
      expect(schemaOf(path)).toBeUndefined();
    }
  });
});

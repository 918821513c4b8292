import { describe, expect, test } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import type { Problem } from '../../extension/core/report/problem.ts';
import { demo } from '../explore/designs.ts';

const SECTIONS = ['gain_medium', 'pump', 'resonator', 'q_switch'] as const;

/** The text with the first fix of its first problem of a code. */
function mended(text: string, code: string, pick: (problem: Problem) => boolean = () => true): string {
  const problem = analyse(text).problems.find((one) => one.code === code && pick(one));
  const [fix] = problem?.fixes ?? [];
  if (fix === undefined) throw new Error(`no fix for ${code}: ${problem?.message}`);
  return text.slice(0, fix.range.start) + fix.text + text.slice(fix.range.end);
}

/** Until no key is missing. */
function filled(text: string): string {
  let all = text;
  for (let round = 0; round < 20 && analyse(all).problems.some(({ code }) => code === 'missing-key'); round++) {
    all = mended(all, 'missing-key');
  }
  return all;
}

const errors = (text: string) => analyse(text).problems.filter(({ severity }) => severity === 'error');

describe('a missing section', () => {
  test.each(SECTIONS)('%s is filled from the schema, the rest untouched', (section) => {
    const without = demo.replace(new RegExp(`^${section}:\\n(?:  .*\\n)+`, 'm'), '');
    expect(without).not.toContain(`\n${section}:`);
    const text = mended(without, 'missing-key');
    expect(text.startsWith(without.trimEnd())).toBe(true);
    expect(errors(text).filter(({ code }) => code !== 'requirement-missed')).toEqual([]);
  });

  test('a file with nothing but its format grows into a design that gives a pulse', () => {
    for (const end of ['', '\n', '\r\n', ' # one\n']) {
      const text = filled(`format: 1${end}`);
      expect(analyse(text).prediction?.pulse, text).toBeDefined();
      expect(errors(text)).toEqual([]);
    }
  });

  test('in flow style it goes before the brace', () => {
    const text = filled('{ format: 1, gain_medium: { material: Nd:YAG, length: 60 mm }, pump: {} }\n');
    expect(text.split('\n')).toHaveLength(2);
    expect(errors(text)).toEqual([]);
  });
});

describe('a missing key', () => {
  test.each([
    ['  length: 60 mm\n', ''],
    ['  duration: 200 us\n', ''],
    ['  power: 600 W ± 3 % # at the rod, seven bars at 90 A\n', ''],
    ['profile: flat, ', ''],
    ['{ profile: flat, radius: 1.7 mm }', '{ profile: flat }'],
    ['    place: outside\n', ''],
    ['fluence: 5 J/cm2, ', ''],
  ])('comes back for %j', (line, rest) => {
    const without = demo.replace(line, rest);
    const text = mended(without, 'missing-key');
    expect(analyse(text).problems.filter(({ code }) => code === 'missing-key')).toEqual([]);
    // Only an insertion: what was there is still there, in order.
    const at = [...without].findIndex((character, index) => text[index] !== character);
    expect(text.startsWith(without.slice(0, at))).toBe(true);
    expect(text.endsWith(without.slice(at))).toBe(true);
  });

  test('with Windows line ends stays one line', () => {
    const without = demo.replace('  length: 60 mm\n', '').replaceAll('\n', '\r\n');
    expect(errors(mended(without, 'missing-key'))).toEqual([]);
  });

  test('of an aliased section is written where the section is', () => {
    const text = demo
      .replace('beam: { profile: flat, radius: 1.7 mm }', 'beam: *b')
      .replace('title:', 'x-beam: &b { profile: flat }\ntitle:');
    const whole = mended(text, 'missing-key');
    expect(whole).toContain('x-beam: &b { profile: flat, radius: 1.7 mm }');
    expect(errors(whole)).toEqual([]);
  });
});

describe('a key without a value', () => {
  test.each([
    ['duration: 200 us', 'duration:'],
    ['kind: pulsed', 'kind:'],
    ['radius: 1.7 mm }', 'radius: }'],
  ])('%s gets the example', (whole, bare) => {
    const text = mended(demo.replace(whole, bare), 'missing-value');
    expect(errors(text)).toEqual([]);
  });
});

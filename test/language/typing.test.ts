import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { typeThrough } from './typing.ts';

const folder = (name: string) => new URL(`../designs/${name}/`, import.meta.url);
const designs = ['good', 'checks', 'bad'].flatMap((name) =>
  readdirSync(folder(name)).map((file) => ({
    name: `${name}/${file}`,
    text: readFileSync(new URL(file, folder(name)), 'utf8'),
  })),
);
// Evenly over sound designs, those that a check finds something in, and broken ones.
const typed = designs.filter((_, index) => index % Math.floor(designs.length / 20) === 0).slice(0, 20);

describe('typed character by character', () => {
  test('twenty designs are there to be typed', () => {
    expect(typed).toHaveLength(20);
  });

  test.each(typed)('$name shows what its text says, and nothing else', ({ text }) => {
    const { states, faults } = typeThrough(text);
    expect(faults.slice(0, 5)).toEqual([]);
    expect(states).toBe(text.length);
  });

  test('most of a sound design predicts a pulse once it is whole', () => {
    const sound = designs.find(({ name }) => name.endsWith('good/hail_lidar.gainmodule.yaml'));
    expect(typeThrough(sound?.text ?? '').predicted).toBeGreaterThan(100);
  });
});

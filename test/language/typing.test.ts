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
const [demo, others] = [designs.filter(isDemo), designs.filter((design) => !isDemo(design))];
// Evenly over sound designs, those that a check finds something in, and broken ones.
const typed = others.filter((_, index) => index % Math.floor(others.length / 19) === 0).slice(0, 19);

function isDemo({ name }: { readonly name: string }): boolean {
  return name === 'good/hail_lidar.gainmodule.yaml';
}

describe('typed character by character', () => {
  test('twenty designs are there to be typed', () => {
    expect([...demo, ...typed]).toHaveLength(20);
  });

  test.each(typed)('$name shows what its text says, and nothing else', ({ text }) => {
    const { states, faults } = typeThrough(text);
    expect(faults.slice(0, 5)).toEqual([]);
    expect(states).toBe(text.length);
  });

  test.each(demo)('$name does so too, and predicts a pulse from its last section on', ({ text }) => {
    const { states, predicted, faults } = typeThrough(text);
    expect(faults.slice(0, 5)).toEqual([]);
    expect(states).toBe(text.length);
    expect(predicted).toBeGreaterThan(100);
  });
});

import { expect, test } from 'vitest';
import { completion } from '../../extension/language/completion/completion.ts';
import { hover } from '../../extension/language/hover.ts';
import { documentSymbols } from '../../extension/language/symbols.ts';
import { demo } from '../explore/designs.ts';
import { bench } from './bench.ts';

const surface = (index: number) =>
  `  - { name: s${index}, place: outside, beam_radius: 5 mm ± 1 %, damage_threshold: { fluence: 10 J/cm2 ± 10 %, pulse_width: 10 ns, wavelength: 1064 nm } }\n`;
const many = demo.replace(
  'requirements:',
  `${Array.from({ length: 700 }, (_, index) => surface(index)).join('')}\nrequirements:`,
);

test('a design with hundreds of surfaces and tolerances asks for no more predictions than a hover can take', () => {
  const here = bench(many);
  expect(here.subject.analysis.prediction?.surfaces.length).toBe(703);
  expect(here.subject.explorer.parameters()).toHaveLength(400);
  expect(here.subject.explorer.spreads()).toEqual({});
  expect(hover(here.subject, here.at('title:'))).toBeDefined();
  expect(documentSymbols(here.subject)).toHaveLength(8);
});

test('thousands of acceptances cost no more than the first five hundred', () => {
  const text = `${demo}${'# accept hold-off: a\n'.repeat(9000)}`;
  const { problems } = bench(text).subject.analysis;
  expect(problems.filter(({ code }) => code === 'acceptance-unused')).toHaveLength(500);
});

test('completion at the end of a very long text is given up', () => {
  const here = bench(`${demo}${'# note\n'.repeat(40_000)}pu`);
  expect(completion(here.subject, here.subject.text.length)).toEqual([]);
});

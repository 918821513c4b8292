import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { analyse, waveform } from '../../extension/core/analyse.ts';
import { PROBLEM_CODES } from '../../extension/core/checks/codes.ts';
import { predictionJson } from '../../extension/core/report/json.ts';
import { predictionText } from '../../extension/core/report/text.ts';
import { generator, mutate } from './mutate.ts';

const folder = join(dirname(fileURLToPath(import.meta.url)), '../designs/good');
const seeds = readdirSync(folder).map((file) => readFileSync(join(folder, file), 'utf8'));
const CODES = new Set(PROBLEM_CODES.map(({ code }) => code));
const DESIGNS = 20_000;

/** The bounds on work that DEVELOPERS.md states. */
const MOST_PROBLEMS = 160;
const MOST_OPENINGS = 240;
const MOST_STEPS = 24_000;

/** Paths of numbers that are not finite. */
function unsound(value: unknown, path = ''): string[] {
  if (typeof value === 'number') return Number.isFinite(value) ? [] : [path];
  if (value === null || typeof value !== 'object') return [];
  return Object.entries(value).flatMap(([key, inner]) => unsound(inner, `${path}.${key}`));
}

describe('analyse, whatever the text', () => {
  it(`gives sound results for ${DESIGNS} mutated designs`, () => {
    const random = generator(20261201);
    let predicted = 0;
    let integrated = 0;
    for (let i = 0; i < DESIGNS; i++) {
      const text = mutate(seeds[i % seeds.length]!, random);
      const analysis = analyse(text);
      const { prediction, problems, outcome } = analysis;
      const about = () => `design ${i}:\n${text}`;
      if (unsound(prediction).length > 0) expect.fail(`${unsound(prediction).join(', ')} in ${about()}`);
      if (problems.length > MOST_PROBLEMS) expect.fail(`${problems.length} problems in ${about()}`);
      for (const { range, code, message } of problems) {
        const inside = range.start >= 0 && range.end >= range.start && range.end <= text.length;
        if (!inside || !CODES.has(code)) expect.fail(`${code} ${range.start}-${range.end} in ${about()}`);
        if (/NaN|Infinity|undefined|\[object/.test(message) && !/NaN|Infinity|inf/i.test(text))
          expect.fail(`${message} in ${about()}`);
      }
      if (!prediction && !problems.some(({ severity }) => severity === 'error'))
        expect.fail(`no word of why in ${about()}`);
      if (prediction && !prediction.pulse && !problems.some(({ severity }) => severity === 'error'))
        expect.fail(`no pulse and no error in ${about()}`);
      if (!outcome) continue;
      predicted++;
      if (prediction?.model === 'time_integration') integrated++;
      const { openings, steps } = outcome.train.work;
      if (openings > MOST_OPENINGS || steps > MOST_STEPS)
        expect.fail(`${openings} openings, ${steps} steps in ${about()}`);
      if (i % 20 === 0) {
        const course = waveform(analysis, 100);
        if (unsound(course).length > 0) expect.fail(`waveform ${unsound(course).join(', ')} in ${about()}`);
        expect(predictionText('a', text, analysis)).not.toMatch(/NaN|Infinity|undefined/);
        expect(() => JSON.parse(predictionJson('a', text, analysis))).not.toThrow();
      }
    }
    // The mutations must reach the physics, not only the parser.
    expect(predicted).toBeGreaterThan(DESIGNS / 4);
    expect(integrated).toBeGreaterThan(10);
  });
});

import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { readDesign } from '../../extension/core/design/read.ts';

const good = new URL('../designs/good/', import.meta.url);
const bad = new URL('../designs/bad/', import.meta.url);

function designs(folder: URL): readonly (readonly [name: string, text: string])[] {
  const names = readdirSync(folder).filter((name) => name.endsWith('.gainmodule.yaml'));
  return names.map((name) => [name, readFileSync(new URL(name, folder), 'utf8')]);
}

/** `line: code` of each `# expect:` in a text, and of each problem found. */
function expected(text: string): readonly string[] {
  return text.split('\n').flatMap((line, index) => {
    const codes = /# expect: ([\w-]+(?:, [\w-]+)*)/.exec(line)?.[1]?.split(', ') ?? [];
    return codes.map((code) => `${index + 1}: ${code}`);
  });
}

function found(text: string): readonly string[] {
  return readDesign(text).problems.map(
    ({ code, range }) => `${text.slice(0, range.start).split('\n').length}: ${code}`,
  );
}

describe('good designs', () => {
  test.each(designs(good))('%s reads without a problem', (_, text) => {
    expect(readDesign(text).problems).toEqual([]);
  });
});

describe('bad designs', () => {
  test('there are enough of them', () => {
    expect(designs(bad).length).toBeGreaterThanOrEqual(50);
  });

  test.each(designs(bad))('%s has the problems that it says it has, and no others', (_, text) => {
    expect(expected(text).length).toBeGreaterThan(0);
    expect(found(text)).toEqual(expected(text));
  });

  test.each(designs(bad))('%s underlines part of one line, and says what to do in a sentence', (_, text) => {
    for (const { range, message } of readDesign(text).problems) {
      if (text.trimStart() !== text.slice(range.start).trimStart()) expect(range.end).toBeGreaterThan(range.start);
      expect(text.slice(range.start, range.end)).not.toMatch(/\n|^ | $|# expect/);
      expect(message).toMatch(/^[A-Z`].*[.?]$/s);
      expect(message.length).toBeLessThan(400);
    }
  });
});

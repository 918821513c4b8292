import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { PROBLEM_CODES } from '../../extension/core/checks/codes.ts';
import { anchorLines } from '../../extension/editor/check-links.ts';

test('a section is found by its heading or anchor, the first of two, and no other line counts', () => {
  const markdown = [
    '# Checks',
    '## hold-off: the switch does not hold off\r',
    'missing-unit',
    '### `missing-unit`',
    '<a id="no-pulse"></a>',
    '## hold-off',
    '## two words',
  ];
  expect([...anchorLines(markdown.join('\n'))]).toEqual([
    ['hold-off', 2],
    ['missing-unit', 4],
    ['no-pulse', 5],
  ]);
});

test('every problem that can be raised has a line to link to in the shipped explanation', () => {
  const markdown = readFileSync(new URL('../../extension/docs/checks.md', import.meta.url), 'utf8');
  const lines = anchorLines(markdown);
  expect(PROBLEM_CODES.map(({ code }) => code).filter((code) => !lines.has(code))).toEqual([]);
});

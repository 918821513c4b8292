import { readFileSync } from 'node:fs';
import { expect, test } from 'vitest';
import { PROBLEM_CODES } from '../../extension/core/checks/codes.ts';
import { anchorLines } from '../../extension/editor/check-links.ts';

test('a section is found by its heading, the first of two, and no other line counts', () => {
  const lines = anchorLines(
    '# Checks\n\n## hold-off\r\ntext\n### `missing-unit`\nhold-off\n## hold-off\n## Two words\n',
  );
  expect(lines.get('hold-off')).toBe(3);
  expect(lines.get('missing-unit')).toBe(5);
  expect(lines.has('Two words')).toBe(false);
});

test('every problem that can be raised has a line to link to in the shipped explanation', () => {
  const markdown = readFileSync(new URL('../../extension/docs/checks.md', import.meta.url), 'utf8');
  const lines = anchorLines(markdown);
  expect(PROBLEM_CODES.map(({ code }) => code).filter((code) => !lines.has(code))).toEqual([]);
});

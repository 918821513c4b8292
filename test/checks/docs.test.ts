import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { PROBLEM_CODES } from '../../extension/core/checks/codes.ts';
import {
  COATING_MEAN,
  SCALED_RANGE,
  SHORTEST_SCALED,
  SQUARE_ROOT,
  WAVELENGTH_MISMATCH,
} from '../../extension/core/physics/damage.ts';

const markdown = readFileSync(new URL('../../extension/docs/checks.md', import.meta.url), 'utf8');

interface Section {
  readonly code: string;
  readonly title: string;
  readonly lines: readonly string[];
}

const [opening = '', ...parts] = markdown.split(/^(?=<a id=)/m);
const sections: readonly Section[] = parts.map((part) => {
  const [anchor = '', blank, heading = '', ...rest] = part.trimEnd().split('\n');
  return {
    code: /^<a id="([a-z-]+)"><\/a>$/.exec(anchor)?.[1] ?? anchor,
    title: blank === '' ? heading.replace(/^## /, '') : 'no blank line before the heading',
    lines: rest.filter((line) => line !== ''),
  };
});

const section = (code: string) => sections.find((found) => found.code === code)?.lines.join('\n') ?? '';

describe('checks.md', () => {
  test('has a section for every code, in order, and no other', () => {
    expect(sections.map(({ code, title }) => ({ code, title }))).toEqual(
      PROBLEM_CODES.map(({ code, title }) => ({ code, title })),
    );
    expect(markdown.match(/^#+ .*/gm)).toEqual([
      '# What Giant Pulse checks',
      ...PROBLEM_CODES.map(({ title }) => `## ${title}`),
    ]);
  });

  test('links only to anchors that are there, and every one of the index', () => {
    const links = [...markdown.matchAll(/\]\(([^)]+)\)/g)].map((match) => match[1] ?? '');
    const anchors = sections.map(({ code }) => `#${code}`);
    expect(links.filter((link) => !anchors.includes(link))).toEqual([]);
    const indexed = [...opening.matchAll(/\[([a-z-]+)\]\(#([a-z-]+)\)/g)].map((match) => [match[1], match[2]]);
    expect(indexed.filter(([text, target]) => text !== target)).toEqual([]);
    expect(new Set(indexed.map(([text]) => text)).size).toBe(indexed.length);
  });

  test.each(sections.map(({ code }) => code))('%s names its code and severity, and stays short', (code) => {
    const lines = sections.find((found) => found.code === code)?.lines ?? [];
    expect(lines[0]).toMatch(/^`[a-z-]+` · (error|warning|information|warning or information) · \S/);
    expect(lines[0]).toContain(`\`${code}\``);
    expect(lines.length).toBeGreaterThanOrEqual(2);
    expect(lines.length).toBeLessThanOrEqual(10);
  });

  test('opens with the caution', () => {
    for (const words of ['predictions', 'blind and burn', 'local codes', 'laser safety officer', 'licensed practice'])
      expect(opening).toContain(words);
  });

  test('states the thresholds that the checks use', () => {
    const scaling = section('fluence-over-threshold');
    expect(scaling).toContain(`m = ${SQUARE_ROOT} towards shorter`);
    expect(scaling).toContain(`${COATING_MEAN} towards longer`);
    const conditions = section('threshold-conditions');
    expect(conditions).toContain(`more than ${WAVELENGTH_MISMATCH * 100} %`);
    expect(conditions).toContain(`below ${SHORTEST_SCALED * 1e12} ps`);
    expect(conditions).toContain(`outside ${SCALED_RANGE[0] * 1e12} ps to ${Math.round(SCALED_RANGE[1] * 1e9)} ns`);
    expect(markdown).toContain(`= ${(-Math.log(0.5) - Math.log(0.94)).toFixed(3)}`);
  });

  test('uses words, not Greek letters', () => {
    expect(markdown).not.toMatch(/[α-ωΑ-Ω]/);
  });
});

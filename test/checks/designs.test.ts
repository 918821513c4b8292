import { readdirSync, readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import { PROBLEM_CODES } from '../../extension/core/checks/codes.ts';
import { CHECKS } from '../../extension/core/checks/registry.ts';

const folder = new URL('../designs/checks/', import.meta.url);
const names = readdirSync(folder).filter((name) => name.endsWith('.gainmodule.yaml'));
const read = (name: string) => readFileSync(new URL(name, folder), 'utf8');

/** `line: code` of each `# expect:`, in the order of the text. */
function expected(text: string): string[] {
  return text.split('\n').flatMap((line, index) => {
    const codes = /# expect: ([\w-]+(?:, [\w-]+)*)/.exec(line)?.[1]?.split(', ') ?? [];
    return codes.map((code) => `${index + 1}: ${code}`);
  });
}

function found(text: string): string[] {
  return analyse(text).problems.map(({ code, range }) => `${text.slice(0, range.start).split('\n').length}: ${code}`);
}

/** Each finding of the design named after a code: where and how bad. */
const SEVERITIES: Readonly<Record<string, string>> = {
  'no-pulse': 'error',
  'hold-off': 'error',
  'hold-off-unknown': 'information',
  'requirement-missed': 'error',
  'requirement-not-judged': 'warning',
  'fluence-over-threshold': 'error',
  'fluence-near-threshold': 'warning',
  'fluence-after-pause': 'warning',
  'impossible-timing': 'error',
  'opens-before-pump-end': 'warning',
  'train-unsettled': 'warning',
  'second-pulse': 'warning',
  'pump-wavelength': 'error',
  'medium-too-long': 'error',
  'too-many-excited': 'error',
  'beam-beyond-medium': 'warning',
  'low-reflectivity': 'information',
  'few-round-trips': 'information',
  'long-pulse': 'information',
  'lower-level-bottleneck': 'information',
  'no-table-figure': 'error',
  'switch-not-modelled': 'error',
};

describe('a design for every check', () => {
  test('none is without one, and none is for a check that does not exist', () => {
    const codes = names.map((name) => name.replace('.gainmodule.yaml', ''));
    expect(CHECKS.map(({ code }) => code).filter((code) => !codes.includes(code))).toEqual([]);
    const known = PROBLEM_CODES.map(({ code }) => code);
    expect(codes.filter((code) => !known.includes(code))).toEqual([]);
  });

  test.each(names)('%s has the findings that it says it has, and no others', (name) => {
    const text = read(name);
    expect(expected(text).map((line) => line.split(': ')[1])).toContain(name.replace('.gainmodule.yaml', ''));
    expect(found(text)).toEqual(expected(text));
  });

  test.each(names)('%s is as severe as the sheet says', (name) => {
    const code = name.replace('.gainmodule.yaml', '');
    const severities = analyse(read(name)).problems.flatMap((p) => (p.code === code ? [p.severity] : []));
    // A threshold measured far off is a warning where nothing is scaled, else a note.
    if (code === 'threshold-conditions') expect(severities).toEqual(['warning', 'information', 'warning']);
    else expect([...new Set(severities)]).toEqual([SEVERITIES[code]]);
  });

  test.each(names)('%s says it in whole sentences, on part of one line', (name) => {
    const text = read(name);
    for (const { message, range } of analyse(text).problems) {
      expect(message).toMatch(/^[A-Z0-9`].*[.?]$/);
      expect(message.length).toBeLessThan(300);
      expect(message, 'words, not Greek letters').not.toMatch(/[α-ωΑ-Ω]/);
      expect(message).not.toMatch(/NaN|Infinity|undefined|null|\[object/);
      expect(range.end).toBeGreaterThan(range.start);
      expect(text.slice(range.start, range.end)).not.toContain('\n');
    }
  });

  test('validity holds the notes of the prediction, each once', () => {
    for (const name of names) {
      const { prediction, problems } = analyse(read(name));
      const notes = problems.filter((p) => p.severity === 'information').map((p) => p.code);
      expect([...(prediction?.validity ?? [])].map((note) => note.code).sort(), name).toEqual(notes.sort());
    }
  });
});

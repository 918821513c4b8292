import { readFileSync } from 'node:fs';
import { describe, expect, test } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import { CAUTION } from '../../extension/core/report/caution.ts';
import { countText, findingLines } from '../../extension/core/report/findings-text.ts';
import { predictionText } from '../../extension/core/report/text.ts';
import { DESIGNS, demo, design } from './designs.ts';

const textOf = (text: string, file = 'build_c.gainmodule.yaml') => predictionText(file, text, analyse(text));

describe('prediction as text', () => {
  test('of the demo is what the engineer is meant to read', () => {
    expect(textOf(demo, 'hail_lidar.gainmodule.yaml')).toBe(
      readFileSync(new URL('hail_lidar.txt', import.meta.url), 'utf8'),
    );
  });

  test.each(DESIGNS)('%s stays within 80 columns, ends with the caution and holds no stray figure', (_, text) => {
    const lines = textOf(text).split('\n');
    expect(lines.filter((line) => line.length > 80 || line !== line.trimEnd())).toEqual([]);
    expect(lines.join('\n').endsWith(`\n\n${CAUTION}\n`)).toBe(true);
    expect(lines.join('\n')).not.toMatch(/NaN|Infinity|undefined|null|\[object|—/);
  });

  test.each(DESIGNS)('%s tells every finding with its place', (_, text) => {
    const joined = textOf(text).replace(/\s+/g, ' ');
    const { problems } = analyse(text);
    if (problems.length === 0) expect(joined).toContain('No findings.');
    for (const { severity, message, code } of problems)
      expect(joined).toContain(`${severity}: ${message.replace(/\s+/g, ' ')} [${code}]`);
  });

  test('tells what stands in the way where there is no prediction, and the lack of a pulse where there is one', () => {
    expect(textOf('format: 1\n')).toContain('No prediction: the findings say what stands in the way.');
    expect(textOf(design('checks/no-pulse.gainmodule.yaml'))).toContain('Pulse (depletion form)\n  none\n');
  });

  test('names a design without a title by its file, once', () => {
    const [first, second] = textOf(design('checks/hold-off.gainmodule.yaml')).split('\n');
    expect([first, second]).toEqual(['build_c.gainmodule.yaml', '']);
  });

  test('says where a filled-in figure comes from, and whether it is only recalled', () => {
    const text = textOf(design('checks/hold-off.gainmodule.yaml')).replace(/\s+/g, ' ');
    expect(text).toContain(
      'emission_cross_section: 2.8e-19 cm2, Nd:YAG at 1064 nm; Koechner, Solid-State Laser Engineering (from memory)',
    );
    expect(text).toMatch(/refractive_index: 1\.81465, [^;]*; Zelmon 1998, [^(]*\(refractiveindex\.info, CC0\) gain/);
    expect(text).toContain("q_switch.opens_at: the pump's end");
  });

  test('marks what is missed in capitals', () => {
    const table = textOf(design('checks/requirement-missed.gainmodule.yaml'));
    expect(table).toMatch(/^ {2}pulse energy .* at least 15\.0 mJ {3}MISSED$/m);
    expect(table).toMatch(/^ {2}repetition rate .* 20\.0 Hz to 20\.0 Hz {6}met$/m);
    expect(table).toMatch(/^ {2}hold-off margin .* at least 1\.50 {6}met$/m);
  });

  test('keeps control characters, line breaks and changes of direction of a title away from the terminal', () => {
    const title = 'title: "Build\\e[31m D\\nsecond \\u202Eline\\u2028end"';
    const [first] = textOf(`${title}\n${design('checks/hold-off.gainmodule.yaml')}`).split('\n');
    expect(first).toBe('Build [31m D second line end');
  });

  test('breaks a long title and clips a long name', () => {
    const name = 'output coupler, inner face';
    const text = `title: ${'x'.repeat(200)} end\n${design('checks/fluence-near-threshold.gainmodule.yaml').replace(name, '😀'.repeat(60))}`;
    const lines = textOf(text).split('\n');
    expect(lines.filter((line) => line.length > 80)).toEqual([]);
    expect(lines.slice(0, 3).join('')).toBe(`${'x'.repeat(200)} end`);
    expect(lines.join('\n')).not.toMatch(/[\ud800-\udbff](?![\udc00-\udfff])/);
  });
});

describe('findings as lines', () => {
  test('file, line, column, severity, message and code', () => {
    const text = design('checks/no-pulse.gainmodule.yaml').replace(/\n/g, '\r\n');
    const [line, ...more] = findingLines('a b/ü.gainmodule.yaml', text, analyse(text).problems);
    expect(line).toMatch(/^a b\/ü\.gainmodule\.yaml:9:10: error: No pulse, below threshold: .*\. \[no-pulse\]$/);
    expect(more).toEqual([]);
  });

  test.each(DESIGNS)('%s gives one line a finding, without breaks', (_, text) => {
    const { problems } = analyse(text);
    const lines = findingLines('f', text, problems);
    expect(lines).toHaveLength(problems.length);
    for (const line of lines)
      expect(line).toMatch(/^f:[1-9]\d*:[1-9]\d*: (error|warning|information): .+ \[[a-z-]+\]$/);
  });

  test('counts in words', () => {
    const of = (name: string) => countText(analyse(design(`checks/${name}.gainmodule.yaml`)).problems);
    expect(of('requirement-missed')).toBe('2 errors, 0 warnings');
    expect(of('no-pulse')).toBe('1 error, 0 warnings');
    expect(of('threshold-conditions')).toBe('0 errors, 2 warnings, 1 note');
    expect(of('low-reflectivity')).toBe('0 errors, 0 warnings, 2 notes');
  });
});

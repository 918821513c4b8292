import { readFileSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { demo, design, folderWith, giantpulse, root } from './command.ts';

const folder = folderWith({
  'hail_lidar.gainmodule.yaml': demo,
  'weak.gainmodule.yaml': design('checks/no-pulse.gainmodule.yaml'),
  'broken.gainmodule.yaml': 'format: 1\npump: {',
  'prelasing.gainmodule.yaml': design('checks/hold-off.gainmodule.yaml'),
  'ü b/𝛌 laser.gainmodule.yaml': demo,
});
afterAll(() => rmSync(folder, { recursive: true }));
const run = (...args: readonly string[]) => giantpulse(folder, ...args);

describe('giantpulse predict', () => {
  test('prints the prediction and nothing else', () => {
    const stdout = readFileSync(join(root, 'test/report/hail_lidar.txt'), 'utf8');
    expect(run('predict', 'hail_lidar.gainmodule.yaml')).toEqual({ status: 0, stdout, stderr: '' });
    expect(run('predict', '--format', 'text', 'hail_lidar.gainmodule.yaml').stdout).toBe(stdout);
  });

  test.each([['--format', 'json'], ['--format=json'], ['-f', 'json']])(
    'prints one JSON object with %s %s',
    (...options) => {
      const { status, stdout, stderr } = run('predict', 'hail_lidar.gainmodule.yaml', ...options);
      expect([status, stderr]).toEqual([0, '']);
      const printed: unknown = JSON.parse(stdout);
      expect(printed).toMatchObject({ file: 'hail_lidar.gainmodule.yaml', findings: [] });
    },
  );

  test('a name with blanks and letters from afar is told as it was given', () => {
    const { status, stdout } = run('predict', '-f', 'json', 'ü b/𝛌 laser.gainmodule.yaml');
    expect(status).toBe(0);
    expect(stdout).toContain('"file": "ü b/𝛌 laser.gainmodule.yaml"');
  });

  test.each([
    ['hail_lidar.gainmodule.yaml', 0],
    ['prelasing.gainmodule.yaml', 0],
    ['weak.gainmodule.yaml', 1],
    ['broken.gainmodule.yaml', 1],
    ['absent.gainmodule.yaml', 2],
    ['ü b', 2],
  ] as const)('%s exits with %d, whatever the format', (file, status) => {
    expect(['text', 'json'].map((format) => run('predict', file, '--format', format).status)).toEqual([status, status]);
  });

  test.each([
    ['no file', [], "error: missing required argument 'file'\n"],
    ['a file that is not there', ['absent.gainmodule.yaml'], 'giantpulse: no such file: absent.gainmodule.yaml\n'],
    ['a folder', ['ü b'], 'giantpulse: a folder, not a design: ü b\n'],
    ['an unknown option', ['--fast', 'weak.gainmodule.yaml'], "error: unknown option '--fast'\n"],
    [
      'an unknown format',
      ['--format', 'xml', 'weak.gainmodule.yaml'],
      "error: option '-f, --format <format>' argument 'xml' is invalid. Allowed choices are text, json.\n",
    ],
    [
      'a format left out',
      ['weak.gainmodule.yaml', '--format'],
      "error: option '-f, --format <format>' argument missing\n",
    ],
    [
      'two files',
      ['weak.gainmodule.yaml', 'hail_lidar.gainmodule.yaml'],
      "error: too many arguments for 'predict'. Expected 1 argument but got 2.\n",
    ],
  ] as const)('does not run with %s', (_, args, stderr) => {
    expect(run('predict', ...args)).toEqual({ status: 2, stdout: '', stderr });
  });
});

describe('giantpulse', () => {
  test('--version is that of the package', () => {
    const manifest: unknown = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));
    const { status, stdout, stderr } = run('--version');
    expect([status, stderr]).toEqual([0, '']);
    expect(manifest).toMatchObject({ version: stdout.trim() });
    expect(run('-V').stdout).toBe(stdout);
  });

  test.each([['--help'], ['-h'], ['predict', '--help'], ['check', '--help']])('%s %s fits a terminal', (...args) => {
    const { status, stdout, stderr } = run(...args);
    expect([status, stderr]).toEqual([0, '']);
    expect(stdout).toMatch(/^Usage: giantpulse /);
    expect(stdout.split('\n').filter((line) => line.length > 80)).toEqual([]);
  });

  test('--help tells commands, exit codes and the caution', () => {
    const { stdout } = run('--help');
    for (const words of ['predict [options] <file>', 'check <files...>', 'Exit codes: 0', 'laser safety'])
      expect(stdout).toContain(words);
  });

  test('without a command it helps on stderr and does not run', () => {
    const { status, stdout, stderr } = run();
    expect([status, stdout]).toEqual([2, '']);
    expect(stderr).toMatch(/^Usage: giantpulse /);
  });

  test.each([
    [['forecast'], "error: unknown command 'forecast'\n"],
    [['--fast'], "error: unknown option '--fast'\n"],
  ])('%s does not run', (args, stderr) => {
    expect(run(...args)).toEqual({ status: 2, stdout: '', stderr });
  });
});

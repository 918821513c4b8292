import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { demo, design, folderWith, giantpulse } from './command.ts';

const NOTE = design('checks/hold-off-unknown.gainmodule.yaml');
const WARNING = design('checks/opens-before-pump-end.gainmodule.yaml');
const ERROR = design('checks/pump-wavelength.gainmodule.yaml');
const SAID =
  "8:15: error: The pump wavelength (1070 nm) must be shorter than the laser's (1064 nm): a pump photon has to carry more energy than a laser photon. [pump-wavelength]\n";

const folder = folderWith({
  'clean.gainmodule.yaml': demo,
  'note.gainmodule.yaml': NOTE,
  'warning.gainmodule.yaml': WARNING,
  'error.gainmodule.yaml': ERROR,
  'tree/one.gainmodule.yaml': demo,
  'tree/deep/down/two.gainmodule.yml': ERROR,
  'tree/deep/notes.yaml': 'not: a design',
  'tree/node_modules/three.gainmodule.yaml': ERROR,
  'tree/.hidden/four.gainmodule.yaml': ERROR,
  'odd [1]{a,b}!/inside.gainmodule.yaml': ERROR,
  'odd 1/outside.gainmodule.yaml': demo,
  'a b/ü 𝛌.gainmodule.yaml': ERROR,
  '-dash.gainmodule.yaml': ERROR,
});
mkdirSync(join(folder, 'empty'));
afterAll(() => rmSync(folder, { recursive: true }));
const run = (...args: readonly string[]) => giantpulse(folder, 'check', ...args);

describe('giantpulse check', () => {
  test.each([
    ['a clean design', ['clean.gainmodule.yaml'], 0, '', '1 design checked: 0 errors, 0 warnings\n'],
    [
      'an error',
      ['error.gainmodule.yaml'],
      1,
      `error.gainmodule.yaml:${SAID}`,
      '1 design checked: 1 error, 0 warnings\n',
    ],
    [
      'several files, in their order',
      ['error.gainmodule.yaml', 'clean.gainmodule.yaml', './a b/ü 𝛌.gainmodule.yaml'],
      1,
      `error.gainmodule.yaml:${SAID}./a b/ü 𝛌.gainmodule.yaml:${SAID}`,
      '3 designs checked: 2 errors, 0 warnings\n',
    ],
    [
      'a file named twice, once',
      ['error.gainmodule.yaml', 'error.gainmodule.yaml'],
      1,
      `error.gainmodule.yaml:${SAID}`,
      '1 design checked: 1 error, 0 warnings\n',
    ],
    [
      'a folder, its hidden parts and packages left out',
      ['tree'],
      1,
      `tree/deep/down/two.gainmodule.yml:${SAID}`,
      '2 designs checked: 1 error, 0 warnings\n',
    ],
    [
      'a folder with a stroke behind it',
      ['tree/deep/'],
      1,
      `tree/deep/down/two.gainmodule.yml:${SAID}`,
      '1 design checked: 1 error, 0 warnings\n',
    ],
    [
      'a hidden folder that is named',
      ['tree/.hidden'],
      1,
      `tree/.hidden/four.gainmodule.yaml:${SAID}`,
      '1 design checked: 1 error, 0 warnings\n',
    ],
    [
      'a folder named like a pattern',
      ['odd [1]{a,b}!'],
      1,
      `odd [1]{a,b}!/inside.gainmodule.yaml:${SAID}`,
      '1 design checked: 1 error, 0 warnings\n',
    ],
    [
      'a pattern',
      ['{clean,err*}.gainmodule.yaml'],
      1,
      `error.gainmodule.yaml:${SAID}`,
      '2 designs checked: 1 error, 0 warnings\n',
    ],
    [
      'a pattern over folders',
      ['tree/**/*.gainmodule.{yaml,yml}'],
      1,
      `tree/deep/down/two.gainmodule.yml:${SAID}`,
      '2 designs checked: 1 error, 0 warnings\n',
    ],
    [
      'a name that begins with a dash',
      ['--', '-dash.gainmodule.yaml'],
      1,
      `-dash.gainmodule.yaml:${SAID}`,
      '1 design checked: 1 error, 0 warnings\n',
    ],
  ] as const)('%s', (_, args, status, stdout, stderr) => {
    expect(run(...args)).toEqual({ status, stdout, stderr });
  });

  test('warnings and notes are printed and are no failure', () => {
    const { status, stdout, stderr } = run('note.gainmodule.yaml', 'warning.gainmodule.yaml');
    expect(status).toBe(0);
    expect(stdout).toMatch(
      /^note\.gainmodule\.yaml:19:9: information: .+ \[hold-off-unknown\]\nwarning\.gainmodule\.yaml:21:13: warning: .+ \[opens-before-pump-end\]\n$/,
    );
    expect(stderr).toBe('2 designs checked: 0 errors, 1 warning, 1 note\n');
  });

  test.each([
    ['nothing', [], "error: missing required argument 'files'\n"],
    ['a file that is not there', ['no.gainmodule.yaml'], 'giantpulse: no such file or folder: no.gainmodule.yaml\n'],
    [
      'one of several that is not there',
      ['error.gainmodule.yaml', 'no.gainmodule.yaml'],
      'giantpulse: no such file or folder: no.gainmodule.yaml\n',
    ],
    ['an empty folder', ['empty'], 'giantpulse: no *.gainmodule.yaml in empty\n'],
    [
      'a pattern that matches nothing',
      ['none*.gainmodule.yaml'],
      'giantpulse: nothing matches none*.gainmodule.yaml\n',
    ],
    ['an unknown option', ['--fix', 'clean.gainmodule.yaml'], "error: unknown option '--fix'\n"],
  ] as const)('does not run with %s', (_, args, stderr) => {
    expect(run(...args)).toEqual({ status: 2, stdout: '', stderr });
  });

  test('the whole folder below', () => {
    const { status, stderr } = run('.');
    expect(status).toBe(1);
    expect(stderr).toBe('10 designs checked: 5 errors, 1 warning, 1 note\n');
  });

  test('an absolute path is told as it was given', () => {
    const file = join(folder, 'error.gainmodule.yaml');
    expect(run(file).stdout).toBe(`${file}:${SAID}`);
  });
});

import { spawnSync } from 'node:child_process';
import { rmSync, symlinkSync } from 'node:fs';
import { join } from 'node:path';
import { afterAll, describe, expect, test } from 'vitest';
import { runCommand } from '../../extension/cli/command.ts';
import type { World } from '../../extension/cli/world.ts';
import { bundle, demo, design, folderWith, giantpulse } from './command.ts';

const many = Array.from({ length: 90 }, (_, index) => `key_${index}: 1\n`).join('');
const folder = folderWith({
  'clean.gainmodule.yaml': demo,
  'binary.gainmodule.yaml': Uint8Array.from({ length: 4096 }, (_, index) => (index * 97) % 256),
  'utf16.gainmodule.yaml': Buffer.from(`\ufeff${demo}`, 'utf16le'),
  'marked.gainmodule.yaml': `\ufeff${demo.replaceAll('\n', '\r\n')}`,
  'large.gainmodule.yaml': `${demo}# ${'noise '.repeat(10 * 175_000)}\n`,
  'empty.gainmodule.yaml': '',
  ...Object.fromEntries(Array.from({ length: 20 }, (_, index) => [`many/${index}.gainmodule.yaml`, many])),
});
symlinkSync('loop.gainmodule.yaml', join(folder, 'loop.gainmodule.yaml'));
symlinkSync('nowhere.yaml', join(folder, 'dangling.gainmodule.yaml'));
afterAll(() => rmSync(folder, { recursive: true }));

describe('files that are no designs', () => {
  test.each([
    ['binary.gainmodule.yaml', 1, /^binary\.gainmodule\.yaml:1:1: error: .* \[not-text\]\n$/],
    ['utf16.gainmodule.yaml', 1, /^utf16\.gainmodule\.yaml:1:1: error: .*UTF-8\. \[not-text\]\n$/],
    ['large.gainmodule.yaml', 1, /^large\.gainmodule\.yaml:1:1: error: .* \[file-too-large\]\n$/],
    ['empty.gainmodule.yaml', 1, /^empty\.gainmodule\.yaml:1:1: error: .* \[empty-file\]\n$/],
    ['marked.gainmodule.yaml', 0, /^$/],
  ] as const)('check %s exits with %d', (file, status, stdout) => {
    const result = giantpulse(folder, 'check', file);
    expect(result.stdout).toMatch(stdout);
    expect(result.stderr).toMatch(/^1 design checked: /);
    expect(result.status).toBe(status);
    expect(giantpulse(folder, 'predict', '--format', 'json', file).status).toBe(status);
  });

  test.each([
    ['loop.gainmodule.yaml', /^giantpulse: cannot read loop\.gainmodule\.yaml: ELOOP/],
    [`${'n'.repeat(300)}.yaml`, /^giantpulse: cannot read n+\.yaml: ENAMETOOLONG/],
    ['dangling.gainmodule.yaml', /^giantpulse: no such file(?: or folder)?: dangling\.gainmodule\.yaml\n$/],
    ['clean.gainmodule.yaml/inside.yaml', /^giantpulse: cannot read clean\.gainmodule\.yaml\/inside\.yaml: ENOTDIR/],
  ])('%s cannot be read, and the reason comes without a stack', (file, reason) => {
    for (const command of ['predict', 'check']) {
      const { status, stdout, stderr } = giantpulse(folder, command, file);
      expect([status, stdout]).toEqual([2, '']);
      expect(stderr).toMatch(reason);
      expect(stderr).not.toContain('    at ');
    }
  });
});

describe('a reader that goes away', () => {
  // The shell's reader is gone before the command writes; the command's own status goes to stderr.
  const piped = (args: string) =>
    spawnSync(
      'sh',
      ['-c', `{ sleep 0.3; "$0" "$1" ${args}; echo "status $?" >&2; } | head -0`, process.execPath, bundle],
      {
        cwd: folder,
        encoding: 'utf8',
        timeout: 60_000,
      },
    );

  test('ends the output without a word, and the status stands', () => {
    expect(piped('predict clean.gainmodule.yaml').stderr).toBe('status 0\n');
    const { stdout } = giantpulse(folder, 'check', 'many');
    expect(stdout.length, 'more than a pipe holds').toBeGreaterThan(70_000);
    expect(piped('check many').stderr).toBe('20 designs checked: 1900 errors, 0 warnings\nstatus 1\n');
  });
});

describe('a world that fails', () => {
  const worldOf = (change: Partial<World>) => {
    const said = { out: '', err: '' };
    const world: World = {
      kindOf: () => 'file',
      read: (path) => (path === 'locked.yaml' ? locked() : design('checks/no-pulse.gainmodule.yaml')),
      find: async () => [],
      serve: () => Promise.reject(new Error('no server here')),
      version: '0',
      out: (text) => {
        said.out += text;
      },
      err: (text) => {
        said.err += text;
      },
      ...change,
    };
    return { world, said };
  };
  const locked = (): never => {
    throw new Error('EACCES: permission denied');
  };

  test('a file that may not be read is told, the others are checked, and the run counts as failed', async () => {
    const { world, said } = worldOf({});
    expect(await runCommand(['check', 'locked.yaml', 'weak.yaml'], world)).toBe(2);
    expect(said.out).toMatch(/^weak\.yaml:9:10: error: .* \[no-pulse\]\n$/);
    expect(said.err).toBe(
      'giantpulse: cannot read locked.yaml: EACCES: permission denied\n2 designs checked: 1 error, 0 warnings\n',
    );
  });

  test('a fault of ours is visible and exits with 2', async () => {
    const { world, said } = worldOf({
      kindOf: () => {
        throw new Error('broken inside');
      },
    });
    expect(await runCommand(['predict', 'weak.yaml'], world)).toBe(2);
    expect(said.out).toBe('');
    expect(said.err).toMatch(/^giantpulse failed: Error: broken inside/);
  });
});

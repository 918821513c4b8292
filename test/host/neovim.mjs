// The language server in Neovim (Debian's package), set up word for word as extension/docs/editors.md says.
import { spawnSync } from 'node:child_process';
import { chmodSync, cpSync, mkdirSync, mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { delimiter, dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

const here = dirname(fileURLToPath(import.meta.url));
const project = resolve(here, '../..');
const root = mkdtempSync(join(tmpdir(), 'giantpulse-neovim-'));

const setUp = /```lua\n([\s\S]*?)```/.exec(readFileSync(join(project, 'extension/docs/editors.md'), 'utf8'))?.[1];
if (setUp === undefined) throw new Error('editors.md has no set-up for Neovim');
const init = join(root, 'init.lua');
writeFileSync(init, setUp);
const bin = join(root, 'bin');
mkdirSync(bin);
// As npm would put it there.
const command = join(bin, 'giantpulse');
writeFileSync(command, `#!/bin/sh\nexec "${process.execPath}" "${join(project, 'dist/giantpulse.cjs')}" "$@"\n`);
chmodSync(command, 0o755);
cpSync(join(here, 'workspace'), join(root, 'designs'), { recursive: true });

const { stdout, stderr, status } = spawnSync(
  'nvim',
  ['--headless', '-n', '-i', 'NONE', '-u', init, '-c', `luafile ${join(here, 'neovim.lua')}`],
  {
    encoding: 'utf8',
    timeout: 90_000,
    env: {
      PATH: `${bin}${delimiter}${process.env.PATH}`,
      HOME: root,
      XDG_STATE_HOME: root,
      XDG_DATA_HOME: root,
      DESIGNS: join(root, 'designs'),
    },
  },
);
rmSync(root, { recursive: true, force: true });
process.stdout.write(stdout ?? '');
if (!/ 0 failed$/.test((stdout ?? '').trimEnd())) console.error(`nvim ended with ${status}:\n${stderr}`);

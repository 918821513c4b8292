// Packages the extension as giantpulse.vsix, with what its manifest lists and nothing else.
import { spawnSync } from 'node:child_process';
import { readFileSync, statSync } from 'node:fs';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { setUp } from './setup.mjs';

const here = dirname(fileURLToPath(import.meta.url));
const project = resolve(here, '../..');

/** The package's path. Dependencies are bundled, so that none is packed. */
export function packageExtension() {
  const target = join(project, 'giantpulse.vsix');
  const args = [
    'package',
    '--no-dependencies',
    '--allow-missing-repository',
    '--no-rewrite-relative-links',
    '--out',
    target,
  ];
  const { status, stdout, stderr } = spawnSync(
    process.execPath,
    [join(here, 'node_modules/@vscode/vsce/vsce'), ...args],
    {
      cwd: project,
      encoding: 'utf8',
    },
  );
  if (status !== 0) throw new Error(`vsce ended with ${status}:\n${stdout}${stderr}`);
  const { size } = statSync(target);
  if (size >= 1e6) throw new Error(`the package has ${size} bytes, 1 MB is the most`);
  return target;
}

if (process.argv[1] === fileURLToPath(import.meta.url)) {
  setUp();
  const file = packageExtension();
  const { version } = JSON.parse(readFileSync(join(project, 'package.json'), 'utf8'));
  console.log(`giantpulse.vsix, version ${version}: ${(statSync(file).size / 1000).toFixed(0)} kB`);
}

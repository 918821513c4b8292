// Installs the VS Code workbench of the host tests: code-server from npm on the Node.js that it wants, from npm as well.
import { spawnSync } from 'node:child_process';
import { createHash } from 'node:crypto';
import { existsSync, readFileSync, writeFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

const here = dirname(fileURLToPath(import.meta.url));
const workbench = join(here, 'node_modules/code-server/lib/vscode');
const stampFile = join(here, 'node_modules/.host-setup');

/** Does nothing where it has already been done for this lock file. */
export function setUp() {
  const stamp = createHash('sha256')
    .update(readFileSync(join(here, 'package-lock.json')))
    .digest('hex');
  if (existsSync(stampFile) && readFileSync(stampFile, 'utf8') === stamp) return;
  npm(['ci', '--ignore-scripts'], here);
  // What code-server's own install script does, without the native modules that the tests never load.
  npm(['install', '--omit=dev', '--ignore-scripts'], workbench);
  writeFileSync(stampFile, stamp);
}

function npm(args, cwd) {
  console.log(`host: npm ${args.join(' ')}`);
  const { status } = spawnSync('npm', [...args, '--no-audit', '--no-fund', '--loglevel=error'], {
    cwd,
    stdio: 'inherit',
    env: ownEnvironment(),
  });
  if (status !== 0) throw new Error(`npm ${args.join(' ')} ended with ${status}`);
}

/** `npm run` exports variables about the outer package: none of them reaches the nested npm, but where its cache is. */
function ownEnvironment() {
  const kept = /^npm_config_(cache|registry|userconfig)$/i;
  return Object.fromEntries(Object.entries(process.env).filter(([name]) => !/^npm_/i.test(name) || kept.test(name)));
}

// What needs a browser and a real VS Code: `npm run test:system`. Nothing is skipped; each part must close with its own line.
import { spawn } from 'node:child_process';
import { existsSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { setUp } from './setup.mjs';

const here = dirname(fileURLToPath(import.meta.url));

function run(part) {
  const [script, ...args] = part.split(' ');
  return new Promise((done) => {
    console.log(`\n${part}`);
    const child = spawn(process.execPath, [join(here, script), ...args], { stdio: ['ignore', 'pipe', 'inherit'] });
    let output = '';
    child.stdout.on('data', (chunk) => {
      output += chunk;
      process.stdout.write(chunk);
    });
    child.once('exit', () => {
      const closing = /^([1-9]\d*|0(?= passed, [1-9])) passed, (\d+) failed$/.exec(
        output.trimEnd().split('\n').at(-1) ?? '',
      );
      if (closing === null) console.log(`${part} ended without its closing line`);
      done(closing === null ? { passed: 0, failed: 1 } : { passed: Number(closing[1]), failed: Number(closing[2]) });
    });
  });
}

const browser = process.env.CHROMIUM ?? '/usr/bin/chromium';
if (!existsSync(browser))
  throw new Error(`no browser at ${browser}: install Debian's chromium, or name one in CHROMIUM`);
setUp();
// One bundle for both kinds of host: no module of Node's own, which the web worker has not.
await build({
  entryPoints: [join(here, 'suite/index.ts')],
  outfile: join(here, 'dist/suite.cjs'),
  bundle: true,
  platform: 'browser',
  format: 'cjs',
  target: 'es2022',
  external: ['vscode'],
  logLevel: 'warning',
});
const all = [
  'page.mjs',
  'extension-host.mjs',
  'extension-host.mjs web',
  'extension-host.mjs vsix',
  'end-to-end.mjs',
  'neovim.mjs',
  'pre-commit.mjs',
];
// `npm run test:system -- page` runs the parts whose names hold a word.
const [word] = process.argv.slice(2);
const parts = all.filter((part) => word === undefined || part.includes(word));
if (process.env.GIANTPULSE_DESKTOP_CODE !== undefined) parts.push('desktop.mjs');
/** Parts that press keys in a browser, whose failures a second run from a fresh start must confirm. */
const drivenByHand = (part) => part.startsWith('end-to-end');
let passed = 0;
let failed = 0;
for (const part of parts) {
  const start = performance.now();
  let counts = await run(part);
  if (counts.failed > 0 && drivenByHand(part)) {
    console.log(
      `${part}: ${counts.failed} failed; run once more from the start, since keys and clicks are lost on a busy machine`,
    );
    counts = await run(part);
  }
  console.log(`${part}: ${((performance.now() - start) / 1000).toFixed(0)} s`);
  passed += counts.passed;
  failed += counts.failed;
}
console.log(`\n${passed} passed, ${failed} failed`);
process.exit(failed === 0 && passed > 0 ? 0 : 1);

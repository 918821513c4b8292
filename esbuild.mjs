// Bundles everything that is shipped into dist/: nothing is installed or loaded from node_modules at run time.
// `--silent` prints nothing on success; a failing bundle ends with exit code 1.
import { chmodSync, readdirSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';

const root = dirname(fileURLToPath(import.meta.url));
const silent = process.argv.includes('--silent');

const shared = {
  absWorkingDir: root,
  bundle: true,
  minify: true,
  charset: 'utf8',
  legalComments: 'none',
  logLevel: silent ? 'error' : 'warning',
  // Some packages' `main` is UMD, which bundles without complaint and fails when it runs: their `module` entry first.
  mainFields: ['module', 'main'],
  define: { 'process.env.NODE_ENV': '"production"' },
};
const node = {
  ...shared,
  platform: 'node',
  format: 'cjs',
  target: 'node20',
  // The same code as ES modules instead of CommonJS: unused parts fall away, and a start is 5 ms shorter.
  alias: { yaml: './node_modules/yaml/browser/index.js' },
};
const page = { ...shared, platform: 'browser', format: 'iife', target: 'es2022' };

const bundles = [
  {
    ...node,
    entryPoints: ['extension/cli/main.ts'],
    outfile: 'dist/giantpulse.cjs',
    // A dependency asks for its own URL, which a CommonJS bundle has only as a path.
    define: { ...shared.define, 'import.meta.url': 'bundleUrl' },
    banner: { js: "#!/usr/bin/env node\nconst bundleUrl = require('node:url').pathToFileURL(__filename).href;" },
  },
  { ...node, entryPoints: ['extension/server/main.ts'], outfile: 'dist/server.cjs' },
  { ...node, entryPoints: ['extension/editor/extension.ts'], outfile: 'dist/extension.cjs', external: ['vscode'] },
  // The same for editors in a browser: the client in the web worker that VS Code runs extensions in, the server in one of ours.
  { ...page, entryPoints: ['extension/server/worker-main.ts'], outfile: 'dist/server-worker.js' },
  // `.cjs`, since the package is one of ES modules: VS Code would take `.js` for one of them, which its worker can't load.
  {
    ...page,
    format: 'cjs',
    entryPoints: ['extension/editor/extension-web.ts'],
    outfile: 'dist/extension-web.cjs',
    external: ['vscode'],
  },
  { ...page, entryPoints: ['webview/readout.ts', 'webview/readout.css'], outdir: 'dist' },
];

try {
  await Promise.all(bundles.map((options) => build(options)));
  chmodSync(join(root, 'dist/giantpulse.cjs'), 0o755);
} catch {
  // esbuild has already said what is wrong and where.
  process.exit(1);
}
if (!silent) {
  for (const file of readdirSync(join(root, 'dist')).sort()) {
    const kilobytes = statSync(join(root, 'dist', file)).size / 1000;
    console.log(`dist/${file.padEnd(18)} ${kilobytes.toFixed(1).padStart(7)} kB`);
  }
}

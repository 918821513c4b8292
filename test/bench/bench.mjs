// Bundles the benchmark as the product is bundled, and runs it. Prints times and ratios; exit code 0 whatever they are.
import { createRequire } from 'node:module';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
const outfile = join(root, 'dist/bench/bench.cjs');

await build({
  absWorkingDir: root,
  entryPoints: ['test/bench/main.ts'],
  outfile,
  bundle: true,
  minify: true,
  platform: 'node',
  format: 'cjs',
  target: 'node20',
  mainFields: ['module', 'main'],
  alias: { yaml: './node_modules/yaml/browser/index.js' },
  logLevel: 'warning',
});
const { bench } = createRequire(import.meta.url)(outfile);
await bench(root, process.argv[2]);

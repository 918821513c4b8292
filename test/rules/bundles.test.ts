import { readFileSync, statSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { expect, it } from 'vitest';

const dist = join(dirname(fileURLToPath(import.meta.url)), '../../dist');

/** Budgets in bytes, minified. */
it.each([
  ['server.cjs', 600_000],
  ['server-worker.js', 600_000],
  ['extension.cjs', 450_000],
  ['extension-web.cjs', 450_000],
  ['giantpulse.cjs', 500_000],
  ['readout.js', 400_000],
])('%s stays within its budget', (file, budget) => {
  const { size } = statSync(join(dist, file));
  expect(size).toBeGreaterThan(10_000);
  expect(size).toBeLessThan(budget);
});

/** Modules that a bundle asks its host for when it runs. */
function modulesOf(file: string): string[] {
  const code = readFileSync(join(dist, file), 'utf8');
  const found = [...code.matchAll(/\brequire\("([^"]+)"\)/g)].map(([, name]) => name ?? '');
  return [...new Set(found)].sort();
}

it('sees what a bundle asks its host for', () => {
  expect(modulesOf('extension.cjs')).toEqual(expect.arrayContaining(['child_process', 'vscode']));
});

it.each([
  ['extension-web.cjs', ['vscode']],
  ['server-worker.js', []],
  ['readout.js', []],
])('%s asks a browser for nothing that it does not have', (file, modules) => {
  expect(modulesOf(file)).toEqual(modules);
});

it('the command holds no second copy of the language server, which would slow every start', () => {
  const answersHovers = (file: string) => readFileSync(join(dist, file), 'utf8').includes('hoverProvider');
  expect(answersHovers('server.cjs')).toBe(true);
  expect(answersHovers('giantpulse.cjs')).toBe(false);
});

import { execFileSync } from 'node:child_process';
import { readFileSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';
import { analyse } from '../../extension/core/analyse.ts';
import { CAUTION } from '../../extension/core/report/caution.ts';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
const files = execFileSync('git', ['ls-files'], { cwd: root, encoding: 'utf8' }).trim().split('\n');
const text = (file: string) => readFileSync(join(root, file), 'utf8');

describe('repository', () => {
  it('has the agreed top level', () => {
    const top = new Set(files.map((file) => file.split('/')[0]!).filter((name) => !name.startsWith('.')));
    const agreed = [
      'extension',
      'webview',
      'schemas',
      'test',
      'package.json',
      'tsconfig.json',
      'README.md',
      'DEVELOPERS.md',
    ];
    const beside = ['LICENSE', 'CHANGELOG.md', 'package-lock.json', 'biome.json', 'esbuild.mjs', 'vitest.config.ts'];
    expect([...top].filter((name) => ![...agreed, ...beside].includes(name))).toEqual([]);
    expect(agreed.filter((name) => !top.has(name))).toEqual([]);
  });

  it('opens the README with the job and its two commands', () => {
    const readme = text('README.md');
    const start = readme.indexOf('npm ci && npm start');
    const test = readme.indexOf('npm ci && npm test');
    expect(start).toBeGreaterThan(0);
    expect(test).toBeGreaterThan(start);
    expect(readme.slice(0, start)).not.toMatch(/^##/m);
  });

  it('shows a design in the README that the tool itself has nothing against', () => {
    const design = /```yaml\n(format: 1[\s\S]*?)```/.exec(text('README.md'))?.[1] ?? '';
    const { prediction, problems } = analyse(design);
    expect(problems).toEqual([]);
    expect(prediction?.pulse?.energy_J).toBeGreaterThan(0.008);
  });

  it('ships the caution with the README and every readout', () => {
    expect(text('README.md')).toMatch(/laser safety officer/);
    expect(CAUTION).toMatch(/laser safety officer/);
    expect(text('webview/parts/caution.ts')).toContain(CAUTION.replaceAll('\n', ' '));
  });

  it('has no type escapes in the sources', () => {
    for (const file of files.filter((name) => /^(extension|webview|test)\/.*\.ts$/.test(name))) {
      if (file === 'test/rules/repository.test.ts') continue;
      const code = text(file).replace(/\/\*[\s\S]*?\*\/|\/\/(?! @ts).*$/gm, '');
      const escapes =
        /@ts-(ignore|expect-error)|\bas any\b|: any\b|as unknown as|\b(it|test|describe)\.(skip|only|todo)\b/;
      expect(code.match(escapes)?.[0], file).toBeUndefined();
    }
  });

  it('keeps the extension API no newer than the engine that the manifest asks for', () => {
    const manifest: unknown = JSON.parse(text('package.json'));
    expect(manifest).toMatchObject({ engines: { vscode: '^1.91.0' }, devDependencies: { '@types/vscode': '1.91.0' } });
  });
});

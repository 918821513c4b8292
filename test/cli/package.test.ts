import { execFileSync } from 'node:child_process';
import { readFileSync, statSync } from 'node:fs';
import { join } from 'node:path';
import { describe, expect, test } from 'vitest';
import { parse } from 'yaml';
import { bundle, root } from './command.ts';

interface Packed {
  readonly files: readonly { readonly path: string; readonly mode: number }[];
}

const packed: readonly Packed[] = JSON.parse(
  execFileSync('npm', ['pack', '--dry-run', '--json', '--ignore-scripts', '--offline'], {
    cwd: root,
    encoding: 'utf8',
    stdio: ['ignore', 'pipe', 'ignore'],
  }),
);
const files = packed[0]?.files.map(({ path }) => path) ?? [];

describe('what is packed', () => {
  test.each([
    'dist/giantpulse.cjs',
    'dist/server.cjs',
    'dist/server-worker.js',
    'dist/extension.cjs',
    'dist/extension-web.cjs',
    'dist/readout.js',
    'dist/readout.css',
    'schemas/gain-module.schema.json',
    'extension/docs/checks.md',
    'extension/demo/hail_lidar.gainmodule.yaml',
    'extension/icon.png',
    'extension/language-configuration.json',
    'extension/syntaxes/gainmodule.tmLanguage.json',
    'README.md',
    'LICENSE',
    'package.json',
  ])('holds %s', (file) => {
    expect(files).toContain(file);
  });

  test('holds no tests, no sources and no packages', () => {
    expect(files.filter((file) => /^(test|webview|node_modules)\/|\.ts$|\.map$/.test(file))).toEqual([]);
  });

  test('holds of what has been built only what is shipped, not the benchmark beside it', () => {
    const shipped = /^dist\/(giantpulse\.cjs|server\.cjs|server-worker\.js|extension(-web)?\.cjs|readout\.(js|css))$/;
    expect(files.filter((file) => file.startsWith('dist/') && !shipped.test(file))).toEqual([]);
  });

  test('the command can be started by its name', () => {
    expect(readFileSync(bundle, 'utf8').slice(0, 20)).toBe('#!/usr/bin/env node\n');
    expect(statSync(bundle).mode & 0o111).toBe(0o111);
    const manifest: unknown = JSON.parse(readFileSync(join(root, 'package.json'), 'utf8'));
    expect(manifest).toMatchObject({ bin: { giantpulse: 'dist/giantpulse.cjs' } });
  });
});

describe('.pre-commit-hooks.yaml', () => {
  const hooks: unknown = parse(readFileSync(join(root, '.pre-commit-hooks.yaml'), 'utf8'));

  test('runs the check by the name that the package installs', () => {
    expect(hooks).toMatchObject([{ id: 'giantpulse', entry: 'giantpulse check', language: 'node' }]);
  });

  test('on designs only', () => {
    const [hook]: { readonly files?: string }[] = Array.isArray(hooks) ? hooks : [];
    const pattern = new RegExp(hook?.files ?? '');
    expect(['a.gainmodule.yaml', 'b c/ü.gainmodule.yml'].every((file) => pattern.test(file))).toBe(true);
    expect(['a.yaml', 'gainmodule.yaml.txt', 'a.gainmodule.yaml.orig'].some((file) => pattern.test(file))).toBe(false);
  });
});

import { spawnSync } from 'node:child_process';
import { existsSync, mkdirSync, mkdtempSync, readFileSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';

export const root = join(dirname(fileURLToPath(import.meta.url)), '../..');
export const bundle = join(root, 'dist/giantpulse.cjs');

export interface Result {
  readonly status: number | null;
  readonly stdout: string;
  readonly stderr: string;
}

/** Runs the shipped command in a folder; `npm test` has built it. */
export function giantpulse(folder: string, ...args: readonly string[]): Result {
  if (!existsSync(bundle)) throw new Error('dist/giantpulse.cjs is missing: run `npm run build`');
  const { status, stdout, stderr } = spawnSync(process.execPath, [bundle, ...args], {
    cwd: folder,
    encoding: 'utf8',
    timeout: 60_000,
    env: { ...process.env, NODE_OPTIONS: '' },
  });
  return { status, stdout, stderr };
}

/** A new folder with these files; remove it when done. */
export function folderWith(files: Readonly<Record<string, string | Uint8Array>>): string {
  const folder = mkdtempSync(join(tmpdir(), 'giantpulse-'));
  for (const [name, content] of Object.entries(files)) {
    mkdirSync(dirname(join(folder, name)), { recursive: true });
    writeFileSync(join(folder, name), content);
  }
  return folder;
}

export function design(path: string): string {
  return readFileSync(join(root, 'test/designs', path), 'utf8');
}

export const demo = readFileSync(join(root, 'extension/demo/hail_lidar.gainmodule.yaml'), 'utf8');

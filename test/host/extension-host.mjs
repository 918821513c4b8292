// Runs the suite's `run()` inside an extension host of a real VS Code workbench: `node extension-host.mjs [web|vsix]`.
import { dirname, join } from 'node:path';
import { fileURLToPath } from 'node:url';
import { startBrowser } from './browser.mjs';
import { packageExtension } from './package.mjs';
import { startWorkbench } from './workbench.mjs';

const tests = join(dirname(fileURLToPath(import.meta.url)), 'dist/suite.cjs');
/** Stands before the suite's own lines: the workbench logs through the same channel. */
const mark = '[suite] ';
const noise = [];
let summary;
let host;

const [mode = 'development'] = process.argv.slice(2);
const workbench = await startWorkbench({ ...(mode === 'vsix' && { vsix: packageExtension() }), web: mode === 'web' });
const browser = await startBrowser();
try {
  const page = await browser.newPage({ viewport: { width: 1280, height: 800 } });
  const ended = new Promise((done, fail) => {
    setTimeout(() => fail(new Error('the suite did not end in 180 s')), 180_000).unref();
    page.on('crash', () => fail(new Error('the page crashed')));
    void page.exposeFunction('codeAutomationLog', (type, parts) => {
      const text = parts.map((part) => (typeof part === 'string' ? part : JSON.stringify(part))).join(' ');
      if (!text.startsWith(mark)) noise.push(`${type}: ${text}`);
      else if (/^\d+ passed, \d+ failed$/.test(text.slice(mark.length))) summary = text.slice(mark.length);
      else {
        host ??= /extensions in (a .*)$/.exec(text)?.[1];
        console.log(text.slice(mark.length));
      }
    });
    void page.exposeFunction('codeAutomationExit', done);
  });
  await page.goto(workbench.url({ tests: mode === 'web' ? join(workbench.extension, 'suite.cjs') : tests }));
  await ended;
} catch (error) {
  console.error(error);
} finally {
  await browser.close();
  await workbench.stop();
}
if (!/ 0 failed$/.test(summary ?? '')) console.log(`the workbench's log:\n${noise.slice(-15).join('\n')}`);
const wanted = mode === 'web' ? 'a web worker' : 'a process of Node';
if (host !== wanted) summary = undefined;
// A crashed extension host ends like a happy one: without the suite's closing line nothing is known to have passed.
console.log(summary ?? `the suite did not run to its end in ${wanted}, but in ${host}`);

// Debian's Chromium, and the few things that the tests do with a workbench in it.
import { chromium } from 'playwright-core';

export function startBrowser() {
  return chromium.launch({
    executablePath: process.env.CHROMIUM ?? '/usr/bin/chromium',
    headless: true,
    args: [
      '--no-sandbox',
      '--disable-gpu',
      '--disable-quic',
      '--no-first-run',
      '--disable-background-networking',
      '--disable-component-update',
      '--disable-sync',
    ],
  });
}

/** Waits until the workbench and its editors are restored: earlier the palette knows too little. */
export async function restored(page) {
  await page.locator('.monaco-workbench').waitFor();
  await page.evaluate(() => window.driver.whenWorkbenchRestored());
}

/** The entry of the open quick pick with exactly this label: the list is not sorted best first, so Enter may take another. */
export function quickPick(page, label) {
  const exact = new RegExp(`^\\s*${escaped(label)}\\s*$`);
  return page
    .locator('.quick-input-list .monaco-list-row')
    .filter({ has: page.locator('.label-name', { hasText: exact }) })
    .first();
}

export async function runCommand(page, title) {
  const input = page.locator('.quick-input-widget input[type="text"]');
  // A key that comes while the focus moves between editor and readout is lost, and a palette that loses it closes: again.
  for (let attempt = 0; ; attempt++) {
    try {
      await page.keyboard.press('F1');
      await input.waitFor({ timeout: 3000 });
      await input.fill(`>${title}`, { timeout: 3000 });
      await quickPick(page, title).click({ timeout: 5000 });
      return;
    } catch (error) {
      if (attempt >= 5) throw error;
      await page.keyboard.press('Escape');
    }
  }
}

/** The extension's document in its webview: VS Code's outer frame, then the frame that it shows. */
export function webview(page) {
  const outer = 'iframe.webview.ready[src*="extensionId=giant-pulse.giantpulse"]';
  return page.frameLocator(outer).frameLocator('iframe#active-frame');
}

/** A token in the editor's text, on the first line that holds `line`; the editor draws its blanks as no-break spaces. */
export function word(page, line, text) {
  const exact = new RegExp(`^\\s*${escaped(text).replaceAll(' ', '\\s')}\\s*$`);
  return page.locator('.view-line', { hasText: line }).first().locator('span', { hasText: exact }).last();
}

function escaped(text) {
  return text.replace(/[.*+?^${}()|[\]\\/]/g, '\\$&');
}

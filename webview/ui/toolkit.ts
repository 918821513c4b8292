import { Checkbox, provideVSCodeDesignSystem, vsCodeButton, vsCodeCheckbox } from '@vscode/webview-ui-toolkit';
import type { ButtonOptions, CheckboxOptions } from './index.ts';

// A prefix of our own: another library's elements may carry the usual names in the same page.
const prefix = 'gm';

/** Makes the elements known; called once, before the first of them is made. */
export function registerControls(): void {
  provideVSCodeDesignSystem().withPrefix(prefix).register(vsCodeButton(), vsCodeCheckbox());
}

export function button({ label, title, onPress }: ButtonOptions): HTMLElement {
  const made = document.createElement(`${prefix}-button`);
  made.setAttribute('appearance', 'secondary');
  made.textContent = label;
  if (title !== undefined) {
    made.setAttribute('title', title);
    made.setAttribute('aria-label', title);
  }
  made.addEventListener('click', onPress);
  return made;
}

export function checkbox({ label, checked, controls, onChange }: CheckboxOptions): HTMLElement {
  const made = document.createElement(`${prefix}-checkbox`);
  made.textContent = label;
  made.setAttribute('aria-controls', controls);
  if (made instanceof Checkbox) {
    made.checked = checked;
    made.addEventListener('change', () => onChange(made.checked));
  }
  return made;
}

export interface ChartTheme {
  readonly text: string;
  readonly grid: string;
  readonly ground: string;
  /** Of the lines on the left axis and on the right one. */
  readonly left: string;
  readonly right: string;
  readonly surface: string;
  readonly border: string;
  readonly bad: string;
  readonly font: string;
  /** Outlines instead of filled shapes, where a mark upon them would be of their own colour. */
  readonly hollow: boolean;
  /** Thicker where the theme asks for high contrast. */
  readonly lineWidth: number;
}

/** The editor's colours as they are now: canvas can't follow style sheets by itself. */
export function chartTheme(): ChartTheme {
  const style = getComputedStyle(document.body);
  const colour = (names: readonly string[], fallback: string): string => {
    const value = names.map((name) => style.getPropertyValue(name).trim()).find((found) => found !== '');
    return value ?? fallback;
  };
  const highContrast = ['vscode-high-contrast', 'vscode-high-contrast-light'].some((name) =>
    document.body.classList.contains(name),
  );
  const text = colour(['--vscode-foreground'], style.color);
  return {
    text,
    // Faint on any ground: the theme's own borders shout over the curves in high contrast and vanish in light themes.
    grid: 'rgba(128, 128, 128, 0.3)',
    ground: colour(['--vscode-editor-background'], 'Canvas'),
    left: highContrast ? text : colour(['--vscode-charts-blue'], text),
    right: colour(['--vscode-charts-purple'], text),
    surface: colour(['--vscode-editorHoverWidget-background', '--vscode-editor-background'], 'Canvas'),
    border: colour(['--vscode-contrastBorder', '--vscode-editorHoverWidget-border'], text),
    bad: colour(['--vscode-editorError-foreground', '--vscode-errorForeground'], text),
    font: colour(['--vscode-font-family'], 'sans-serif'),
    hollow: highContrast,
    lineWidth: highContrast ? 2.5 : 1.75,
  };
}

/** Calls back whenever VS Code changes the theme of the page. */
export function onThemeChange(changed: () => void): void {
  const observer = new MutationObserver(changed);
  observer.observe(document.body, { attributes: true, attributeFilter: ['class', 'data-vscode-theme-id'] });
  // Where a user sets single colours, the theme stays and only the variables change.
  observer.observe(document.documentElement, { attributes: true, attributeFilter: ['style'] });
}

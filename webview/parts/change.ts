import { element } from '../dom.ts';

/** Below this relative difference two figures are shown alike, and so are the same. */
const same = 5e-4;

/** How a figure stands against its pinned value: `▲ +3.1 %`; nothing where one of them is missing. */
export function change(now: number | undefined, pinned: number | undefined): HTMLElement | undefined {
  if (now === undefined || pinned === undefined || pinned === 0) return undefined;
  const relative = now / pinned - 1;
  if (!Number.isFinite(relative)) return undefined;
  if (Math.abs(relative) < same) return element('span', { class: 'change' }, '=');
  const percent = Math.abs(relative) * 100;
  const digits = percent >= 100 ? percent.toFixed(0) : String(Number(percent.toPrecision(2)));
  const [arrow, sign] = relative > 0 ? ['▲', '+'] : ['▼', '−'];
  const mark = element('span', { 'aria-hidden': 'true' }, arrow);
  return element('span', { class: 'change' }, mark, ` ${sign}${digits} %`);
}

type Child = Node | string | undefined;

/** An element with its attributes and children; text is always text, never markup. */
export function element<K extends keyof HTMLElementTagNameMap>(
  tag: K,
  attributes: Readonly<Record<string, string>> = {},
  ...children: readonly Child[]
): HTMLElementTagNameMap[K] {
  const made = document.createElement(tag);
  for (const [name, value] of Object.entries(attributes)) made.setAttribute(name, value);
  for (const child of children) if (child !== undefined) made.append(child);
  return made;
}

/** A message's words, what stands between backticks set as code. */
export function prose(text: string): readonly (Node | string)[] {
  return text.split('`').map((part, index) => (index % 2 === 0 ? part : element('code', {}, part)));
}

/** A part of the page under its heading; `body` is what a new state replaces. */
export function section(id: string, heading: string): { readonly root: HTMLElement; readonly body: HTMLElement } {
  const title = element('h2', { id: `${id}-heading` }, heading);
  const body = element('div', { class: 'body' });
  return { root: element('section', { id, 'aria-labelledby': title.id }, title, body), body };
}

export interface Column {
  readonly heading: string;
  /** Numbers stand flush right, so that their digits line up. */
  readonly numeric?: boolean;
}

/** A table in a box that scrolls where the page is too small for it, by keyboard as well. */
export function scrolling(
  caption: string,
  columns: readonly Column[],
  rows: readonly (readonly Child[])[],
  boxClass = 'sideways',
): HTMLElement {
  const box = { class: boxClass, role: 'region', tabindex: '0', 'aria-label': caption };
  return element('div', box, table(caption, columns, rows));
}

/** Puts what `scrolling` made in the place of an earlier one: the box stays, with its focus and where it is scrolled to. */
export function refill(holder: HTMLElement, box: HTMLElement): void {
  const old = holder.firstElementChild;
  if (old === null || old.className !== box.className) holder.replaceChildren(box);
  else {
    old.setAttribute('aria-label', box.getAttribute('aria-label') ?? '');
    old.replaceChildren(...box.childNodes);
  }
}

/** A quantity in words; where room is short it breaks before a figure, never inside one. */
export function quantity(text: string): HTMLElement {
  const pieces = text.split(/ (?=[+−-]?\d)/).map((piece) => element('span', { class: 'whole' }, piece));
  return element('span', {}, ...pieces.flatMap((piece, index) => (index === 0 ? [piece] : [' ', piece])));
}

function table(caption: string, columns: readonly Column[], rows: readonly (readonly Child[])[]): HTMLElement {
  const classOf = (index: number): Readonly<Record<string, string>> =>
    columns[index]?.numeric === true ? { class: 'number' } : {};
  const head = columns.map(({ heading }, index) => element('th', { scope: 'col', ...classOf(index) }, heading));
  const body = rows.map((cells) =>
    element(
      'tr',
      {},
      ...cells.map((cell, index) =>
        index === 0 ? element('th', { scope: 'row', ...classOf(index) }, cell) : element('td', classOf(index), cell),
      ),
    ),
  );
  return element(
    'table',
    {},
    element('caption', { class: 'unseen' }, caption),
    element('thead', {}, element('tr', {}, ...head)),
    element('tbody', {}, ...body),
  );
}

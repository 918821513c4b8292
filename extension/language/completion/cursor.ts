/** Where a cursor stands in a design's text, also where the YAML around it is half typed. */
export interface Cursor {
  /** Path of the section whose key or value is being typed; '' for the top. */
  readonly section: string;
  /** In braces or brackets, as opposed to lines. */
  readonly flow: boolean;
  /** Blanks in front of the section's keys. */
  readonly indent: string;
  /** The key whose value is being typed; absent where a key is. */
  readonly key?: string;
  /** What has been typed so far of the key or value, and where that begins and ends. */
  readonly typed: string;
  readonly start: number;
  readonly end: number;
  /** Keys and plain values of the section besides what is being typed. */
  readonly siblings: Readonly<Record<string, string>>;
  /** A list item may begin here. */
  readonly inList: boolean;
}

interface Frame {
  readonly indent: number;
  readonly path: string;
  /** Items begun below a key. */
  items: number;
}

const KEY = /^(["']?)([A-Za-z_][\w.-]*)\1[ \t]*:(?=[ \t\r]|$)/;
/** The longest text that is looked at from its start for each completion. */
const LONGEST = 200_000;

/** Undefined in a comment, and where nothing of a design can stand. */
export function cursorAt(text: string, offset: number): Cursor | undefined {
  if (offset > LONGEST) return undefined;
  const lineStart = text.lastIndexOf('\n', offset - 1) + 1;
  const frames = framesAbove(text, lineStart);
  const open = openBrackets(text, frames.flowStart ?? lineStart, offset);
  if (open === undefined) return undefined;
  return open.length > 0 ? inFlow(text, offset, open, frames) : inBlock(text, offset, lineStart, frames);
}

interface Above {
  readonly stack: readonly Frame[];
  /** Where a brace was opened on an earlier line that is not closed before this one. */
  readonly flowStart: number | undefined;
}

/** The sections that are open before a line, by indentation alone. */
function framesAbove(text: string, until: number): Above {
  const stack: Frame[] = [{ indent: -1, path: '', items: 0 }];
  let flowStart: number | undefined;
  let depth = 0;
  for (let start = 0; start < until; ) {
    const end = lineEnd(text, start);
    const line = text.slice(start, end);
    const before = depth;
    depth = Math.max(0, depth + bracketChange(line));
    if (before === 0) {
      enter(stack, line);
      flowStart = depth > 0 ? start : undefined;
    } else if (depth === 0) flowStart = undefined;
    start = end + 1;
  }
  return { stack, flowStart };
}

/** Closes what a line's indentation closes and opens what its keys open. */
function enter(stack: Frame[], line: string): void {
  if (/^\s*(#|$|---|\.\.\.|%)/.test(line)) return;
  let indent = line.length - line.trimStart().length;
  let rest = line.slice(indent);
  for (;;) {
    const isItem = /^-(?=\s|$)/.test(rest);
    // A list may stand in the column of the key it belongs to.
    while (stack.length > 1 && (stack.at(-1)?.indent ?? -1) >= indent + (isItem && isListHolder(stack, indent) ? 1 : 0))
      stack.pop();
    const parent = stack.at(-1);
    if (parent === undefined) return;
    if (!isItem) break;
    const inner = rest.slice(1);
    const gap = inner.length - inner.trimStart().length;
    stack.push({ indent, path: `${parent.path}[${parent.items}]`, items: 0 });
    parent.items += 1;
    indent += 1 + gap;
    rest = inner.trimStart();
  }
  const key = KEY.exec(rest)?.[2];
  const parent = stack.at(-1);
  if (key !== undefined && parent !== undefined) stack.push({ indent, path: join(parent.path, key), items: 0 });
}

/** Whether the innermost frame in this column is a key, which a list in the same column belongs to. */
function isListHolder(stack: readonly Frame[], indent: number): boolean {
  const found = stack.findLast((frame) => frame.indent <= indent);
  return found?.indent === indent && !found.path.endsWith(']');
}

function join(path: string, key: string): string {
  return path === '' ? key : `${path}.${key}`;
}

interface Bracket {
  readonly at: number;
  readonly mark: '{' | '[';
}

/** Brackets that are open at an offset, outermost first; undefined in a comment. */
function openBrackets(text: string, from: number, offset: number): readonly Bracket[] | undefined {
  const open: Bracket[] = [];
  let quote = '';
  for (let at = from; at < offset; at++) {
    const character = text[at] ?? '';
    if (quote !== '') {
      if (character === '\n') quote = '';
      else if (character === quote) quote = '';
      continue;
    }
    if (isOpeningQuote(text, at)) quote = character;
    else if (character === '#' && /\s/.test(text[at - 1] ?? '\n')) {
      const end = lineEnd(text, at);
      if (end >= offset) return undefined;
      at = end;
    } else if (character === '{' || character === '[') {
      // Within a plain value a bracket is only a character, unless brackets are open already.
      if (open.length > 0 || /[:\s,-]/.test(text[at - 1] ?? ' ')) open.push({ at, mark: character });
    } else if (character === '}' || character === ']') open.pop();
  }
  return open;
}

function bracketChange(line: string): number {
  return bracketsOf(line).reduce((sum, { mark }) => sum + (mark === '{' || mark === '[' ? 1 : -1), 0);
}

function bracketsOf(line: string): { readonly mark: string }[] {
  const found: { mark: string }[] = [];
  let quote = '';
  for (let at = 0; at < line.length; at++) {
    const character = line[at] ?? '';
    if (quote !== '') {
      if (character === quote) quote = '';
    } else if (isOpeningQuote(line, at)) quote = character;
    else if (character === '#' && (at === 0 || /\s/.test(line[at - 1] ?? ''))) break;
    else if (/[{[]/.test(character) && (found.length > 0 || /[:\s,-]/.test(line[at - 1] ?? ' ')))
      found.push({ mark: character });
    else if (/[}\]]/.test(character)) found.push({ mark: character });
  }
  return found;
}

/** A quote in the middle of a word is an apostrophe. */
function isOpeningQuote(text: string, at: number): boolean {
  const character = text[at];
  return (character === '"' || character === "'") && /[\s:,{[]/.test(text[at - 1] ?? '\n');
}

function inBlock(text: string, offset: number, lineStart: number, { stack }: Above): Cursor | undefined {
  const prefix = text.slice(lineStart, offset);
  const copy = stack.map((frame) => ({ ...frame }));
  const [, blanks = '', dashes = '', rest = ''] = /^([ \t]*)((?:-[ \t]+)*)(.*)$/s.exec(prefix) ?? [];
  // What has been typed of a key counts as one: it opens its list item, and stands in its column.
  enter(copy, `${blanks}${dashes}_:`);
  copy.pop();
  const section = copy.at(-1)?.path ?? '';
  const indent = ' '.repeat(blanks.length + dashes.length);
  const key = KEY.exec(rest);
  const siblings = blockSiblings(text, lineStart, indent.length, dashes !== '');
  const end = lineEnd(text, offset);
  if (key === null) {
    if (/\s/.test(rest.trimEnd()) || /^[|>&*!]/.test(rest)) return undefined;
    const start = offset - rest.length;
    const tail = /^[\w.-]*/.exec(text.slice(offset, end))?.[0] ?? '';
    return {
      section,
      flow: false,
      indent,
      typed: rest,
      start,
      end: offset + tail.length,
      siblings,
      inList: dashes === '',
    };
  }
  const value = valueRange(text, offset - rest.length + key[0].length, offset, end);
  return { section, flow: false, indent, key: key[2] ?? '', ...value, siblings, inList: false };
}

/** A value's text up to the cursor without its opening quote, and its range up to a comment, a comma or a bracket. */
function valueRange(text: string, from: number, offset: number, limit: number, flow = false) {
  let start = from;
  while (start < offset && /[ \t]/.test(text[start] ?? '')) start++;
  const quote = /^["']/.exec(text.slice(start, offset))?.[0];
  if (quote !== undefined) start++;
  const rest = text.slice(offset, limit);
  const stop = quote === undefined ? rest.search(flow ? /[,}\]\n]|\s#/ : /\s#|\r?$/) : rest.indexOf(quote);
  const tail = (stop < 0 ? rest : rest.slice(0, stop)).trimEnd();
  return { typed: text.slice(start, offset), start, end: offset + tail.length };
}

/** Keys in the same column around a line, up to where the section begins and ends. */
function blockSiblings(text: string, lineStart: number, column: number, opensItem: boolean): Record<string, string> {
  const found: Record<string, string> = {};
  const look = (line: string): boolean => {
    if (/^\s*(#|$)/.test(line)) return true;
    const [, blanks = '', dashes = '', rest = ''] = /^([ \t]*)((?:-[ \t]+)*)(.*)$/s.exec(line.trimEnd()) ?? [];
    const at = blanks.length + dashes.length;
    if (at === column) note(found, rest);
    return at > column || (at === column && dashes === '');
  };
  for (let end = lineStart - 1; end >= 0 && !opensItem; ) {
    const start = text.lastIndexOf('\n', end - 1) + 1;
    if (!look(text.slice(start, end))) break;
    end = start - 1;
  }
  for (let start = lineEnd(text, lineStart) + 1; start <= text.length; ) {
    const end = lineEnd(text, start);
    const line = text.slice(start, end);
    if (/^\s*-\s/.test(line) && line.search(/-/) < column) break;
    if (!look(line)) break;
    start = end + 1;
  }
  return found;
}

function note(found: Record<string, string>, entry: string): void {
  const key = KEY.exec(entry);
  if (key?.[2] === undefined) return;
  const value = entry
    .slice(key[0].length)
    .replace(/\s#.*$/, '')
    .trim();
  found[key[2]] = value.replace(/^(["'])(.*)\1$/, '$2');
}

function inFlow(text: string, offset: number, open: readonly Bracket[], { stack }: Above): Cursor | undefined {
  const [outer] = open;
  const inner = open.at(-1);
  if (outer === undefined || inner === undefined) return undefined;
  const frames = stack.map((frame) => ({ ...frame }));
  const start = text.lastIndexOf('\n', outer.at - 1) + 1;
  if (start < text.length) enter(frames, text.slice(start, outer.at));
  let path = frames.at(-1)?.path ?? '';
  open.forEach(({ at, mark }, index) => {
    const before = text.slice(open[index - 1]?.at ?? at, at);
    const key = index === 0 ? undefined : /([A-Za-z_][\w.-]*)["']?[ \t]*:[ \t]*$/.exec(before)?.[1];
    if (key !== undefined) path = join(path, key);
    if (mark === '{' && open[index - 1]?.mark === '[')
      path = `${path}[${itemsBefore(text, open[index - 1]?.at ?? 0, at)}]`;
  });
  if (inner.mark === '[') return undefined;
  const body = text.slice(inner.at + 1, offset);
  const { parts } = splitFlow(body);
  const current = parts.at(-1) ?? '';
  const siblings: Record<string, string> = {};
  for (const part of [...parts.slice(0, -1), ...splitFlow(afterCursor(text, offset)).parts.slice(1)])
    note(siblings, part.trim());
  const common = { section: path, flow: true, indent: '', siblings, inList: false };
  const entry = current.trimStart();
  const key = KEY.exec(entry);
  const limit = text.length;
  if (key === null) {
    if (/\s/.test(entry.trimEnd())) return undefined;
    const tail = /^[\w.-]*/.exec(text.slice(offset, offset + 100))?.[0] ?? '';
    return { ...common, typed: entry, start: offset - entry.length, end: offset + tail.length };
  }
  return {
    ...common,
    key: key[2] ?? '',
    ...valueRange(text, offset - entry.length + key[0].length, offset, limit, true),
  };
}

/** From the cursor to the bracket that closes what it stands in. */
function afterCursor(text: string, offset: number): string {
  let depth = 0;
  for (let at = offset; at < Math.min(text.length, offset + 5000); at++) {
    const character = text[at] ?? '';
    if (/[{[]/.test(character)) depth++;
    else if (/[}\]]/.test(character) && --depth < 0) return text.slice(offset, at);
    else if (/^\r?\n[A-Za-z]/.test(text.slice(at, at + 3))) return text.slice(offset, at);
  }
  return text.slice(offset, offset + 5000);
}

/** Entries between commas at the level of a text's start. */
function splitFlow(body: string): { readonly parts: readonly string[] } {
  const parts: string[] = [];
  let depth = 0;
  let from = 0;
  for (let at = 0; at < body.length; at++) {
    const character = body[at] ?? '';
    if (/[{[]/.test(character)) depth++;
    else if (/[}\]]/.test(character)) depth--;
    else if (character === ',' && depth === 0) {
      parts.push(body.slice(from, at));
      from = at + 1;
    }
  }
  return { parts: [...parts, body.slice(from)] };
}

function itemsBefore(text: string, list: number, at: number): number {
  return splitFlow(text.slice(list + 1, at)).parts.length - 1;
}

function lineEnd(text: string, from: number): number {
  const end = text.indexOf('\n', from);
  return end < 0 ? text.length : end;
}

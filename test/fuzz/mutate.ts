/** A small seeded generator (mulberry32): the same designs on every machine. */
export function generator(seed: number): () => number {
  let state = seed >>> 0;
  return () => {
    state = (state + 0x6d2b79f5) >>> 0;
    let t = Math.imul(state ^ (state >>> 15), state | 1);
    t ^= t + Math.imul(t ^ (t >>> 7), t | 61);
    return ((t ^ (t >>> 14)) >>> 0) / 4294967296;
  };
}

const NUMBERS = [
  '0',
  '-1',
  '1e308',
  '1e-308',
  '1e999',
  'NaN',
  '.inf',
  '-.inf',
  '1e-30',
  '1e30',
  '0.5',
  '50',
  '99.999999999',
  '100',
  '1e6',
  '3',
  '1e-9',
];
const UNITS = [
  '%',
  'mm',
  'm',
  'um',
  'nm',
  'us',
  'ns',
  's',
  'W',
  'kW',
  'MW',
  'Hz',
  'kHz',
  'MHz',
  'cm2',
  'cm-3',
  'J/cm2',
  'A',
  'W/A',
  '',
  'parsec',
  'W/m K',
];
const TOKENS = [
  ':',
  '-',
  '{',
  '}',
  '[',
  ']',
  '&a ',
  '*a',
  '<<: *a',
  '|',
  '>',
  '"',
  "'",
  '#',
  '\t',
  '\n',
  '\r',
  '\u0000',
  '\ud800',
  '±',
  '!',
  '? ',
  '%',
  '@',
  ',',
  '---\n',
  '...\n',
];
const WORDS = [
  'pulsed',
  'continuous',
  'flat',
  'gaussian',
  'electro_optic',
  'acousto_optic',
  'saturable_absorber',
  'none',
  'Yb:YAG',
  'ruby',
  'Nd:YLF',
  '1047 nm',
  '1030 nm',
  'inside',
  'outside',
];

const QUANTITY = /(-?[\d.]+(?:e-?\d+)?)( ?)([%A-Za-z/0-9-]*)/g;

/** One to four random changes of a design's text: some of its numbers and words, some of its YAML, some of its bytes. */
export function mutate(text: string, random: () => number): string {
  const pick = <T>(from: readonly T[]): T => from[Math.floor(random() * from.length)]!;
  const place = () => Math.floor(random() * (result.length + 1));
  let result = text;
  for (let change = Math.floor(random() * 3); change >= 0; change--) {
    const kind = random();
    if (kind < 0.75) {
      const found = [...result.matchAll(QUANTITY)].filter((match) => match[3] !== '');
      if (found.length === 0) continue;
      const match = pick(found);
      const number = random() < 0.85 ? String(Number(match[1]) * 10 ** (2 * random() - 1)) : pick(NUMBERS);
      const unit = random() < 0.97 ? match[3]! : pick(UNITS);
      result = `${result.slice(0, match.index)}${number} ${unit}${result.slice(match.index + match[0].length)}`;
    } else if (kind < 0.8) {
      const found = [...result.matchAll(/: ([A-Za-z_][\w:]*)/g)];
      if (found.length === 0) continue;
      const match = pick(found);
      result = `${result.slice(0, match.index)}: ${pick(WORDS)}${result.slice(match.index + match[0].length)}`;
    } else if (kind < 0.87) {
      const lines = result.split('\n');
      const at = Math.floor(random() * lines.length);
      if (random() < 0.5) lines.splice(at, 1);
      else lines.splice(Math.floor(random() * lines.length), 0, lines[at]!);
      result = lines.join('\n');
    } else if (kind < 0.93) {
      const at = place();
      result = result.slice(0, at) + pick(TOKENS) + result.slice(at);
    } else if (kind < 0.97) {
      const at = place();
      result = result.slice(0, at) + result.slice(at + 1 + Math.floor(random() * 12));
    } else result = result.slice(0, place());
  }
  return result;
}

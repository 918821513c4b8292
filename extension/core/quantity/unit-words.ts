const PREFIX_WORDS: readonly (readonly [string, string])[] = [
  ['femto', 'f'],
  ['pico', 'p'],
  ['nano', 'n'],
  ['micro', 'u'],
  ['milli', 'm'],
  ['centi', 'c'],
  ['kilo', 'k'],
  ['mega', 'M'],
  ['giga', 'G'],
  ['tera', 'T'],
];

const UNIT_WORDS: Readonly<Record<string, string>> = {
  micron: 'um',
  metre: 'm',
  meter: 'm',
  second: 's',
  sec: 's',
  minute: 'min',
  hour: 'h',
  hertz: 'Hz',
  joule: 'J',
  watt: 'W',
  ampere: 'A',
  amp: 'A',
  volt: 'V',
  kelvin: 'K',
  celsius: 'Cel',
  degree: 'deg',
  radian: 'rad',
  inch: 'in',
  percent: '%',
};

/** The symbol of a unit whose name is spelt out, e.g. `us` for `Microseconds`; at most one. */
export function spelledOut(word: string): readonly string[] {
  const lower = word.toLowerCase().slice(0, 20);
  const [prefix, symbol] = PREFIX_WORDS.find(
    ([name]) => lower.startsWith(name) && lower !== 'micron' && lower !== 'microns',
  ) ?? ['', ''];
  const name = lower.slice(prefix.length);
  const unit = Object.hasOwn(UNIT_WORDS, name) ? UNIT_WORDS[name] : UNIT_WORDS[name.replace(/s$/, '')];
  return unit === undefined ? [] : [symbol + unit];
}

/** Ways of writing a number that people use and we don't read: why not, and what was surely meant. */
export interface Misreading {
  /** Goes after the quoted text. */
  readonly reason: string;
  /** Whole texts that might be meant; more than one where there is doubt. */
  readonly texts: readonly string[];
}

const TIMES_TEN =
  /^([+-]?[\d.]+)\s*[\u00d7x*\u00b7]\s*10\s*(?:\^|\*\*)?\s*([+\-\u2212]?\d+|[\u207a\u207b\u2070\u00b9\u00b2\u00b3\u2074-\u2079]+)/;
const SUPERSCRIPTS = '\u2070\u00b9\u00b2\u00b3\u2074\u2075\u2076\u2077\u2078\u2079';

/** Recognises such a way anywhere in a trimmed text; linear in its length. */
export function misreading(text: string): Misreading | undefined {
  if (/\d,\d/.test(text)) return comma(text);
  if (/^[+-]?0[xXbBoO]/.test(text)) return { reason: 'is not a decimal number', texts: [] };
  if (/\d[_'\u2019]\d/.test(text)) {
    return { reason: 'has marks between its digits', texts: [text.replace(/(\d)[_'\u2019](?=\d)/g, '$1')] };
  }
  if (/^[+-]?\d{1,3}(?:\s\d{3})+(?!\d)/.test(text)) {
    return { reason: 'has spaces between its digits', texts: [text.replace(/(\d)\s(?=\d{3}(?!\d))/g, '$1')] };
  }
  const power = TIMES_TEN.exec(text);
  if (power !== null) {
    const [whole, mantissa = '', written = ''] = power;
    const texts = [`${mantissa}e${asciiPower(written)}${text.slice(whole.length)}`];
    return { reason: 'spells out its power of ten', texts };
  }
  if (/^\u2212/.test(text)) return { reason: 'starts with a typographic minus', texts: [`-${text.slice(1)}`] };
  return undefined;
}

/** `1,2` can only be a decimal comma, `1,234,567` only thousands, `1,234` is either. */
function comma(text: string): Misreading {
  const decimal = text.replace(/(\d),(?=\d)/g, '$1.');
  const thousands = /^[+-]?\d{1,3}(?:,\d{3})+(?![\d,])/.test(text) ? [text.replace(/(\d),(?=\d{3})/g, '$1')] : [];
  return { reason: 'has a comma in its number, and the decimal sign is a point', texts: [decimal, ...thousands] };
}

function asciiPower(written: string): string {
  return [...written]
    .map((character) => {
      const digit = SUPERSCRIPTS.indexOf(character);
      if (digit >= 0) return String(digit);
      return character === '\u2212' || character === '\u207b' ? '-' : character === '\u207a' ? '+' : character;
    })
    .join('');
}

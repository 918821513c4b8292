const prefixes: readonly (readonly [exponent: number, prefix: string])[] = [
  [12, 'T'],
  [9, 'G'],
  [6, 'M'],
  [3, 'k'],
  [0, ''],
  [-3, 'm'],
  [-6, 'µ'],
  [-9, 'n'],
  [-12, 'p'],
  [-15, 'f'],
];

export interface DisplaySeries {
  readonly unit: string;
  /** The unit in SI. */
  readonly scale: number;
  readonly values: readonly number[];
}

/**
 * An SI series in the prefixed unit that puts its largest magnitude between 1 and 1000: chart libraries mislabel
 * axes of tiny numbers. Kept to `digits` significant digits of that magnitude, which is all that a chart can show.
 */
export function inDisplayUnit(values: readonly number[], unit: string, digits = 6): DisplaySeries {
  const largest = values.reduce((most, value) => Math.max(most, Math.abs(value)), 0);
  const [exponent, prefix] = prefixes.find(([power]) => largest >= 10 ** power) ?? [0, ''];
  const scaled = largest / 10 ** exponent;
  const decimals = Math.min(12, Math.max(0, digits - 1 - Math.floor(Math.log10(scaled || 1))));
  return {
    unit: `${prefix}${unit}`,
    scale: Number(`1e${exponent}`),
    values: values.map((value) => Number((value / 10 ** exponent).toFixed(decimals))),
  };
}

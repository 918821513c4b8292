import type { DimensionName } from './dimension.ts';

/** A display unit: its power of ten in SI, and the smallest power of ten from which it is used (its own by default). */
type Step = readonly [unit: string, exponent: number, from?: number];

const PREFIXES: readonly (readonly [string, number])[] = [
  ['z', -21],
  ['a', -18],
  ['f', -15],
  ['p', -12],
  ['n', -9],
  ['\u00b5', -6],
  ['m', -3],
  ['', 0],
  ['k', 3],
  ['M', 6],
  ['G', 9],
  ['T', 12],
  ['P', 15],
  ['E', 18],
];

function prefixed(unit: string, lowest: number, highest: number, base = 0): readonly Step[] {
  return PREFIXES.filter(([, power]) => power >= lowest && power <= highest).map(([prefix, power]) => [
    prefix + unit,
    power + base,
  ]);
}

/** Ascending; the first serves what is smaller still, the last what is larger. */
const STEPS: Readonly<Record<DimensionName, readonly Step[]>> = {
  ratio: [['', 0]],
  length: prefixed('m', -15, 3),
  area: [
    ['\u00b5m2', -12],
    ['mm2', -6, -9],
    ['cm2', -4],
    ['m2', 0],
  ],
  cross_section: [['cm2', -4]],
  number_density: [['cm-3', 6]],
  time: prefixed('s', -18, 0),
  frequency: prefixed('Hz', -6, 15),
  power: prefixed('W', -18, 18),
  energy: prefixed('J', -21, 12),
  current: prefixed('A', -15, 6),
  voltage: prefixed('V', -12, 9),
  slope_efficiency: prefixed('W/A', -6, 3),
  fluence: prefixed('J/cm2', -12, 6, 4),
  intensity: prefixed('W/cm2', -12, 18, 4),
  temperature: prefixed('K', -9, 0),
  angle: prefixed('rad', -12, 0),
  thermal_conductivity: prefixed('W/(m.K)', -6, 3),
  per_temperature: [['K-1', 0]],
  nonlinear_index: [['m2/W', 0]],
  inverse_length: [['cm-1', 2]],
  velocity: [
    ['\u00b5m/s', -6],
    ['mm/s', -3],
    ['m/s', 0],
    ['km/s', 3],
  ],
};

/**
 * An SI value in the unit an engineer expects, e.g. `13.1 mJ`, to `digits` significant digits (1 to 17). A power of ten
 * appears only where no prefix serves. A value that isn't finite, which no result holds, gives a dash.
 */
export function formatQuantity(value: number, dimension: DimensionName, digits = 3): string {
  const steps = STEPS[dimension];
  const decimal = roundToDecimal(value, digits);
  const fitting =
    value === 0 ? withoutPrefix(steps) : steps.findLast(([, exponent, from]) => decimal.exponent >= (from ?? exponent));
  const [unit, exponent] = fitting ?? steps[0] ?? ['', 0];
  return withUnit(decimal, exponent, unit);
}

/** A fraction in percent: 0.5 gives `50.0 %`. */
export function formatPercent(fraction: number, digits = 3): string {
  return withUnit(roundToDecimal(fraction, digits), -2, '%');
}

/** sign digits[0].digits[1…] · 10^exponent; already rounded, so a carry to the next prefix shows in the exponent. */
interface Decimal {
  readonly sign: '' | '-';
  readonly digits: string;
  readonly exponent: number;
}

function roundToDecimal(value: number, digits: number): Decimal {
  const kept = Math.max(1, Math.min(17, Math.round(digits) || 1));
  if (!Number.isFinite(value)) return { sign: '', digits: '', exponent: 0 };
  const [mantissa = '', power = '0'] = Math.abs(value)
    .toExponential(kept - 1)
    .split('e');
  return { sign: value < 0 ? '-' : '', digits: mantissa.replace('.', ''), exponent: Number(power) };
}

function withUnit(decimal: Decimal, unitExponent: number, unit: string): string {
  const tail = unit === '' ? '' : ` ${unit}`;
  if (decimal.digits === '') return `—${tail}`;
  if (/^0+$/.test(decimal.digits)) return `0${tail}`;
  return `${decimal.sign}${point(decimal.digits, decimal.exponent - unitExponent)}${tail}`;
}

/** Plain from a ten-thousandth to a million, which a person still counts at a glance; a power of ten beyond. */
function point(digits: string, exponent: number): string {
  if (exponent < -4 || exponent >= 6) {
    const rest = digits.slice(1);
    return `${digits.charAt(0)}${rest === '' ? '' : `.${rest}`}e${exponent}`;
  }
  if (exponent < 0) return `0.${'0'.repeat(-exponent - 1)}${digits}`;
  const whole = digits.slice(0, exponent + 1).padEnd(exponent + 1, '0');
  const rest = digits.slice(exponent + 1);
  return rest === '' ? whole : `${whole}.${rest}`;
}

function withoutPrefix(steps: readonly Step[]): Step | undefined {
  return steps.toSorted(([one], [other]) => one.length - other.length)[0];
}

/** A vacuum wavelength (m) as the trade writes it, in nm: `1064 nm`, `694.3 nm`. */
export function formatWavelength(value: number): string {
  return `${Number((value * 1e9).toPrecision(4))} nm`;
}

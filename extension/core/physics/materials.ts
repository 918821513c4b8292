import type { DimensionName } from '../quantity/dimension.ts';
import { readQuantity } from '../quantity/quantity.ts';
import table from './materials.json' with { type: 'json' };

/** Every figure that the property table knows, and how it is measured. */
export const FIGURE_DIMENSIONS = {
  emission_cross_section: 'cross_section',
  absorption_cross_section: 'cross_section',
  ground_state_cross_section: 'cross_section',
  excited_state_cross_section: 'cross_section',
  ion_density: 'number_density',
  upper_level_lifetime: 'time',
  lower_level_lifetime: 'time',
  lifetime: 'time',
  inversion_reduction_factor: 'ratio',
  upper_level_fraction: 'ratio',
  lower_level_fraction: 'ratio',
  refractive_index: 'ratio',
  group_index: 'ratio',
  thermo_optic_coefficient: 'per_temperature',
  thermal_expansion: 'per_temperature',
  thermal_conductivity: 'thermal_conductivity',
  nonlinear_index: 'nonlinear_index',
} as const satisfies Readonly<Record<string, DimensionName>>;

export type FigureName = keyof typeof FIGURE_DIMENSIONS;

const MEDIUM_KINDS = ['four_level', 'quasi_three_level', 'three_level'] as const;

export type MediumKind = (typeof MEDIUM_KINDS)[number];

/** One published figure: `value` and `range` in SI, `text` as the table writes it. */
export interface MaterialFigure {
  readonly value: number;
  readonly text: string;
  /** Where sources disagree: the lowest and the highest. */
  readonly range?: readonly [number, number];
  readonly source: string;
  /** Recalled rather than read from the source: not to be relied on to more than the range. */
  readonly fromMemory: boolean;
}

export type Figures = Readonly<Partial<Record<FigureName, MaterialFigure>>>;

interface FigureText {
  readonly value: string;
  readonly range?: readonly string[] | undefined;
  readonly source: string;
  readonly fromMemory?: boolean | undefined;
}

type FigureTexts = Readonly<Partial<Record<FigureName, FigureText | undefined>>>;

interface LineText {
  readonly wavelength: string;
  readonly strongest: boolean;
  readonly kind?: string | undefined;
  readonly pump_wavelengths: readonly string[];
  readonly pump_band?: readonly string[] | undefined;
  readonly figures: FigureTexts;
}

/** A laser medium as the table holds it: texts, read only when a line is asked for. */
export interface Medium {
  readonly name: string;
  readonly composition: string;
  readonly aliases: readonly string[];
  readonly kind: string;
  readonly figures: FigureTexts;
  readonly lines: readonly LineText[];
}

/** A medium at one of its lines; wavelengths in m. */
export interface MediumRow {
  readonly name: string;
  readonly kind: MediumKind;
  readonly wavelength: number;
  readonly strongest: boolean;
  readonly pumpWavelengths: readonly number[];
  /** Absorption wide enough for lamps or many pump lasers: its two ends, m. */
  readonly pumpBand?: readonly [number, number];
  readonly figures: Figures;
}

interface AbsorberText {
  readonly name: string;
  readonly composition: string;
  readonly aliases: readonly string[];
  readonly wavelengths: readonly string[];
  readonly figures: FigureTexts;
}

/** A saturable absorber; `wavelengths` in m are those its figures hold at. */
export interface AbsorberRow {
  readonly name: string;
  readonly composition: string;
  readonly wavelengths: readonly number[];
  readonly figures: Figures;
}

const MEDIA: readonly Medium[] = table.media;
const ABSORBERS: readonly AbsorberText[] = table.absorbers;

/**
 * How far a design's wavelength may lie from a line and still mean it, as a fraction: rounding and air against vacuum
 * pass (1064 for 1063 nm), a neighbouring line does not.
 */
export const LINE_TOLERANCE = 0.003;

/** The media's names, in the table's order. */
export function mediumNames(): string[] {
  return MEDIA.map((medium) => medium.name);
}

/** The saturable absorbers' names, in the table's order. */
export function absorberNames(): string[] {
  return ABSORBERS.map((absorber) => absorber.name);
}

/** The medium of that name, composition or alias; case, spaces and raised or lowered figures don't matter. */
export function findMedium(name: string): Medium | undefined {
  return byName(MEDIA, name);
}

/** The saturable absorber of that name, composition or alias, compared as media are. */
export function findAbsorber(name: string): AbsorberRow | undefined {
  const absorber = byName(ABSORBERS, name);
  if (absorber === undefined) return undefined;
  const { wavelengths, figures } = absorber;
  return {
    name: absorber.name,
    composition: absorber.composition,
    wavelengths: wavelengths.map(metres),
    figures: readFigures(figures),
  };
}

/**
 * The medium at the line nearest to a wavelength in m, if one lies within `LINE_TOLERANCE`; without a wavelength, at its
 * strongest line: the largest emission cross-section of those that end on the ground manifold or empty quickly.
 */
export function findLine(medium: Medium, wavelength?: number): MediumRow | undefined {
  const line = wavelength === undefined ? medium.lines.find((each) => each.strongest) : nearest(medium, wavelength);
  return line === undefined ? undefined : readLine(medium, line);
}

/** The wavelengths in m of a medium's lines; none for a name that is not in the table. */
export function lineWavelengths(name: string): number[] {
  return (findMedium(name)?.lines ?? []).map((line) => metres(line.wavelength));
}

function nearest(medium: Medium, wavelength: number): LineText | undefined {
  let found: LineText | undefined;
  let least = LINE_TOLERANCE;
  for (const line of medium.lines) {
    const distance = Math.abs(wavelength / metres(line.wavelength) - 1);
    if (!(distance <= least)) continue;
    least = distance;
    found = line;
  }
  return found;
}

function readLine(medium: Medium, line: LineText): MediumRow {
  const [from, to] = (line.pump_band ?? []).map(metres);
  let figures: Figures | undefined;
  return {
    name: medium.name,
    kind: MEDIUM_KINDS.find((kind) => kind === (line.kind ?? medium.kind)) ?? 'four_level',
    wavelength: metres(line.wavelength),
    strongest: line.strongest,
    pumpWavelengths: line.pump_wavelengths.map(metres),
    ...(from === undefined || to === undefined ? {} : { pumpBand: [from, to] as const }),
    /** Read when first asked for: mostly the question is only whether there is such a line. */
    get figures() {
      // A line's own figure wins over the host's.
      figures ??= readFigures({ ...medium.figures, ...line.figures });
      return figures;
    },
  };
}

function readFigures(texts: FigureTexts): Figures {
  const figures: Partial<Record<FigureName, MaterialFigure>> = {};
  for (const name of Object.keys(FIGURE_DIMENSIONS) as FigureName[]) {
    const figure = texts[name];
    if (figure === undefined) continue;
    const value = si(figure.value, FIGURE_DIMENSIONS[name]);
    if (value === undefined) continue;
    const [low, high] = (figure.range ?? []).map((end) => si(end, FIGURE_DIMENSIONS[name]));
    figures[name] = {
      value,
      text: figure.value,
      ...(low === undefined || high === undefined ? {} : { range: [low, high] as const }),
      source: figure.source,
      fromMemory: figure.fromMemory ?? false,
    };
  }
  return figures;
}

function si(text: string, dimension: DimensionName): number | undefined {
  const read = readQuantity(text, dimension);
  return 'quantity' in read ? read.quantity.value : undefined;
}

function metres(text: string): number {
  return si(text, 'length') ?? Number.NaN;
}

function byName<Row extends { name: string; composition: string; aliases: readonly string[] }>(
  rows: readonly Row[],
  name: string,
): Row | undefined {
  const wanted = plain(name);
  return rows.find((row) => [row.name, row.composition, ...row.aliases].some((known) => plain(known) === wanted));
}

/** `Nd:YVO₄`, `nd: yvo4` and `Nd YVO4` alike: compatibility forms folded, the minus sign made a hyphen. */
function plain(name: string): string {
  return name
    .normalize('NFKC')
    .replace(/\u2212/g, '-')
    .replace(/[\s:]+/g, '')
    .toLowerCase();
}

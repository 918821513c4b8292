import type { Analysis } from '../core/analyse.ts';
import {
  FIGURE_DIMENSIONS,
  type FigureName,
  findAbsorber,
  findLine,
  findMedium,
  lineWavelengths,
  type MaterialFigure,
} from '../core/physics/materials.ts';
import type { DimensionName } from '../core/quantity/dimension.ts';
import { formatQuantity, formatWavelength } from '../core/quantity/format.ts';
import { escaped } from './markdown.ts';
import { raised } from './show.ts';

/** What the property table knows of the key at a path: the material's lines, or one figure with its source and spread. */
export function tableHelp({ design }: Analysis, path: string): readonly string[] {
  const { gain_medium, q_switch } = design.values;
  const material = gain_medium?.material;
  if (path === 'gain_medium.material' || path === 'gain_medium.wavelength') return mediumHelp(material);
  const [section, key = ''] = path.split(/\.(?=[^.]*$)/);
  if (!isFigure(key)) return [];
  if (section === 'gain_medium' && material !== undefined) {
    const medium = findMedium(material);
    const row = medium && findLine(medium, gain_medium?.wavelength?.value);
    const figure = row?.figures[key];
    return figure ? [figureHelp(figure, key, `${row.name} at ${formatWavelength(row.wavelength)}`)] : [];
  }
  const absorber = q_switch?.absorber?.material;
  if (section === 'q_switch.absorber' && absorber !== undefined) {
    const figure = findAbsorber(absorber)?.figures[key];
    return figure ? [figureHelp(figure, key, absorber)] : [];
  }
  return [];
}

/** Whether a key is a figure that the property table may hold. */
export function isFigure(key: string): key is FigureName {
  return Object.hasOwn(FIGURE_DIMENSIONS, key);
}

function mediumHelp(material: string | undefined): readonly string[] {
  const medium = material === undefined ? undefined : findMedium(material);
  if (medium === undefined) return [];
  const lines = lineWavelengths(medium.name).map((line) => formatWavelength(line));
  return [
    `In the property table: ${escaped(medium.name)}, ${escaped(medium.composition)}; lines at ${lines.join(', ')}.`,
  ];
}

/** `Property table, Nd:YAG at 1064 nm: 2.8e-19 cm² (sources from … to …); source`. */
function figureHelp(figure: MaterialFigure, key: FigureName, row: string): string {
  const { text, source, fromMemory } = figure;
  const trust = fromMemory ? ' From memory: check it before you rely on it.' : '';
  return `Property table, ${escaped(row)}: ${raised(text)}${spreadOf(figure, FIGURE_DIMENSIONS[key])}. ${escaped(source)}.${trust}`;
}

/** How far published values differ. */
export function spreadOf({ range }: MaterialFigure, dimension: DimensionName): string {
  if (range === undefined) return '';
  const [low, high] = range.map((end) => raised(formatQuantity(end, dimension)));
  return ` (published values from ${low} to ${high})`;
}

import type { Analysis } from '../../core/analyse.ts';
import {
  absorberNames,
  FIGURE_DIMENSIONS,
  findAbsorber,
  findLine,
  findMedium,
  lineWavelengths,
  type MaterialFigure,
  mediumNames,
} from '../../core/physics/materials.ts';
import { formatWavelength } from '../../core/quantity/format.ts';
import { escaped } from '../markdown.ts';
import { isFigure, spreadOf } from '../table-help.ts';
import type { Cursor } from './cursor.ts';
import type { Known } from './values.ts';

/** What the property table and the design itself know for a key: materials, lines, figures, the laser's own wavelength. */
export function knownValues({ design }: Analysis, { section, key = '', siblings }: Cursor): readonly Known[] {
  const { gain_medium, q_switch } = design.values;
  const inMedium = section === 'gain_medium';
  // What is half typed elsewhere may have cost the tree its values: the lines around the cursor come first.
  const material = (inMedium ? siblings['material'] : undefined) ?? gain_medium?.material;
  const medium = material === undefined ? undefined : findMedium(material);
  const row = medium && (findLine(medium, gain_medium?.wavelength?.value) ?? findLine(medium));
  if (inMedium && key === 'material') return mediumNames().map(mediumValue);
  if (inMedium && key === 'wavelength') return medium === undefined ? [] : lines(medium.name);
  if (section === 'pump' && key === 'wavelength') {
    return (row?.pumpWavelengths ?? []).map((wavelength) => ({
      text: formatWavelength(wavelength),
      detail: `pumps ${row?.name}`,
    }));
  }
  if (section.endsWith('damage_threshold') && key === 'wavelength') {
    const own = gain_medium?.wavelength?.value ?? row?.wavelength;
    return own === undefined ? [] : [{ text: formatWavelength(own), detail: "the laser's own" }];
  }
  if (section === 'q_switch.absorber') {
    if (key === 'material')
      return absorberNames().map((text) => ({ text, detail: findAbsorber(text)?.composition ?? '' }));
    const absorber = siblings['material'] ?? q_switch?.absorber?.material;
    return tableValue(key, absorber === undefined ? undefined : findAbsorber(absorber)?.figures);
  }
  return inMedium ? tableValue(key, row?.figures) : [];
}

function mediumValue(name: string): Known {
  const medium = findMedium(name);
  const wavelengths = lineWavelengths(name).map((line) => formatWavelength(line));
  return { text: name, detail: `${medium?.composition ?? ''}; ${wavelengths.join(', ')}` };
}

/** The strongest line first. */
function lines(name: string): Known[] {
  const medium = findMedium(name);
  const strongest = medium && findLine(medium)?.wavelength;
  return lineWavelengths(name)
    .map((line) => ({ line, isStrongest: line === strongest }))
    .sort((a, b) => Number(b.isStrongest) - Number(a.isStrongest))
    .map(({ line, isStrongest }) => ({
      text: formatWavelength(line),
      detail: isStrongest ? `strongest line of ${name}` : `line of ${name}`,
    }));
}

function tableValue(key: string, figures: Readonly<Partial<Record<string, MaterialFigure>>> | undefined): Known[] {
  const figure = isFigure(key) ? figures?.[key] : undefined;
  if (figure === undefined || !isFigure(key)) return [];
  const trust = figure.fromMemory ? ' From memory.' : '';
  const documentation = `${escaped(figure.source)}.${trust}${spreadOf(figure, FIGURE_DIMENSIONS[key])}`;
  return [{ text: figure.text, detail: 'property table', documentation }];
}

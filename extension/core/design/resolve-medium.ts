import type { GainMedium } from '../physics/gain-module.ts';
import {
  type Figures,
  findLine,
  findMedium,
  lineWavelengths,
  type MediumRow,
  mediumNames,
} from '../physics/materials.ts';
import { formatWavelength } from '../quantity/format.ts';
import type { Fix, Problem, TextRange } from '../report/problem.ts';
import type { GainMediumSection } from './generated/gain-module.ts';
import type { Origins } from './origins.ts';
import type { Draft } from './read.ts';
import { nearest } from './suggest.ts';

type Section = Draft<GainMediumSection>;
type FigureKey = keyof Section & keyof Figures;
type Report = (path: string, message: string, fix?: string) => void;

/** The medium with the table's figures filled in where the file gives none; undefined, with the reason told, where one is missing. */
export function resolveMedium(section: Section, origins: Origins, report: Report): GainMedium | undefined {
  const { material, length } = section;
  if (material === undefined || length === undefined) return undefined;
  const medium = findMedium(material);
  const row = medium && findLine(medium, section.wavelength?.value);
  const pick = (key: FigureKey): number | undefined => {
    const figure = row?.figures[key];
    return section[key]?.value ?? (figure && origins.table(`gain_medium.${key}`, figure, rowName(row)));
  };
  const wavelength =
    section.wavelength?.value ??
    (row &&
      origins.fallback(
        'gain_medium.wavelength',
        row.wavelength,
        `${formatWavelength(row.wavelength)}, the strongest line of ${row.name}`,
      ));
  const emission = pick('emission_cross_section');
  const lifetime = pick('upper_level_lifetime');
  const index = pick('refractive_index');
  const absorption = pick('absorption_cross_section');
  const density = absorption ? pick('ion_density') : section.ion_density?.value;
  const needed = {
    wavelength,
    emission_cross_section: emission,
    absorption_cross_section: absorption,
    ...(absorption && { ion_density: density }),
    upper_level_lifetime: lifetime,
    refractive_index: index,
  };
  const missing = Object.entries(needed).flatMap(([key, value]) => (value === undefined ? [`\`${key}\``] : []));
  if (missing.length > 0) tellMissing(section, material, missing, report);
  if (wavelength === undefined || emission === undefined || absorption === undefined) return undefined;
  if (lifetime === undefined || index === undefined || missing.length > 0) return undefined;
  const lower = lowerLevel(section, row, report);
  const reduction = lower
    ? 1
    : (pick('inversion_reduction_factor') ?? origins.fallback('gain_medium.inversion_reduction_factor', 1, '1'));
  if (section.lower_level_lifetime && !lower) return undefined;
  if (absorption > 0 && (reduction !== 1 || lower)) {
    const path = `gain_medium.${lower ? 'lower_level_lifetime' : 'inversion_reduction_factor'}`;
    report(
      path,
      'The lower level is the ground state here (absorption_cross_section is not 0): it takes no part as a bottleneck and does not empty. Remove this key.',
    );
    return undefined;
  }
  return {
    wavelength,
    length: length.value,
    ...(section.diameter && { diameter: section.diameter.value }),
    emissionCrossSection: emission,
    absorptionCrossSection: absorption,
    ...(density !== undefined && { ionDensity: density }),
    upperLevelLifetime: lifetime,
    ...lower,
    inversionReductionFactor: reduction,
    refractiveIndex: index,
    groupIndex: pick('group_index') ?? origins.fallback('gain_medium.group_index', index, 'the refractive index'),
  };
}

function rowName(row: MediumRow): string {
  return `${row.name} at ${formatWavelength(row.wavelength)}`;
}

function tellMissing(section: Section, material: string, missing: readonly string[], report: Report): void {
  const ask = `give ${missing.join(', ')} in the file`;
  const medium = findMedium(material);
  if (!medium) {
    const near = nearest(material, mediumNames());
    const names = near ? `did you mean \`${near}\`?` : `it has ${mediumNames().join(', ')}.`;
    report(
      'gain_medium.material',
      `\`${material.slice(0, 40)}\` is not in the property table: ${names} Otherwise ${ask}.`,
      near,
    );
    return;
  }
  if (section.wavelength && !findLine(medium, section.wavelength.value)) {
    const lines = lineWavelengths(medium.name).map((line) => formatWavelength(line));
    report(
      'gain_medium.wavelength',
      `The property table has no line of ${medium.name} there, only ${lines.join(', ')}. Write one of these, or ${ask}.`,
    );
    return;
  }
  report('gain_medium.material', `The property table lacks a figure for ${medium.name} at this line: ${ask}.`);
}

/** κ = f_l/f_u from the table, for a lifetime that the file gives. */
function lowerLevel(section: Section, row: MediumRow | undefined, report: Report) {
  if (!section.lower_level_lifetime) return undefined;
  const upper = row?.figures.upper_level_fraction;
  const lower = row?.figures.lower_level_fraction;
  if (!upper || !lower) {
    report(
      'gain_medium.lower_level_lifetime',
      'The property table has no thermal fractions for this line, which a finite lower-level lifetime needs. Give `inversion_reduction_factor` instead: 1 for a lower level that empties at once, 1 + f_l/f_u for one that never does.',
    );
    return undefined;
  }
  return { lowerLevelLifetime: section.lower_level_lifetime.value, lowerLevelWeight: lower.value / upper.value };
}

/** Turns reports into problems on the lines of a design. */
export function reporter(problems: Problem[], rangeOf: (path: string) => TextRange): Report {
  return (path, message, replacement) => {
    const range = rangeOf(path);
    const fixes: Fix[] = replacement ? [{ title: `Replace by \`${replacement}\``, range, text: replacement }] : [];
    problems.push({ code: 'no-table-figure', severity: 'error', message, path, range, ...(replacement && { fixes }) });
  };
}

import fc from 'fast-check';
import { describe, expect, it } from 'vitest';
import table from '../../extension/core/physics/materials.json' with { type: 'json' };
import {
  absorberNames,
  FIGURE_DIMENSIONS,
  type FigureName,
  type Figures,
  findAbsorber,
  findLine,
  findMedium,
  LINE_TOLERANCE,
  lineWavelengths,
  type MaterialFigure,
  type MediumRow,
  mediumNames,
} from '../../extension/core/physics/materials.ts';

function row(name: string, nanometres?: number): MediumRow {
  const medium = findMedium(name);
  const found = medium && findLine(medium, nanometres === undefined ? undefined : nanometres * 1e-9);
  if (found === undefined) throw new Error(`no line of ${name} at ${nanometres} nm`);
  return found;
}

function figure(figures: Figures, name: FigureName): MaterialFigure {
  const found = figures[name];
  if (found === undefined) throw new Error(`no ${name}`);
  return found;
}

function absorber(name: string): Figures {
  const found = findAbsorber(name);
  if (found === undefined) throw new Error(`no absorber ${name}`);
  return found.figures;
}

const rows: MediumRow[] = mediumNames().flatMap((name) => lineWavelengths(name).map((at) => row(name, at * 1e9)));
const labelled = rows.map((each) => [`${each.name} ${(each.wavelength * 1e9).toFixed(1)} nm`, each] as const);
const everyFigure: (readonly [string, FigureName, MaterialFigure])[] = [
  ...labelled.map(([label, each]) => [label, each.figures] as const),
  ...absorberNames().map((name) => [name, absorber(name)] as const),
].flatMap(([label, figures]) =>
  (Object.keys(figures) as FigureName[]).map((name) => [label, name, figure(figures, name)] as const),
);

describe('the table as written', () => {
  it('has only figures that can be read in their dimension, with both ends of every range', () => {
    const lines = table.media.flatMap((medium): readonly { figures: object }[] => medium.lines);
    const hosts: readonly { figures: object }[] = [...table.media, ...lines, ...table.absorbers];
    expect(hosts.length).toBeGreaterThan(30);
    for (const { figures } of hosts) {
      for (const name of Object.keys(figures)) expect(Object.keys(FIGURE_DIMENSIONS)).toContain(name);
    }
    for (const medium of table.media) {
      for (const line of medium.lines) {
        const read = row(medium.name, Number.parseFloat(line.wavelength)).figures;
        for (const [name, text] of Object.entries({ ...medium.figures, ...line.figures })) {
          const found = figure(read, name as FigureName);
          expect(found.text).toBe(text.value);
          expect(found.range !== undefined).toBe('range' in text);
          if ('range' in text) expect(text.range).toHaveLength(2);
        }
      }
    }
    for (const each of table.absorbers) {
      expect(Object.keys(absorber(each.name)).sort()).toEqual(Object.keys(each.figures).sort());
    }
  });

  it.each(everyFigure)('%s: %s is finite, sourced and within its own range', (_label, name, found) => {
    expect(Number.isFinite(found.value)).toBe(true);
    if (name !== 'thermo_optic_coefficient') expect(found.value).toBeGreaterThanOrEqual(0);
    expect(found.source.trim().length).toBeGreaterThan(8);
    expect(found.source).not.toMatch(/[®™]|https?:|\b(?:Inc|Ltd|GmbH|Corp)\b/);
    if (found.range === undefined) return;
    expect(found.range[0]).toBeLessThan(found.range[1]);
    expect(found.value).toBeGreaterThanOrEqual(found.range[0]);
    expect(found.value).toBeLessThanOrEqual(found.range[1]);
  });

  it.each(labelled)('%s gives a design every property it may leave out', (_label, { figures, kind }) => {
    figure(figures, 'upper_level_lifetime');
    figure(figures, 'thermal_conductivity');
    expect(figure(figures, 'emission_cross_section').value).toBeGreaterThan(0);
    expect(figure(figures, 'refractive_index').value).toBeGreaterThan(1.3);
    const reabsorbs = figure(figures, 'absorption_cross_section').value > 0;
    expect(reabsorbs).toBe(kind !== 'four_level');
    if (!reabsorbs) return;
    // A gamma beside a reabsorption cross-section would count the lower level twice.
    expect(figure(figures, 'inversion_reduction_factor').value).toBe(1);
    expect(figure(figures, 'ion_density').value).toBeGreaterThan(1e24);
  });

  it('has pump wavelengths or a pump band at every line, shorter than the laser wavelength', () => {
    for (const { pumpWavelengths, pumpBand, wavelength } of rows) {
      const pumps = [...pumpWavelengths, ...(pumpBand ?? [])];
      expect(pumps.length).toBeGreaterThan(0);
      for (const pump of pumps) {
        expect(pump).toBeGreaterThan(3e-7);
        expect(pump).toBeLessThan(wavelength);
      }
    }
    expect(row('alexandrite').pumpBand).toEqual([380e-9, 680e-9]);
  });

  it('marks one strongest line a medium: the largest cross-section that does not terminate itself', () => {
    for (const medium of table.media) {
      const lines = rows.filter((each) => each.name === medium.name);
      expect(lines.filter((line) => line.strongest)).toHaveLength(1);
      const lasting = lines.filter(({ figures }) => {
        const lower = figures.lower_level_lifetime?.value ?? 0;
        return lower < figure(figures, 'upper_level_lifetime').value;
      });
      const sections = lasting.map(({ figures }) => figure(figures, 'emission_cross_section').value);
      expect(figure(row(medium.name).figures, 'emission_cross_section').value).toBe(Math.max(...sections));
    }
  });

  it('names media by composition only: ions, then a formula, an abbreviated formula, a mineral or a kind of glass', () => {
    const formula = /(?:(?:Y|Al|O|Gd|V|Li|F|K|W|Sr|Be|Mg)\d*|\((?:WO4)\)\d)+/.source;
    const host = `(?:${formula}|YAG|YLF|KGW|LiSAF|sapphire|chrysoberyl|spinel|(?:yttrium|gadolinium) vanadate)`;
    const ion = /(?:Nd|Yb|Er|Tm|Ho|Cr|Ti|V|Co)(?:\d\+)?/.source;
    const glass = `${ion}(?:[:, ]+${ion})*(?::| in |: ?| )(?:(?:phosphate|silicate) glass|glass(?: phosphate| silicate)?)`;
    const allowed = new RegExp(`^(?:${ion}:${host}|${glass}|ruby|alexandrite|LiF:F2-|LiF with F2- colour centres)$`);
    const all = [...table.media, ...table.absorbers];
    for (const { name, composition, aliases } of all) {
      for (const each of [name, composition, ...aliases]) expect(each).toMatch(allowed);
    }
    expect('Nd:Maker-7').not.toMatch(allowed);
  });

  it('keeps names apart, so that a name finds one material', () => {
    const seen = new Map<string, string>();
    for (const { name, composition, aliases } of [...table.media, ...table.absorbers]) {
      for (const each of [name, composition, ...aliases]) {
        const key = each.toLowerCase().replaceAll(' ', '');
        expect(seen.get(key) ?? name).toBe(name);
        seen.set(key, name);
      }
    }
  });
});

describe('finding a material', () => {
  // The media and lines that a first release must know, by the name a design would use.
  it.each([
    ['Nd:YAG', 1064],
    ['Nd:YAG', 946],
    ['Nd:YAG', 1319],
    ['Nd:YVO4', 1064],
    ['Nd:GdVO4', 1063],
    ['Nd:YLF', 1047],
    ['Nd:YLF', 1053],
    ['Nd:glass phosphate', 1053],
    ['Nd:glass silicate', 1061],
    ['Yb:YAG', 1030],
    ['Yb:KGW', 1025],
    ['Er:YAG', 1645],
    ['Er:Yb:glass', 1535],
    ['Tm:YAG', 2013],
    ['Ho:YAG', 2090],
    ['Cr:LiSAF', 850],
    ['alexandrite', 755],
    ['ruby', 694.3],
    ['Ti:sapphire', 790],
  ])('%s at %d nm', (name, nanometres) => {
    expect(row(name, nanometres).wavelength).toBeCloseTo(nanometres * 1e-9, 12);
  });

  it.each(['Cr4+:YAG', 'V3+:YAG', 'Co2+:spinel', 'Co2+:MgAl2O4', 'LiF:F2-'])('absorber %s', (name) => {
    const figures = absorber(name);
    const ground = figure(figures, 'ground_state_cross_section').value;
    expect(figure(figures, 'excited_state_cross_section').value).toBeLessThan(ground / 3);
    figure(figures, 'lifetime');
    figure(figures, 'refractive_index');
    expect(findAbsorber(name)?.wavelengths.every((each) => each > 1e-6 && each < 2e-6)).toBe(true);
  });

  it('forgives case, spaces and raised or lowered figures, and nothing else', () => {
    expect(findMedium('nd: yvo₄')?.name).toBe('Nd:YVO4');
    expect(findMedium(' Nd³⁺:Y₃Al₅O₁₂ ')?.name).toBe('Nd:YAG');
    expect(findMedium('Er:Yb phosphate glass')?.name).toBe('Er:Yb:phosphate glass');
    expect(findAbsorber('LiF:F₂⁻')?.name).toBe('LiF:F2-');
    expect(findAbsorber('LiF:F2−')?.name).toBe('LiF:F2-');
    for (const name of ['', 'Nd', 'Nd:YAGG', 'constructor', 'Nd:glass', 'Cr4+:YAG']) {
      expect(findMedium(name)).toBeUndefined();
    }
    expect(lineWavelengths('unobtainium')).toEqual([]);
  });

  it('takes the strongest line without a wavelength and the nearest within the tolerance with one', () => {
    expect(row('Nd:YAG').wavelength).toBeCloseTo(1.064e-6, 12);
    expect(row('Er:YAG').wavelength).toBeCloseTo(1.645e-6, 12);
    expect(row('Nd:GdVO4', 1064).wavelength).toBeCloseTo(1.063e-6, 12);
    expect(row('Nd:YLF', 1050.1).wavelength).toBeCloseTo(1.053e-6, 12);
    expect(row('Nd:YLF', 1049.9).wavelength).toBeCloseTo(1.047e-6, 12);
    const medium = findMedium('Nd:YAG');
    if (medium === undefined) throw new Error('no Nd:YAG');
    for (const factor of [1 + 1.01 * LINE_TOLERANCE, 1 - 1.01 * LINE_TOLERANCE]) {
      expect(findLine(medium, 1.064e-6 * factor)).toBeUndefined();
    }
    for (const none of [Number.NaN, Number.POSITIVE_INFINITY, 0, -1.064e-6]) {
      expect(findLine(medium, none)).toBeUndefined();
    }
  });

  it("lets a line's figure win over the host's, and leaves out what can't be read", () => {
    const written = (value: string) => ({ value, source: 'made up for this test' });
    const line = {
      wavelength: '1 um',
      strongest: true,
      pump_wavelengths: [],
      figures: { refractive_index: written('1.7'), lifetime: written('3 parsecs') },
    };
    const host = { refractive_index: written('1.5'), ion_density: written('1e20 cm-3') };
    const medium = { name: 'A', composition: 'A', aliases: [], kind: 'three_level', figures: host, lines: [line] };
    const { figures } = findLine(medium, 1e-6) ?? { figures: {} };
    expect(Object.keys(figures).sort()).toEqual(['ion_density', 'refractive_index']);
    expect(figure(figures, 'refractive_index')).toEqual({
      value: 1.7,
      text: '1.7',
      source: 'made up for this test',
      fromMemory: false,
    });
    expect(figure(figures, 'ion_density').value).toBeCloseTo(1e26, -13);
  });

  it('answers any text and any number without an exception', () => {
    fc.assert(
      fc.property(fc.string({ unit: 'binary' }), fc.double(), (text, number) => {
        findAbsorber(text);
        lineWavelengths(text);
        const medium = findMedium(text) ?? findMedium('Nd:YLF');
        if (medium === undefined) throw new Error('no Nd:YLF');
        findLine(medium, number);
      }),
    );
  });
});

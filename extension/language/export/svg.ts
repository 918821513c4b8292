import type { Axis, BarChart, Chart, LineChart } from '../../protocol/chart.ts';
import { linearScale, logarithmicScale, type Scale } from './ticks.ts';

/** The picture's size and the box of its plot, in px. */
const WIDTH = 760;
const HEIGHT = 440;
const BOX = { left: 78, right: 682, top: 64, bottom: 372 } as const;
const INK = '#1a1a1a';
const FAINT = '#d9d9d9';
/** Told apart by dashes first; the colours differ in lightness too. */
const STYLES = [
  { stroke: '#0b4f8a', dash: '' },
  { stroke: '#a34700', dash: '7 4' },
] as const;

/** A chart as a picture for a report: dark on white, with its title, the design's name, and its summary as description. */
export function chartSvg(chart: Chart, subject: string): string {
  const inner = chart.kind === 'lines' ? linePlot(chart) : barPlot(chart);
  return [
    `<svg xmlns="http://www.w3.org/2000/svg" width="${WIDTH}" height="${HEIGHT}" viewBox="0 0 ${WIDTH} ${HEIGHT}" role="img" font-family="Helvetica, Arial, sans-serif" font-size="12" fill="${INK}">`,
    `<title>${xml(`${chart.title}: ${subject}`)}</title>`,
    `<desc>${xml(chart.summary)}</desc>`,
    `<rect width="${WIDTH}" height="${HEIGHT}" fill="#ffffff"/>`,
    label(BOX.left, 24, chart.title, 'font-size="15" font-weight="600"'),
    label(BOX.left, 42, clipped(subject, 95), 'fill="#555555"'),
    ...inner,
    label(BOX.left, HEIGHT - 8, 'Predicted, not measured.', 'font-size="10" fill="#555555"'),
    '</svg>',
    '',
  ].join('\n');
}

function linePlot({ x, left, right, lines, marks }: LineChart): string[] {
  const across = x.logarithmic ? logarithmicScale(x.values) : linearScale(x.values, 8);
  const scales = { left: scaleOf(lines, 'left'), right: scaleOf(lines, 'right') };
  const curves = lines.map(({ values, axis }, index) => {
    const points = values.map((value, at) => `${px(across, x.values[at] ?? 0)},${py(scales[axis], value)}`);
    return `<polyline points="${points.join(' ')}" fill="none" ${stroke(index)}/>`;
  });
  const legend = lines.flatMap(({ label: name }, index) => {
    const start = BOX.left + 200 * index;
    const line = `<line x1="${start}" y1="${BOX.top - 8}" x2="${start + 28}" y2="${BOX.top - 8}" ${stroke(index)}/>`;
    return [line, label(start + 34, BOX.top - 4, name)];
  });
  return [
    ...frame(),
    ...across.ticks.flatMap(({ value, text }) => [
      `<line x1="${px(across, value)}" y1="${BOX.top}" x2="${px(across, value)}" y2="${BOX.bottom}" stroke="${FAINT}"/>`,
      label(px(across, value), BOX.bottom + 16, text, 'text-anchor="middle"'),
    ]),
    label((BOX.left + BOX.right) / 2, BOX.bottom + 36, named(x), 'text-anchor="middle"'),
    ...sideAxis(scales.left, left, 'left'),
    ...sideAxis(scales.right, right, 'right'),
    ...curves,
    ...marks.flatMap(({ label: text, x: at, kind }, index) => {
      const where = px(across, at);
      const early = Number(where) < (BOX.left + BOX.right) / 2;
      const dash = kind === 'present' ? '2 3' : '10 3 2 3';
      return [
        `<line x1="${where}" y1="${BOX.top}" x2="${where}" y2="${BOX.bottom}" stroke="${INK}" stroke-dasharray="${dash}"/>`,
        label(
          Number(where) + (early ? 5 : -5),
          BOX.top + 16 + 16 * index,
          text,
          `text-anchor="${early ? 'start' : 'end'}"`,
        ),
      ];
    }),
    ...legend,
  ];
}

function scaleOf(lines: LineChart['lines'], axis: 'left' | 'right'): Scale {
  const values = lines.flatMap((line) => (line.axis === axis ? line.values : []));
  return linearScale(values, 6);
}

function sideAxis(scale: Scale, axis: Axis, side: 'left' | 'right'): string[] {
  const edge = side === 'left' ? BOX.left : BOX.right;
  const outward = side === 'left' ? -1 : 1;
  const anchor = side === 'left' ? 'end' : 'start';
  const middle = (BOX.top + BOX.bottom) / 2;
  const across = edge + outward * 56;
  return [
    ...scale.ticks.flatMap(({ value, text }) => [
      `<line x1="${edge}" y1="${py(scale, value)}" x2="${edge + outward * 5}" y2="${py(scale, value)}" stroke="${INK}"/>`,
      label(edge + outward * 8, Number(py(scale, value)) + 4, text, `text-anchor="${anchor}"`),
    ]),
    label(across, middle, named(axis), `text-anchor="middle" transform="rotate(${outward * 90} ${across} ${middle})"`),
  ];
}

function barPlot({ bars, axis }: BarChart): string[] {
  const scale = linearScale([0, ...bars.flatMap(({ value, limit = 0 }) => [value, limit])], 8);
  const step = Math.min(56, (BOX.bottom - BOX.top) / Math.max(1, bars.length));
  const from = BOX.left + 150;
  const place = (value: number) => (from + scale.at(value) * (BOX.right - from)).toFixed(1);
  return [
    ...scale.ticks.flatMap(({ value, text }) => [
      `<line x1="${place(value)}" y1="${BOX.top}" x2="${place(value)}" y2="${BOX.bottom}" stroke="${FAINT}"/>`,
      label(Number(place(value)), BOX.bottom + 16, text, 'text-anchor="middle"'),
    ]),
    label((from + BOX.right) / 2, BOX.bottom + 36, named(axis), 'text-anchor="middle"'),
    ...bars.flatMap(({ label: name, value, limit, wanted }, index) => {
      const top = BOX.top + step * index + step * 0.2;
      const height = step * 0.6;
      const mark = (at: number | undefined, dash: string) =>
        at === undefined
          ? []
          : [
              `<line x1="${place(at)}" y1="${(top - 3).toFixed(1)}" x2="${place(at)}" y2="${(top + height + 3).toFixed(1)}" stroke="${INK}" stroke-width="2"${dash}/>`,
            ];
      return [
        label(from - 8, top + height / 2 + 4, clipped(name, 34), 'text-anchor="end" font-size="11"'),
        `<rect x="${place(0)}" y="${top.toFixed(1)}" width="${(Number(place(value)) - Number(place(0))).toFixed(1)}" height="${height.toFixed(1)}" fill="#7aa6cf" stroke="#0b4f8a"/>`,
        ...mark(wanted, ' stroke-dasharray="3 2"'),
        ...mark(limit, ''),
      ];
    }),
    label(
      BOX.left,
      BOX.top - 8,
      'solid mark: damage threshold for this pulse; dashed mark: most that keeps the wanted safety factor',
    ),
  ];
}

function frame(): string[] {
  const { left, right, top, bottom } = BOX;
  return [
    `<rect x="${left}" y="${top}" width="${right - left}" height="${bottom - top}" fill="none" stroke="${INK}"/>`,
  ];
}

function px(scale: Scale, value: number): string {
  return (BOX.left + scale.at(value) * (BOX.right - BOX.left)).toFixed(1);
}

function py(scale: Scale, value: number): string {
  return (BOX.bottom - scale.at(value) * (BOX.bottom - BOX.top)).toFixed(1);
}

function stroke(index: number): string {
  const { stroke: colour, dash } = STYLES[index % STYLES.length] ?? STYLES[0];
  return `stroke="${colour}" stroke-width="2"${dash === '' ? '' : ` stroke-dasharray="${dash}"`}`;
}

function named({ label: text, unit }: Axis): string {
  return unit === '' ? text : `${text} (${unit})`;
}

function label(x: number | string, y: number, text: string, more = ''): string {
  return `<text x="${x}" y="${y.toFixed(1)}"${more === '' ? '' : ` ${more}`}>${xml(text)}</text>`;
}

function clipped(text: string, most: number): string {
  return text.length > most ? `${text.slice(0, most - 1)}…` : text;
}

/** XML 1.0 allows no control characters and no lone surrogates. */
function xml(text: string): string {
  return text
    .replace(/[^\t\n\r\u0020-\ud7ff\ue000-\ufffd\u{10000}-\u{10ffff}]/gu, ' ')
    .replaceAll('&', '&amp;')
    .replaceAll('<', '&lt;')
    .replaceAll('>', '&gt;')
    .replaceAll('"', '&quot;');
}

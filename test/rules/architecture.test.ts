import { readdirSync, readFileSync } from 'node:fs';
import { dirname, join, relative } from 'node:path';
import { fileURLToPath } from 'node:url';
import { describe, expect, it } from 'vitest';

const root = join(dirname(fileURLToPath(import.meta.url)), '../..');

/** Which rooms a room may import from; DEVELOPERS.md draws the same map. */
const MAY_IMPORT: Readonly<Record<string, readonly string[]>> = {
  'extension/core/quantity': ['extension/core/report/problem.ts'],
  'extension/core/numerics': [],
  'extension/core/physics': ['extension/core/quantity', 'extension/core/numerics'],
  'extension/core/design': ['extension/core/quantity', 'extension/core/physics', 'extension/core/report/problem.ts'],
  'extension/core/checks': [
    'extension/core/quantity',
    'extension/core/physics',
    'extension/core/design',
    'extension/core/report',
  ],
  'extension/core/report': [
    'extension/core/quantity',
    'extension/core/physics',
    'extension/core/design',
    'extension/core/analyse.ts',
  ],
  'extension/core/explore': ['extension/core'],
  'extension/core/analyse.ts': ['extension/core'],
  'extension/language': ['extension/core', 'extension/protocol'],
  'extension/server': ['extension/core', 'extension/language', 'extension/protocol'],
  'extension/protocol': [],
  'extension/cli': ['extension/core', 'package.json'],
  'extension/editor': ['extension/protocol'],
  webview: ['extension/protocol'],
};

/** Packages that a room may import; the core is pure but for the YAML parser. */
const PACKAGES: Readonly<Record<string, RegExp>> = {
  'extension/core/design': /^yaml$/,
  'extension/core': /^$/,
  'extension/language': /^vscode-languageserver(-types|-protocol|-textdocument)?$/,
  'extension/server': /^(vscode-languageserver(-types|-protocol|-textdocument)?(\/.*)?|node:.*)$/,
  'extension/protocol': /^$/,
  'extension/cli': /^(commander|tinyglobby|node:.*)$/,
  'extension/editor': /^(vscode|vscode-languageclient(\/.*)?)$/,
  webview: /^(chart\.js|@vscode\/webview-ui-toolkit)$/,
};

const sources = ['extension', 'webview'].flatMap((folder) =>
  readdirSync(join(root, folder), { recursive: true, encoding: 'utf8' })
    .filter((file) => file.endsWith('.ts') && !file.endsWith('.d.ts'))
    .map((file) => join(folder, file)),
);

function roomOf(file: string, rooms: Readonly<Record<string, unknown>>): string | undefined {
  return Object.keys(rooms)
    .filter((room) => file === room || file.startsWith(`${room}/`))
    .sort((a, b) => b.length - a.length)[0];
}

function importsOf(file: string): string[] {
  const text = readFileSync(join(root, file), 'utf8');
  return [
    ...text.matchAll(
      /(?:^|\n)\s*(?:import|export)\b[^;'"]*?from\s+'([^']+)'|\bimport\('([^']+)'\)|(?:^|\n)import '([^']+)'/g,
    ),
  ].map((match) => match[1] ?? match[2] ?? match[3] ?? '');
}

describe('architecture', () => {
  it('sees the sources and their imports', () => {
    expect(sources.length).toBeGreaterThan(80);
    expect(importsOf('extension/core/analyse.ts')).toContain('./design/read.ts');
  });

  it.each(sources)('%s imports only what its room may', (file) => {
    const room = roomOf(file, MAY_IMPORT);
    expect(room, 'a file in no room').toBeDefined();
    for (const target of importsOf(file)) {
      if (target.startsWith('.')) {
        const path = relative(root, join(root, dirname(file), target));
        const allowed = [room!, ...MAY_IMPORT[room!]!];
        expect(
          allowed.some((place) => path === place || path.startsWith(`${place}/`)),
          `${file} imports ${path}`,
        ).toBe(true);
      } else {
        expect(target, `${file} imports ${target}`).toMatch(PACKAGES[roomOf(file, PACKAGES)!]!);
      }
    }
  });

  it('lets only one file import the webview toolkit', () => {
    const users = sources.filter((file) => importsOf(file).includes('@vscode/webview-ui-toolkit'));
    expect(users).toEqual(['webview/ui/toolkit.ts']);
  });

  it('keeps the core free of clock, randomness and globals of a host', () => {
    const core = sources.filter((file) => file.startsWith('extension/core/'));
    for (const file of core) {
      const code = readFileSync(join(root, file), 'utf8').replace(/\/\*[\s\S]*?\*\/|\/\/.*$/gm, '');
      expect(code, file).not.toMatch(/\bDate\b|Math\.random|\bprocess\.|\bglobalThis\b|\bperformance\b/);
    }
  });

  it('keeps files small', () => {
    const lengths = sources
      .filter((file) => !file.includes('/generated/'))
      .map((file) => readFileSync(join(root, file), 'utf8').split('\n').length)
      .sort((a, b) => a - b);
    expect(lengths.at(-1)).toBeLessThanOrEqual(400);
    expect(lengths[Math.floor(lengths.length / 2)]).toBeLessThan(90);
  });
});

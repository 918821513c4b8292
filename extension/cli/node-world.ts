import { closeSync, openSync, readSync, statSync, writeSync } from 'node:fs';
import { createRequire } from 'node:module';
import manifest from '../../package.json' with { type: 'json' };
import type { World } from './world.ts';

/** A design has at most 2 MB; reading a little more is enough to see that there is more. */
const MOST_BYTES = 8 * 1024 * 1024;

/** Files and streams of this process. */
export function nodeWorld(): World {
  return {
    version: manifest.version,
    kindOf(path) {
      try {
        const stat = statSync(path, { throwIfNoEntry: false });
        if (stat === undefined) return 'nothing';
        return stat.isDirectory() ? 'folder' : 'file';
      } catch {
        // Something is there that can't be looked at; reading it will say why.
        return 'file';
      }
    },
    read(path) {
      const file = openSync(path, 'r');
      try {
        const bytes = Buffer.alloc(Math.min(MOST_BYTES, statSync(path).size || MOST_BYTES));
        let length = 0;
        for (let got = 1; got > 0 && length < bytes.length; length += got) {
          got = readSync(file, bytes, length, bytes.length - length, null);
        }
        return bytes.toString('utf8', 0, length);
      } finally {
        closeSync(file);
      }
    },
    async find(patterns) {
      // Loaded only where it is needed: it would slow every start.
      const { glob } = await import('tinyglobby');
      const found = await glob(patterns, { ignore: ['**/node_modules/**'], dot: false, expandDirectories: false });
      return found.sort();
    },
    serve() {
      // The same bundle that VS Code starts: it listens as soon as it is loaded, and ends the process with its client.
      createRequire(import.meta.url)('./server.cjs');
      return new Promise<never>(() => undefined);
    },
    out: (text) => write(1, text),
    err: (text) => write(2, text),
  };
}

/** Writes all of it before returning; a reader that has gone away ends the writing. */
function write(descriptor: number, text: string): void {
  const bytes = Buffer.from(text);
  for (let done = 0; done < bytes.length; ) {
    try {
      done += writeSync(descriptor, bytes, done);
    } catch (error) {
      const code = error instanceof Error && 'code' in error ? error.code : undefined;
      if (code === 'EAGAIN') continue;
      return;
    }
  }
}

import type { World } from './world.ts';

/** The designs that arguments name, or what is wrong with the first argument that names none. */
export type Designs = { readonly files: readonly string[] } | { readonly refusal: string };

const PATTERN = /[*?[\]{}!]/;

/** Files as they are named, folders with all designs below them, and patterns (for shells that leave them alone). */
export async function designFiles(args: readonly string[], world: World): Promise<Designs> {
  const files = new Set<string>();
  for (const arg of args) {
    const kind = world.kindOf(arg);
    if (kind === 'file') files.add(arg);
    else if (kind === 'folder') {
      const folder = arg.replace(/[\\/]+$/, '') || '/';
      const literal = folder.replaceAll('\\', '/').replace(/[*?[\]{}!()]/g, '\\$&');
      for (const file of await world.find([`${literal}/**/*.gainmodule.{yaml,yml}`])) files.add(file);
    } else if (PATTERN.test(arg)) {
      const found = await world.find([arg.replaceAll('\\', '/')]);
      if (found.length === 0) return { refusal: `nothing matches ${arg}` };
      for (const file of found) files.add(file);
    } else return { refusal: `no such file or folder: ${arg}` };
  }
  return { files: [...files] };
}

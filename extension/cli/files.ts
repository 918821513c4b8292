import type { World } from './world.ts';

/** The designs that arguments name, or the first argument that names none. */
export type Designs = { readonly files: readonly string[] } | { readonly missing: string };

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
      if (found.length === 0) return { missing: arg };
      for (const file of found) files.add(file);
    } else return { missing: arg };
  }
  return { files: [...files] };
}

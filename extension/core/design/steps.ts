/** `surfaces[0].beam_radius` as its steps; none for ''. */
export function steps(path: string): readonly (string | number)[] {
  if (path === '') return [];
  return path.split(/\.|(?=\[)/).map((token) => (token.startsWith('[') ? Number(token.slice(1, -1)) : token));
}

/** The text of a new design. */
export function template(): string {
  return 'format: 1\n';
}

/** Text of a design inside Markdown: shown as it is, whatever characters it holds. */
export function escaped(text: string): string {
  return text.replace(/[\\`*_[\]<&~|]/g, '\\$&').replace(/\s+/g, ' ');
}

/** The same in a code span, which knows no escapes. */
export function code(text: string): string {
  return `\`${text.replaceAll('`', "'").replace(/\s+/g, ' ')}\``;
}

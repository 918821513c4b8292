/** A text of any shape on one line, as titles and names need it. */
export function oneLine(text: string): string {
  return text.replace(/\s+/g, ' ').trim();
}

/** At most `longest` characters (2 or more); what is cut ends in … behind a whole word where one fits in most of the room. */
export function shortened(text: string, longest: number): string {
  if (text.length <= longest) return text;
  const room = text.slice(0, longest - 1);
  const word = room.lastIndexOf(' ');
  const cut = word > longest / 2 ? room.slice(0, word) : room;
  return `${cut.replace(/[\s,;:]+$/, '').replace(/[\uD800-\uDBFF]$/, '')}…`;
}

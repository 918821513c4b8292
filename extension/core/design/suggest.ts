const LONGEST_NAME = 40;

/** The candidate that a misspelt word was most likely meant to be, if any is near enough. */
export function nearest(word: string, candidates: readonly string[]): string | undefined {
  if (word.length > LONGEST_NAME) return undefined;
  const wanted = folded(word);
  let best: string | undefined;
  let least = Math.min(4, Math.floor(wanted.length * 0.4)) + 1;
  for (const candidate of candidates) {
    const distance = editDistance(wanted, folded(candidate));
    if (distance < least) {
      least = distance;
      best = candidate;
    }
  }
  return best;
}

function folded(word: string): string {
  return word.toLowerCase().replace(/[-\s.]+/g, '_');
}

/** Insertions, deletions, changes and swaps of neighbours that make one word of another (optimal string alignment). */
export function editDistance(one: string, other: string): number {
  let before: number[] = [];
  let previous = Array.from({ length: other.length + 1 }, (_, column) => column);
  for (let row = 1; row <= one.length; row++) {
    const current = [row];
    for (let column = 1; column <= other.length; column++) {
      const same = one[row - 1] === other[column - 1];
      let cost = Math.min(previous[column]! + 1, current[column - 1]! + 1, previous[column - 1]! + (same ? 0 : 1));
      const swapped = row > 1 && column > 1 && one[row - 1] === other[column - 2] && one[row - 2] === other[column - 1];
      if (swapped) cost = Math.min(cost, before[column - 2]! + 1);
      current.push(cost);
    }
    before = previous;
    previous = current;
  }
  return previous[other.length]!;
}

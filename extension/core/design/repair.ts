import type { CST } from 'yaml';

type Item = CST.BlockMap['items'][number];

/**
 * After a second `:` on one line (`loss: 5 %: x`) the parser takes the lines below for keys of the inner map, though
 * they stand in the outer one's column. Puts them back, so that one slip doesn't hide the rest of its section.
 */
export function returnSiblings(map: CST.BlockMap): void {
  if (!map.items.some((item) => innerMap(item, map.indent) !== undefined)) return;
  const waiting = map.items.splice(0).reverse();
  for (let item = waiting.pop(); item !== undefined; item = waiting.pop()) {
    map.items.push(item);
    for (let inner = innerMap(item, map.indent); inner !== undefined; inner = innerMap(inner.items[0], map.indent)) {
      for (const sibling of inner.items.splice(1).reverse()) waiting.push(sibling);
    }
  }
}

/** A value that is a map in the column of the map around it, which no valid text can give. */
function innerMap(item: Item | undefined, indent: number): CST.BlockMap | undefined {
  const value = item?.value;
  return value?.type === 'block-map' && value.indent === indent ? value : undefined;
}

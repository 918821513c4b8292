import { readFileSync } from 'node:fs';
import { expect } from 'vitest';

export interface PublishedRecord {
  readonly id: string;
  readonly source: string;
  readonly inputs: { readonly [name: string]: number | string | number[] };
  readonly outputs: { readonly [name: string]: number | number[] };
  readonly tolerance: { readonly rel: number };
  readonly from_memory?: boolean;
}

const published: { [group: string]: PublishedRecord[] } = JSON.parse(
  readFileSync(new URL('../published/check-values.json', import.meta.url), 'utf8'),
);

/** The records of a group whose id begins so, each with the name of its test: id and source. */
export function records(group: string, beginning = ''): [string, PublishedRecord][] {
  const found = published[group]?.filter(({ id }) => id.startsWith(beginning)) ?? [];
  if (found.length === 0) throw new Error(`no records ${beginning}* in ${group}`);
  return found.map((record) => [nameOf(record), record]);
}

function nameOf({ id, source, from_memory }: PublishedRecord): string {
  return `${id} (${source}${from_memory ? '; from memory' : ''})`;
}

export function input(record: PublishedRecord, name: string): number {
  const value = record.inputs[name];
  if (typeof value !== 'number') throw new Error(`${record.id} has no number ${name}`);
  return value;
}

export function inputList(record: PublishedRecord, name: string): number[] {
  const value = record.inputs[name];
  if (!Array.isArray(value)) throw new Error(`${record.id} has no list ${name}`);
  return value;
}

/** Every output of the record, no more and no fewer, to the tolerance it states. */
export function expectOutputs(record: PublishedRecord, found: { readonly [name: string]: number | number[] }): void {
  expect(Object.keys(found).sort()).toEqual(Object.keys(record.outputs).sort());
  for (const [name, value] of Object.entries(record.outputs)) {
    const wanted = [value].flat();
    const got = [found[name] ?? []].flat();
    expect(got.length, name).toBe(wanted.length);
    wanted.forEach((number, i) => {
      const text = `${record.id} ${name}: ${got[i]} for ${number}`;
      expect(Math.abs(got[i]! / number - 1), text).toBeLessThanOrEqual(record.tolerance.rel);
    });
  }
}

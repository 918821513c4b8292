import type { MaterialFigure } from '../physics/materials.ts';

/** Where a figure that the file does not give comes from. */
export interface Origin {
  readonly kind: 'default' | 'property table';
  /** SI. */
  readonly value: number;
  /** The default in words, or the table's row. */
  readonly note: string;
  /** The table's entry: source, range, whether recalled. */
  readonly figure?: MaterialFigure;
}

/** Collects origins while a design is resolved; each call notes one and gives its value back. */
export interface Origins {
  readonly all: ReadonlyMap<string, Origin>;
  fallback(path: string, value: number, note: string): number;
  table(path: string, figure: MaterialFigure, row: string): number;
}

export function createOrigins(): Origins {
  const all = new Map<string, Origin>();
  return {
    all,
    fallback(path, value, note) {
      all.set(path, { kind: 'default', value, note });
      return value;
    },
    table(path, figure, row) {
      all.set(path, { kind: 'property table', value: figure.value, note: row, figure });
      return figure.value;
    },
  };
}

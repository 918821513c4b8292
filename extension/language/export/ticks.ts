/** Places and texts of an axis' ticks. */
export interface Scale {
  readonly from: number;
  readonly to: number;
  readonly ticks: readonly { readonly value: number; readonly text: string }[];
  /** 0 at `from`, 1 at `to`. */
  at(value: number): number;
}

/** Round ticks in steps of 1, 2 or 5, about `count` of them, from zero where the values begin near it. */
export function linearScale(values: readonly number[], count: number): Scale {
  const [low, high] = extent(values);
  const least = low > 0 && low < 0.5 * high ? 0 : low;
  const span = high - least || Math.abs(high) || 1;
  const raw = span / count;
  const power = 10 ** Math.floor(Math.log10(raw));
  const step = power * ([1, 2, 5, 10].find((multiple) => multiple * power >= raw) ?? 10);
  const from = Math.floor(least / step + 1e-9) * step;
  const to = Math.max(from + step, Math.ceil(high / step - 1e-9) * step);
  const decimals = Math.max(0, -Math.floor(Math.log10(step) + 1e-9));
  const ticks = Array.from({ length: Math.round((to - from) / step) + 1 }, (_, index) => from + index * step).map(
    (value) => ({ value, text: (Math.abs(value) < step / 2 ? 0 : value).toFixed(Math.min(decimals, 12)) }),
  );
  return { from, to, ticks, at: (value) => (value - from) / (to - from) };
}

/** Ticks at 1, 2 and 5 of every decade that the values, all above zero, reach. */
export function logarithmicScale(values: readonly number[]): Scale {
  const [from, to] = extent(values);
  const ticks: { value: number; text: string }[] = [];
  for (let power = Math.floor(Math.log10(from)); power <= Math.ceil(Math.log10(to)); power++) {
    for (const multiple of [1, 2, 5]) {
      const value = Number(`${multiple}e${power}`);
      if (value >= from * (1 - 1e-9) && value <= to * (1 + 1e-9)) ticks.push({ value, text: String(value) });
    }
  }
  const span = Math.log(to / from) || 1;
  return { from, to, ticks, at: (value) => Math.log(value / from) / span };
}

function extent(values: readonly number[]): readonly [number, number] {
  const low = values.reduce((least, value) => Math.min(least, value), Number.POSITIVE_INFINITY);
  const high = values.reduce((most, value) => Math.max(most, value), Number.NEGATIVE_INFINITY);
  return Number.isFinite(low) && Number.isFinite(high) ? [low, high] : [0, 1];
}

/** The few assertions that the suite needs, without a module of Node's: it also runs in a web worker. */
export function equal<T>(actual: T, expected: T, what = ''): void {
  if (actual !== expected) throw new Error(`${what} ${JSON.stringify(actual)} is not ${JSON.stringify(expected)}`);
}

export function match(text: string, pattern: RegExp): void {
  if (!pattern.test(text)) throw new Error(`${pattern} does not match ${JSON.stringify(text)}`);
}

export function ok(value: unknown, what: string): asserts value {
  if (!value) throw new Error(`not so: ${what}`);
}

export function same(actual: unknown, expected: unknown): void {
  equal(JSON.stringify(actual), JSON.stringify(expected));
}

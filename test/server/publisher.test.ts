import { afterEach, beforeEach, expect, test, vi } from 'vitest';
import { createPublisher } from '../../extension/server/publisher.ts';

beforeEach(() => {
  vi.useFakeTimers();
});
afterEach(() => {
  vi.useRealTimers();
});

test('an opened document is published at once, an edited one after the typing has paused', () => {
  const published: string[] = [];
  const publisher = createPublisher((uri) => published.push(uri));
  publisher.changed('a');
  vi.advanceTimersByTime(0);
  expect(published).toEqual(['a']);
  publisher.changed('a');
  vi.advanceTimersByTime(60);
  publisher.changed('a');
  vi.advanceTimersByTime(60);
  expect(published).toEqual(['a']);
  vi.advanceTimersByTime(60);
  expect(published).toEqual(['a', 'a']);
});

test('typing in one document does not hold up another', () => {
  const published: string[] = [];
  const publisher = createPublisher((uri) => published.push(uri));
  for (const uri of ['a', 'b']) publisher.changed(uri);
  vi.advanceTimersByTime(0);
  publisher.changed('a');
  vi.advanceTimersByTime(90);
  publisher.changed('b');
  vi.advanceTimersByTime(20);
  expect(published).toEqual(['a', 'b', 'a']);
});

test('a closed document is published no more, and is new again when it is opened', () => {
  const published: string[] = [];
  const publisher = createPublisher((uri) => published.push(uri));
  publisher.changed('a');
  vi.advanceTimersByTime(0);
  publisher.changed('a');
  publisher.closed('a');
  vi.advanceTimersByTime(1000);
  expect(published).toEqual(['a']);
  publisher.changed('a');
  vi.advanceTimersByTime(0);
  expect(published).toEqual(['a', 'a']);
});

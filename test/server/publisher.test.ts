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
  vi.advanceTimersByTime(1);
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
  vi.advanceTimersByTime(2);
  publisher.changed('a');
  vi.advanceTimersByTime(90);
  publisher.changed('b');
  vi.advanceTimersByTime(12);
  expect(published).toEqual(['b', 'a', 'a']);
});

test('a closed document is published no more, and is new again when it is opened', () => {
  const published: string[] = [];
  const publisher = createPublisher((uri) => published.push(uri));
  publisher.changed('a');
  vi.advanceTimersByTime(1);
  publisher.changed('a');
  publisher.closed('a');
  vi.advanceTimersByTime(1000);
  expect(published).toEqual(['a']);
  publisher.changed('a');
  vi.advanceTimersByTime(1);
  expect(published).toEqual(['a', 'a']);
});

test('of many opened at once the one that is edited comes before those still waiting, and messages are read between', () => {
  const published: string[] = [];
  let read = 0;
  const publisher = createPublisher((uri) => {
    published.push(uri);
    // What arrives while one document is analysed is read before the next.
    if (published.length === 1) setTimeout(() => (read = published.length), 0);
  });
  for (let index = 0; index < 500; index++) publisher.changed(`design ${index}`);
  vi.advanceTimersByTime(10);
  publisher.changed('design 3');
  expect(published).not.toContain('design 3');
  vi.advanceTimersByTime(105);
  expect(published).toContain('design 3');
  expect(published.length).toBeLessThan(200);
  expect(read).toBeLessThan(3);
  vi.advanceTimersByTime(1000);
  expect(new Set(published).size).toBe(500);
});

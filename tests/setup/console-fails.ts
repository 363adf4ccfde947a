import { afterEach, beforeEach, expect, vi } from 'vitest';

/** A test that makes the console complain has found something, whatever else it asserts. */
beforeEach(() => {
  vi.spyOn(console, 'error');
});

afterEach(() => {
  const complaints = vi.mocked(console.error).mock.calls;
  vi.mocked(console.error).mockRestore();
  expect(complaints).toEqual([]);
});

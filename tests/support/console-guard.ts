import { afterEach, beforeEach, expect, vi } from 'vitest';

/** A console error is a failure: something went wrong that no assertion looked at. */
export function failOnConsoleErrors(): void {
  let spy: ReturnType<typeof vi.spyOn>;
  beforeEach(() => {
    spy = vi.spyOn(console, 'error');
  });
  afterEach(() => {
    const calls = spy.mock.calls.map((call: unknown[]) => call.map(String).join(' '));
    spy.mockRestore();
    expect(calls, 'console.error was called').toEqual([]);
  });
}

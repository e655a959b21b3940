import { afterEach, beforeEach, vi } from 'vitest';

/** Silence is part of the contract: anything printed by library code fails the test that caused it. */
const methods = ['log', 'info', 'warn', 'error', 'debug'] as const;

beforeEach(() => {
  for (const method of methods) {
    vi.spyOn(console, method).mockImplementation((...words: unknown[]) => {
      throw new Error(`console.${method} called: ${words.map(String).join(' ')}`);
    });
  }
});

afterEach(() => {
  vi.restoreAllMocks();
});

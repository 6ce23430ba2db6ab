import { afterEach, beforeEach, expect, vi } from "vitest";

/** Noise on the console is a fault: something was not handled where it should be. */
const methods = ["error", "warn"] as const;
const spies = new Map<(typeof methods)[number], ReturnType<typeof vi.spyOn>>();

beforeEach(() => {
  for (const method of methods) spies.set(method, vi.spyOn(console, method));
});

afterEach(() => {
  for (const [method, spy] of spies) {
    const calls = spy.mock.calls.map((call: unknown[]) => call.join(" "));
    spy.mockRestore();
    expect(calls, `console.${method} was called`).toEqual([]);
  }
});

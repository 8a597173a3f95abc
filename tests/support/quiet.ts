/** A test that logs an error or a warning fails: noise hides the next real one. */
import { afterEach, beforeEach, expect, vi } from "vitest";

beforeEach(() => {
  vi.spyOn(console, "error");
  vi.spyOn(console, "warn");
});

afterEach(() => {
  const said = [console.error, console.warn].flatMap((method) =>
    vi.mocked(method).mock.calls.map((words) => words.join(" ")),
  );
  vi.restoreAllMocks();
  expect(said, "the test logged").toEqual([]);
});

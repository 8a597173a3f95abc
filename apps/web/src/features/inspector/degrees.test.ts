import { expect, it } from "vitest";
import { parseDegrees } from "./degrees.ts";

it.each(["30", "30°", "30 deg", " 30 degrees "])("reads %s as a twelfth of a turn", (typed) => {
  expect(parseDegrees(typed)).toEqual({ ok: true, value: Math.PI / 6 });
});

it.each(["", "wide", "-5", "91"])("refuses %s with what would be understood", (typed) => {
  const read = parseDegrees(typed);
  expect(read.ok).toBe(false);
  if (!read.ok) expect(read.problems[0]?.message).toMatch(/degrees/);
});

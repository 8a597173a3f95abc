import { expect } from "vitest";

/** Ours agrees with the published value within the row's tolerance: relative, absolute, or the sum of both. */
export function expectWithin(
  ours: number,
  published: number,
  tolerance: { relativeTolerance?: number; absoluteTolerance?: number },
  row: unknown,
): void {
  const allowed = (tolerance.relativeTolerance ?? 0) * Math.abs(published) + (tolerance.absoluteTolerance ?? 0);
  expect(allowed, "a check without a tolerance").toBeGreaterThan(0);
  const message = `${JSON.stringify(row)}: ours ${ours}, published ${published}, allowed ± ${allowed}`;
  expect(Math.abs(ours - published) <= allowed, message).toBe(true);
}

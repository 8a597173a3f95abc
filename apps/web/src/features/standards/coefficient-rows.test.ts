import { NO_COMPANY_STANDARDS, shippedPractice } from "@cleatwork/calc";
import { companyStandardsSchema } from "@cleatwork/contracts";
import { describe, expect, it } from "vitest";
import { coefficientRows, coefficientText, copyCoefficients, readCoefficient } from "./coefficient-rows.ts";

describe("the rows of loss coefficients", () => {
  it.each(coefficientRows)("$name: what is shown is read back as the same value, and the contract takes it", (row) => {
    const read = readCoefficient(row, coefficientText(row, shippedPractice));
    if (!read.ok) throw new Error(read.allowed);
    expect(read.value).toBeCloseTo(row.of(shippedPractice), 4);
    const coefficients = row.set(shippedPractice, read.value);
    expect(companyStandardsSchema.safeParse({ ...NO_COMPANY_STANDARDS, coefficients }).success).toBe(true);
  });

  it.each(coefficientRows)("$name: its bounds are the contract's", (row) => {
    const takes = (value: number) =>
      companyStandardsSchema.safeParse({ ...NO_COMPANY_STANDARDS, coefficients: row.set(shippedPractice, value) })
        .success;
    const beyond = (row.max - row.min) / 1000;
    expect([takes(row.min), takes(row.max)]).toEqual([true, true]);
    expect([takes(row.min - beyond), takes(row.max + beyond)]).toEqual([false, false]);
    expect(readCoefficient(row, String(row.max + beyond)).ok).toBe(false);
  });

  it("each sets its own value and leaves the others", () => {
    const value = (row: (typeof coefficientRows)[number]) => (row.min + row.max) / 2;
    const all = coefficientRows.reduce((now, row) => row.set(now, value(row)), shippedPractice);
    for (const row of coefficientRows) expect(row.of(all)).toBeCloseTo(value(row), 9);
  });

  it("a copy starts from what is shipped and says whose it is", () => {
    const { coefficients } = copyCoefficients(NO_COMPANY_STANDARDS);
    expect(coefficients).toEqual({ ...shippedPractice, source: "our own coefficients" });
  });
});

import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import { onBrand } from "./brand.ts";

describe("words on the brand color", () => {
  it("are white on dark and black on light", () => {
    expect(onBrand("#1F4D3A")).toBe("white");
    expect(onBrand("#FFD60A")).toBe("black");
  });

  // WCAG 2.2, 1.4.3: 4.5 to 1. White and black together always leave one that reaches it.
  it("always reach 4.5 to 1", () => {
    const linear = (value: number) => (value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4);
    fc.assert(
      fc.property(fc.tuple(fc.nat(255), fc.nat(255), fc.nat(255)), (rgb) => {
        const color = `#${rgb.map((value) => value.toString(16).padStart(2, "0")).join("")}`;
        const [r, g, b] = rgb.map((value) => linear(value / 255)) as [number, number, number];
        const luminance = 0.2126 * r + 0.7152 * g + 0.0722 * b;
        const contrast = onBrand(color) === "white" ? 1.05 / (luminance + 0.05) : (luminance + 0.05) / 0.05;
        expect(contrast).toBeGreaterThanOrEqual(4.5);
      }),
    );
  });
});

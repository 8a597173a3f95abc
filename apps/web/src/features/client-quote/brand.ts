import type { CSSProperties } from "react";

/** The company's own color stands in for ours on paper; words on it are white or ink, whichever reads better. */
export function brandStyle(brandColor: string): CSSProperties {
  const style: Record<string, string> = { "--brand": brandColor, "--on-brand": onBrand(brandColor) };
  return style;
}

/** Relative luminance and contrast as WCAG 2.2 defines them. */
export function onBrand(brandColor: string): "white" | "black" {
  const luminance = relativeLuminance(brandColor);
  return 1.05 / (luminance + 0.05) >= (luminance + 0.05) / 0.05 ? "white" : "black";
}

function relativeLuminance(color: string): number {
  const channel = (at: number) => {
    const value = Number.parseInt(color.slice(at, at + 2), 16) / 255;
    return value <= 0.04045 ? value / 12.92 : ((value + 0.055) / 1.055) ** 2.4;
  };
  return 0.2126 * channel(1) + 0.7152 * channel(3) + 0.0722 * channel(5);
}

/** Sizes as the trade says them: "24×12", "14Ø", "20×10 oval", "12Ø/8Ø". Inches, or millimeters. */
import type { Section } from "../air-system.ts";
import { METERS_PER_INCH, type Meters } from "../quantity.ts";
import { fractionOf } from "./format.ts";
import { decimal, shown, type Shown, type UnitSystem } from "./unit-system.ts";

export function formatSize(section: Section, units: UnitSystem): Shown {
  const side = (value: Meters) =>
    units === "si" ? decimal(value * 1000, 0).replaceAll(",", "") : fractionOf(value / METERS_PER_INCH, 8);
  switch (section.shape) {
    case "round":
      return shown(`${side(section.diameter_m)}Ø`, "");
    case "rectangular":
      return shown(`${side(section.width_m)}×${side(section.height_m)}`, "");
    case "flat-oval":
      return shown(`${side(section.width_m)}×${side(section.height_m)} oval`, "");
    case "annular":
      return shown(`${side(section.outerDiameter_m)}Ø/${side(section.innerDiameter_m)}Ø`, "");
  }
}

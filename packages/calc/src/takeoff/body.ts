/** The form of a piece: enough to lay out its walls, and nothing of what it is made for. Sheet-metal sizes. */
import type { Section } from "../air-system.ts";
import type { Meters, Radians } from "../quantity.ts";
import type { Shift } from "./shift.ts";
import type { MainWall } from "./surface/tap.ts";

/** A bend of rectangular duct: its side in the plane of the bend, and the one across. */
export interface Bend {
  readonly section: Section;
  readonly planeSide_m: Meters;
  readonly acrossSide_m: Meters;
  readonly angle_rad: Radians;
  readonly centerRadius_m: Meters;
}

export type Body =
  | { readonly kind: "straight"; readonly section: Section; readonly length_m: Meters }
  | { readonly kind: "radius-elbow"; readonly bend: Bend; readonly splitterCount: number }
  | {
      readonly kind: "mitered-elbow";
      readonly bend: Omit<Bend, "centerRadius_m">;
      readonly leg_m: Meters;
      readonly vaneCount: number;
    }
  /** `pieceCount` counts both ends, each of them half a gore. */
  | { readonly kind: "gored-elbow"; readonly bend: Bend; readonly pieceCount: number }
  | { readonly kind: "offset"; readonly bend: Bend }
  | {
      readonly kind: "transition";
      readonly from: Section;
      readonly to: Section;
      readonly length_m: Meters;
      /** How far the center moves along width and height; none where it is concentric. */
      readonly shift: Shift;
    }
  | {
      readonly kind: "collar";
      readonly section: Section;
      readonly wall: MainWall;
      readonly angle_rad: Radians;
      readonly length_m: Meters;
    }
  | {
      readonly kind: "cone";
      readonly section: Section;
      readonly wall: MainWall;
      readonly length_m: Meters;
      readonly spread_m: Meters;
    }
  | {
      readonly kind: "shoe";
      readonly section: Extract<Section, { shape: "rectangular" }>;
      readonly wall: MainWall;
      readonly length_m: Meters;
      readonly entry_m: Meters;
    }
  | {
      readonly kind: "junction";
      readonly main: Section;
      readonly branches: readonly Section[];
      readonly length_m: Meters;
      readonly runsOn: boolean;
    }
  | { readonly kind: "wye"; readonly legs: readonly Bend[] }
  | {
      readonly kind: "plenum";
      readonly width_m: Meters;
      readonly height_m: Meters;
      readonly length_m: Meters;
      readonly openings: readonly Section[];
    }
  | { readonly kind: "cap"; readonly section: Section };

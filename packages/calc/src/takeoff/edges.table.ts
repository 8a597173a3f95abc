/** Sheet beyond the net outline: what seams and joints take. A shop's own setting; the blank tells which was used. */
import type { ConstructionSpec, Section } from "../air-system.ts";
import { inches, type Meters } from "../quantity.ts";

/** Added across the seam, both of its edges together; at a joint at each end of a piece. */
export interface EdgeTable {
  readonly source: string;
  readonly seam: {
    readonly cornerLock: Meters;
    readonly buttonLock: Meters;
    /** Of round and flat oval duct, along it and between gores. */
    readonly longitudinal: Meters;
    readonly spiral: Meters;
  };
  readonly end: {
    readonly slip: Meters;
    readonly formedFlange: Meters;
    readonly roundSlip: Meters;
    readonly roundFlange: Meters;
    /** Where a tap is turned over on its main. */
    readonly tapTurn: Meters;
  };
  /** A blank is cut from a sheet as long as this; a wrapper that is longer has more seams. */
  readonly longestBlank: Meters;
}

/**
 * As shipped. The round seam of 1 1/2 in. is the one that SMACNA 1995 counts in its table of weights (p. A.10, found);
 * the others are common practice, with a range seen of 1/2 to 1 in. for slips and 1 1/2 to 2 in. for formed flanges.
 */
export const shippedEdges: EdgeTable = {
  source: "common practice; round seam of 1 1/2 in. as in SMACNA 1995, p. A.10",
  seam: {
    cornerLock: inches(1.25),
    buttonLock: inches(1.5),
    longitudinal: inches(1.5),
    spiral: inches(0),
  },
  end: {
    slip: inches(1),
    formedFlange: inches(1.75),
    roundSlip: inches(0),
    roundFlange: inches(1),
    tapTurn: inches(1),
  },
  longestBlank: inches(120),
};

export function seamEdge({ seam }: EdgeTable, section: Section, spec: ConstructionSpec, isSpiral: boolean): Meters {
  if (section.shape !== "rectangular") return isSpiral ? seam.spiral : seam.longitudinal;
  return spec.rectangularSeam === "corner-lock" ? seam.cornerLock : seam.buttonLock;
}

export function endEdge({ end }: EdgeTable, section: Section, spec: ConstructionSpec): Meters {
  if (section.shape !== "rectangular") return spec.roundJoint === "flange" ? end.roundFlange : end.roundSlip;
  return spec.rectangularJoint === "flange" ? end.formedFlange : end.slip;
}

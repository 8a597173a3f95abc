import { describe, expect, it } from "vitest";
import {
  bendAngleFactor,
  radiusElbowCoefficient,
  smoothElbowCoefficient,
  squareThroatElbowCoefficient,
} from "../fittings/elbow.ts";
import {
  convergingBranchFactor,
  convergingLegCoefficient,
  divergingBranchCoefficient,
  divergingMainCoefficient,
  joiningMomentum,
} from "../fittings/junction.ts";
import { shippedPractice } from "../fittings/practice.table.ts";
import { contractionCoefficient, expansionCoefficient, transitionForm } from "../fittings/transition.ts";
import { radians, squareMeters } from "../quantity.ts";
import { expectWithin } from "./expect-within.ts";
import {
  bendAngle,
  goredPrinted,
  radiusPrinted,
  smoothByLibrary,
  smoothPrinted,
  squareThroatPrinted,
} from "./rows/elbow.rows.ts";
import { junctionRows } from "./rows/junction.rows.ts";
import { contractionPrinted, expansionByLibrary, expansionPrinted, sharpContraction } from "./rows/transition.rows.ts";

const degrees = (value: number) => radians((value * Math.PI) / 180);
const RIGHT_ANGLE = degrees(90);
const areas = (ratio: number) => ({ smaller: squareMeters(1), larger: squareMeters(ratio) });
const smooth = (radiusRatio: number) =>
  smoothElbowCoefficient({ angle: RIGHT_ANGLE, radiusRatio, darcyFrictionFactor: 0.016 });

describe("elbows", () => {
  it("round and smooth agree with the library's formula, friction along the bend added", () => {
    for (const [radiusRatio, published] of smoothByLibrary.rows) {
      const alongBend = 0.016 * (Math.PI / 2) * radiusRatio;
      expectWithin(smooth(radiusRatio) + alongBend, published, smoothByLibrary, radiusRatio);
    }
  });

  it("round and smooth lie near a printed duct table", () => {
    for (const [radiusRatio, published] of smoothPrinted.rows) {
      expectWithin(smooth(radiusRatio), published, smoothPrinted, radiusRatio);
    }
  });

  it("gored lie near a printed duct table", () => {
    for (const [radiusRatio, published] of goredPrinted.rows) {
      expectWithin(smooth(radiusRatio) * shippedPractice.goredOverSmooth.pieces5, published, goredPrinted, radiusRatio);
    }
  });

  it("rectangular with a radius agree with the printed table", () => {
    for (const [sideRatio, radiusRatio, published] of radiusPrinted.rows) {
      const ours = radiusElbowCoefficient({ angle: RIGHT_ANGLE, radiusRatio, sideRatio });
      expectWithin(ours, published, radiusPrinted, [sideRatio, radiusRatio]);
    }
  });

  it("with a square throat agree with the printed table", () => {
    for (const [angle, sideRatio, published] of squareThroatPrinted.rows) {
      const ours = squareThroatElbowCoefficient({ angle: degrees(angle), sideRatio });
      expectWithin(ours, published, squareThroatPrinted, [angle, sideRatio]);
    }
  });

  it("lose by their angle as printed", () => {
    for (const [angle, published] of bendAngle.rows) {
      expectWithin(bendAngleFactor(degrees(angle)), published, bendAngle, angle);
    }
  });
});

describe("transitions", () => {
  it("that contract abruptly agree with the library", () => {
    for (const [ratio, published] of sharpContraction.rows) {
      const ours = contractionCoefficient(transitionForm(degrees(180)), areas(ratio));
      expectWithin(ours, published, sharpContraction, ratio);
    }
  });

  it("that contract lie near the printed table, closely up to 90°", () => {
    for (const [ratio, angle, published] of contractionPrinted.rows) {
      const ours = contractionCoefficient(transitionForm(degrees(angle)), areas(ratio));
      expectWithin(ours, published, contractionPrinted, [ratio, angle]);
      if (angle <= 90) expectWithin(ours, published, { absoluteTolerance: 0.045 }, [ratio, angle]);
    }
  });

  it("that expand agree with the library", () => {
    for (const [ratio, angle, published] of expansionByLibrary.rows) {
      const ours = expansionCoefficient(transitionForm(degrees(angle)), areas(ratio));
      expectWithin(ours, published, expansionByLibrary, [ratio, angle]);
    }
  });

  it("that expand are between half and all of what a duct table recalls", () => {
    for (const [ratio, angle, published] of expansionPrinted.rows) {
      const ours = expansionCoefficient(transitionForm(degrees(angle)), areas(ratio));
      expect(ours / published, `${ratio}, ${angle}°`).toBeGreaterThan(expansionPrinted.ratioFrom);
      expect(ours / published, `${ratio}, ${angle}°`).toBeLessThan(expansionPrinted.ratioTo);
    }
  });
});

describe("junctions", () => {
  it("agree with the handbook's closed forms in all four coefficients", () => {
    expect(junctionRows.rows.length).toBeGreaterThan(40);
    for (const row of junctionRows.rows) {
      const [angle, areaRatio, flowRatio, divergingBranch, divergingMain, convergingBranch, convergingMain] = row;
      const branch = { turnCosine: Math.cos(degrees(angle)), areaRatio, flowRatio };
      const main = { turnCosine: 1, areaRatio: 1, flowRatio: 1 - flowRatio };
      const tolerance = { ...junctionRows, absoluteTolerance: 5e-9 };
      expectWithin(divergingBranchCoefficient(branch), divergingBranch, tolerance, row);
      expectWithin(divergingMainCoefficient(branch), divergingMain, tolerance, row);

      if (convergingBranch === null || convergingMain === null) continue;
      const momentum = joiningMomentum(branch) + joiningMomentum(main);
      const ours = convergingLegCoefficient(flowRatio / areaRatio, momentum) * convergingBranchFactor(branch);
      expectWithin(ours, convergingBranch, tolerance, row);
      expectWithin(convergingLegCoefficient(1 - flowRatio, momentum), convergingMain, tolerance, row);
    }
  });
});

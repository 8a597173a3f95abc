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
  splitLegCoefficient,
} from "../fittings/junction.ts";
import { splitterCurveRatio, splitterElbowCoefficient } from "../fittings/splitter-elbow.ts";
import { shippedPractice } from "../fittings/practice.table.ts";
import { contractionCoefficient, expansionCoefficient, transitionForm } from "../fittings/transition.ts";
import { radians, squareMeters } from "../quantity.ts";
import { expectWithin } from "./expect-within.ts";
import {
  bendAngle,
  goredFewerPrinted,
  goredPrinted,
  miteredPrinted,
  oneSplitterPrinted,
  radiusPrinted,
  smoothByLibrary,
  smoothPrinted,
  squareThroatPrinted,
} from "./rows/elbow.rows.ts";
import { junctionRows, straightTapPrinted, wyePoint } from "./rows/junction.rows.ts";
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

  it("gored of fewer pieces lie near it too", () => {
    const { pieces3, pieces4 } = shippedPractice.goredOverSmooth;
    for (const [pieces, radiusRatio, published] of goredFewerPrinted.rows) {
      const ours = smooth(radiusRatio) * (pieces === 3 ? pieces3 : pieces4);
      expectWithin(ours, published, goredFewerPrinted, [pieces, radiusRatio]);
    }
  });

  it("mitered and round agree with the printed table", () => {
    for (const [angle, published] of miteredPrinted.rows) {
      const ours = squareThroatElbowCoefficient({ angle: degrees(angle), sideRatio: 1 });
      expectWithin(ours, published, miteredPrinted, angle);
    }
  });

  it("with a splitter agree with printed rows of a square duct, and with their curve ratio", () => {
    for (const [radiusRatio, curveRatio, published] of oneSplitterPrinted.rows) {
      const elbow = { angle: RIGHT_ANGLE, radiusRatio, splitterCount: 1 };
      expectWithin(splitterElbowCoefficient(elbow), published, oneSplitterPrinted, radiusRatio);
      const tolerance = { absoluteTolerance: oneSplitterPrinted.curveRatioTolerance };
      expectWithin(splitterCurveRatio(elbow), curveRatio, tolerance, radiusRatio);
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
  it("that split agree with a point that a design guide read off for a wye", () => {
    const { angle, areaRatio, flowRatio, printed } = wyePoint;
    const ours = splitLegCoefficient({ turnCosine: Math.cos(degrees(angle)), areaRatio, flowRatio });
    expectWithin(ours, printed, wyePoint, wyePoint);
  });

  it("at a straight tap lose as much as a recalled duct table, or somewhat more", () => {
    for (const [velocityRatio, flowRatio, published] of straightTapPrinted.rows) {
      const ours = divergingBranchCoefficient({ turnCosine: 0, areaRatio: flowRatio / velocityRatio, flowRatio });
      expect(ours / published, `${velocityRatio}, ${flowRatio}`).toBeGreaterThan(straightTapPrinted.ratioFrom);
      expect(ours / published, `${velocityRatio}, ${flowRatio}`).toBeLessThan(straightTapPrinted.ratioTo);
    }
  });

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

import { describe, expect, it } from "vitest";
import { OPEN_ENTRY_COEFFICIENT, entryCoefficient, flushEntryCoefficient } from "../fittings/ends.ts";
import { shippedPractice } from "../fittings/practice.table.ts";
import { screenCoefficient } from "../fittings/screen.ts";
import { damperCoefficient } from "../fittings/throttled-damper.ts";
import { radians } from "../quantity.ts";
import { expectWithin } from "./expect-within.ts";
import { flushBellmouth, freeBellmouth, plainEnds, rectangularDamper, roundDamper, screens } from "./rows/end.rows.ts";

const degrees = (value: number) => radians((value * Math.PI) / 180);

describe("entries", () => {
  it("with a bellmouth in a wall agree with the handbook's table", () => {
    for (const [radiusRatio, published] of flushBellmouth.rows) {
      expectWithin(flushEntryCoefficient(radiusRatio), published, flushBellmouth, radiusRatio);
    }
  });

  it("with a free bellmouth lie near it where the edge is well rounded", () => {
    for (const [radiusRatio, published] of freeBellmouth.rows) {
      expectWithin(flushEntryCoefficient(radiusRatio), published, freeBellmouth, radiusRatio);
    }
  });

  it("with a sharp edge agree, flush and projecting", () => {
    expectWithin(entryCoefficient("entry-flush", 0.2), plainEnds.flush, plainEnds, "flush");
    expectWithin(OPEN_ENTRY_COEFFICIENT, plainEnds.projecting, plainEnds, "projecting");
  });
});

it("screens agree with the printed table", () => {
  for (const [freeArea, published] of screens.rows) {
    expectWithin(screenCoefficient(freeArea), published, screens, freeArea);
  }
});

describe("throttled dampers", () => {
  it("in round duct agree with a recalled table at every angle", () => {
    for (const [angle, published] of roundDamper.rows) {
      const ours = damperCoefficient(shippedPractice.damper.other, degrees(angle));
      expectWithin(ours, published, roundDamper, angle);
    }
  });

  it("in rectangular duct lie near a recalled table", () => {
    for (const [angle, published] of rectangularDamper.rows) {
      const ours = damperCoefficient(shippedPractice.damper.rectangular, degrees(angle));
      expectWithin(ours, published, rectangularDamper, angle);
    }
  });
});

it("every set of rows says where it is from and why its tolerance", () => {
  for (const set of [flushBellmouth, freeBellmouth, plainEnds, screens, roundDamper, rectangularDamper]) {
    expect(set.source.length).toBeGreaterThan(10);
    expect(set.why.length).toBeGreaterThan(10);
  }
});

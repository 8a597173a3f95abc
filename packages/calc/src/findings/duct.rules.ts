/** One duct by itself, or against the duct that feeds it. */
import { isLined } from "../network/clear-section.ts";
import { NONE } from "../network/tree-shape.ts";
import { GROWTH_SOURCE, LINING_SOURCE, practiceLimits } from "./practice-limits.table.ts";
import { markSegment, markSystem, type ReviewContext } from "./review-context.ts";

/** Rounding of sizes is no growth. */
const SAME_AREA = 1.02;

export function reviewDucts(context: ReviewContext): void {
  const { columns, tree } = context;
  const { system, sections, friction, traits } = columns;
  const { value: slow, source: slowSource } = practiceLimits.leastVelocity_m_s;
  const carriesSound = system.service === "supply" || system.service === "return";

  for (let s = 0; s < tree.segmentCount; s++) {
    const velocity = friction.velocity[s]!;
    if (velocity < slow && system.segments[s]!.ductClass !== "runout") {
      markSegment(context, s, "velocity-low", { value: velocity, limit: slow, unit: "m/s", limitSource: slowSource });
    }
    const before = tree.before[s]!;
    if (before === NONE) {
      if (carriesSound && !isLined(system.segments[s]!, system.spec) && traits.isFlexible[s] === 0) {
        markSegment(context, s, "unlined-near-equipment", {
          value: 0,
          limit: 1,
          unit: "lined",
          limitSource: LINING_SOURCE,
        });
      }
      continue;
    }
    const area = sections.area[s]!;
    const limit = sections.area[before]!;
    if (area > SAME_AREA * limit) {
      markSegment(context, s, "duct-grows", { value: area, limit, unit: "m²", limitSource: GROWTH_SOURCE });
    }
  }
  reviewSlack(context);
}

function reviewSlack(context: ReviewContext): void {
  const { system, traits } = context.columns;
  const { value: limit, source: limitSource } = practiceLimits.flexibleSlack;
  const value = system.spec.flexibleSlack;
  if (value > limit * (1 + 1e-9) && traits.isFlexible.includes(1)) {
    markSystem(context, "flexible-slack", { value, limit, unit: "1", limitSource });
  }
}

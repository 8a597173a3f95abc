/** Pressure at the outlets and at the equipment. */
import { practiceLimits, MARGIN_SOURCE } from "./practice-limits.table.ts";
import { markOutlet, markSystem, type ReviewContext } from "./review-context.ts";

export function reviewPressure(context: ReviewContext): void {
  reviewOutlets(context);
  reviewBalance(context);
  reviewEquipment(context);
}

/** An excess is loud where a damper takes it up, and upsets the others where none is there. */
function reviewOutlets(context: ReviewContext): void {
  const { columns, tree, needs } = context;
  const { segments } = columns.system;
  const most = needs.required[needs.governing]!;
  const { value: limit, source: limitSource } = practiceLimits.damperPressure_pa;
  for (let o = 0; o < tree.outlets.length; o++) {
    const excess = most - needs.required[o]!;
    if (excess <= limit) continue;
    const last = segments[tree.into[tree.outlets[o]!]!]!;
    const hasDamper = last.accessories.includes("volume-damper");
    markOutlet(context, o, hasDamper ? "outlet-over-pressured" : "damper-missing", {
      value: excess,
      limit,
      unit: "Pa",
      limitSource,
    });
  }
}

function reviewBalance(context: ReviewContext): void {
  const { required, governing } = context.needs;
  if (required.length < 2) return;
  let least = required[0]!;
  for (let o = 1; o < required.length; o++) least = Math.min(least, required[o]!);
  const value = least / required[governing]!;
  const { value: limit, source: limitSource } = practiceLimits.pathBalance;
  if (value < limit) markSystem(context, "paths-unequal", { value, limit, unit: "1", limitSource });
}

function reviewEquipment(context: ReviewContext): void {
  const { availablePressure_pa: available } = context.columns.system.design;
  const { requiredPressure_pa: required, totalPressure_pa: withMargin } = context.fan;
  if (available >= required && available < withMargin) {
    markSystem(context, "margin-short", {
      value: withMargin,
      limit: available,
      unit: "Pa",
      limitSource: MARGIN_SOURCE,
    });
  }
  const { value: limit, source: limitSource } = practiceLimits.pressureReserve;
  const reserve = available / required;
  if (required > 0 && reserve > limit) {
    markSystem(context, "reserve-large", { value: reserve, limit, unit: "1", limitSource });
  }
}

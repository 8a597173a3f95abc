/** Leakage, and the sealing that a pressure class asks for. */
import { SEAL_CLASSES } from "../air-system.ts";
import { practiceLimits, sealClassTable } from "./practice-limits.table.ts";
import { markSystem, type ReviewContext } from "./review-context.ts";

export function reviewTightness(context: ReviewContext): void {
  reviewLeakage(context);
  reviewSealClass(context);
}

function reviewLeakage(context: ReviewContext): void {
  const { airflow } = context.columns.flows;
  const { before } = context.tree;
  let outlets = 0;
  for (let s = 0; s < airflow.length; s++) if (before[s]! < 0) outlets += airflow[s]!;
  const value = (context.fan.airflow_m3s - outlets) / outlets;
  const { value: limit, source: limitSource } = practiceLimits.leakageShare;
  if (value > limit) markSystem(context, "leakage-high", { value, limit, unit: "1", limitSource });
}

/** Told as places in the order A, B, C, none: a greater place is sealed less. */
function reviewSealClass(context: ReviewContext): void {
  const { pressureClass_pa, sealClass } = context.columns.system.spec;
  const row = sealClassTable.rows.find(({ upTo_pa }) => Math.abs(pressureClass_pa) <= upTo_pa * (1 + 1e-9));
  const asked = row?.sealClass ?? "A";
  const value = SEAL_CLASSES.indexOf(sealClass);
  const limit = SEAL_CLASSES.indexOf(asked);
  if (value > limit) {
    markSystem(context, "seal-class-low", { value, limit, unit: "seal class", limitSource: sealClassTable.source });
  }
}

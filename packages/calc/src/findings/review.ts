import { reviewDucts } from "./duct.rules.ts";
import { reviewFittings } from "./fitting.rules.ts";
import { reviewPressure } from "./pressure.rules.ts";
import type { ReviewContext } from "./review-context.ts";
import { reviewTightness } from "./tightness.rules.ts";

/**
 * What an engineer would mark on a system that can be solved, beyond the limits that the solve itself keeps. Adds to the list
 * of findings; linear in the segments. It runs when findings are first read.
 */
export function review(context: ReviewContext): void {
  reviewPressure(context);
  reviewTightness(context);
  reviewDucts(context);
  reviewFittings(context);
}

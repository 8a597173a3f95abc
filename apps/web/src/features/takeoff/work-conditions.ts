/** Conditions picked for a project, kept as its factor and its reason in words. Pure. */
import type { WorkCondition } from "@cleatwork/calc";

export const factorOf = (conditions: readonly WorkCondition[]): number =>
  Number(conditions.reduce((product, { factor }) => product * factor, 1).toFixed(4));

/** As much as the reason's field holds. */
const LONGEST = 200;

export function reasonOf(conditions: readonly WorkCondition[]): string {
  let reason = "";
  for (const { name } of conditions) {
    const next = reason === "" ? name : `${reason}; ${name}`;
    if (next.length > LONGEST) break;
    reason = next;
  }
  return reason;
}

export function reasonsIn(reason: string, conditions: readonly WorkCondition[]): readonly WorkCondition[] {
  const names = new Set(reason.split("; "));
  return conditions.filter(({ name }) => names.has(name));
}

/** The file that the command line reads: a job, or one air system by itself. Documented in the package's README. */
import type { AirSystem } from "./air-system.ts";
import { airSystemShape, isRecord, shapeProblems, type ShapeProblem } from "./job-shape.ts";
import type { SystemProblem } from "./network/solution.ts";
import { solve } from "./network/solve.ts";
import type { Solution } from "./network/solution.ts";
import type { Estimate, PricingBasis } from "./pricing/estimate.ts";
import { price } from "./pricing/price.ts";
import { fail, ok, type Result } from "./result.ts";
import { shippedStandards } from "./takeoff/shipped-standards.ts";
import { takeOff } from "./takeoff/take-off.ts";
import type { ShopStandards, Takeoff } from "./takeoff/takeoff.ts";

export const JOB_SCHEMA = "cleatwork.job/1";

export interface Job {
  readonly systems: readonly AirSystem[];
  readonly standards: ShopStandards;
  readonly pricing: PricingBasis | null;
  /** The file was one air system: answers about it come by themselves, not in a list. */
  readonly isBareSystem: boolean;
}

export type JobProblem =
  | ShapeProblem
  | {
      readonly code: "not-json" | "schema-unknown" | "no-systems" | "no-pricing";
      readonly field: string;
      readonly value: string;
      readonly limit: string;
    };

/** Reads the text of a file. Standards that the file does not bring are the shipped ones; prices have no such default. */
export function parseJob(text: string): Result<Job, JobProblem> {
  let content: unknown;
  try {
    content = JSON.parse(text);
  } catch (error) {
    const value = error instanceof Error ? error.message : "unreadable";
    return fail({ code: "not-json", field: "", value, limit: "JSON text" });
  }
  if (!isRecord(content) || content["schema"] !== JOB_SCHEMA) return parseBareSystem(content);

  const problems: JobProblem[] = shapeProblems(content["systems"], [airSystemShape], "systems");
  if (Array.isArray(content["systems"]) && content["systems"].length === 0) {
    problems.push({ code: "no-systems", field: "systems", value: "an empty list", limit: "at least one air system" });
  }
  for (const field of ["standards", "pricing"]) {
    if (content[field] !== undefined) problems.push(...shapeProblems(content[field], {}, field));
  }
  if (problems.length > 0) return { ok: false, problems };
  return ok({
    systems: content["systems"] as readonly AirSystem[],
    standards: (content["standards"] as ShopStandards | undefined) ?? shippedStandards,
    pricing: (content["pricing"] as PricingBasis | undefined) ?? null,
    isBareSystem: false,
  });
}

function parseBareSystem(content: unknown): Result<Job, JobProblem> {
  const schema = isRecord(content) ? content["schema"] : undefined;
  if (typeof schema !== "string" || !schema.startsWith("cleatwork.air-system/")) {
    const limit = `${JOB_SCHEMA} or cleatwork.air-system/1`;
    return fail({ code: "schema-unknown", field: "schema", value: String(schema), limit });
  }
  const problems = shapeProblems(content, airSystemShape, "");
  if (problems.length > 0) return { ok: false, problems };
  return ok({ systems: [content as AirSystem], standards: shippedStandards, pricing: null, isBareSystem: true });
}

/** Every system solved, or the problems of all of them. */
export function solveJob({ systems }: Job): Result<readonly Solution[], SystemProblem> {
  const answers = systems.map((system) => solve(system));
  const problems = answers.flatMap((answer) => (answer.ok ? [] : answer.problems));
  if (problems.length > 0) return { ok: false, problems };
  return ok(answers.flatMap((answer) => (answer.ok ? [answer.value] : [])));
}

export function takeOffJob(job: Job): Result<readonly Takeoff[], SystemProblem> {
  const solved = solveJob(job);
  if (!solved.ok) return solved;
  const { standards } = job;
  return ok(job.systems.map((system, index) => takeOff({ system, standards }, solved.value[index]!)));
}

export function priceJob(job: Job): Result<Estimate, SystemProblem | JobProblem> {
  if (job.pricing === null) {
    return fail({
      code: "no-pricing",
      field: "pricing",
      value: "undefined",
      limit: "a price book with labor and rates",
    });
  }
  const takeoffs = takeOffJob(job);
  return takeoffs.ok ? ok(price(takeoffs.value, job.pricing)) : takeoffs;
}

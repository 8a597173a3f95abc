import { spawnSync } from "node:child_process";
import { readFileSync } from "node:fs";
import { fileURLToPath } from "node:url";
import { describe, expect, it } from "vitest";
import { answerCommand } from "./command-line.ts";
import type { Solution } from "./network/solution.ts";
import type { Estimate } from "./pricing/estimate.ts";
import type { Takeoff } from "./takeoff/takeoff.ts";

const examplePath = fileURLToPath(new URL("../examples/library-supply.json", import.meta.url));
const example = readFileSync(examplePath, "utf8");
const [exampleSystem] = (JSON.parse(example) as { systems: unknown[] }).systems;

/** The answer to a command about the text of a file. */
const answered = (name: string, text: string): unknown => {
  const answer = answerCommand([name, "job.json"], () => text);
  if (!answer.ok) throw new Error(JSON.stringify(answer.problems));
  return answer.value;
};

const problemsOf = (args: readonly string[], text: string) => {
  const answer = answerCommand(args, (file) => {
    if (file !== "job.json") throw new Error(`no file ${file}`);
    return text;
  });
  if (answer.ok) throw new Error("answered, though it should be refused");
  return answer.problems as { code: string; field: string; limit: string }[];
};

describe("calc on the command line", () => {
  it("solves the example", () => {
    const [solution] = answered("solve", example) as Solution[];
    expect(solution?.segments).toHaveLength(10);
    expect(solution?.paths).toHaveLength(5);
    expect(solution?.findings.map(({ id }) => id)).toContain("flexible-too-long:seg_6");
  });

  it("takes off the example", () => {
    const [takeoff] = answered("takeoff", example) as Takeoff[];
    expect(takeoff?.totals.netWeight_kg).toBeGreaterThan(100);
  });

  it("prices the example, and what it prints adds up", () => {
    const estimate = answered("price", example) as Estimate;
    const direct = estimate.lines.reduce((sum, line) => sum + line.amount_minor, 0);
    expect(direct).toBe(estimate.directCost_minor);
    expect(estimate.price_minor).toBeGreaterThan(direct);
  });

  it("answers one air system with one solution", () => {
    expect((answered("solve", JSON.stringify(exampleSystem)) as Solution).systemId).toBe("sys_library_1");
  });

  it("says what is missing from a file that is not built like a job", () => {
    const bare = JSON.stringify({ schema: "cleatwork.air-system/1", id: "sys_1" });
    expect(problemsOf(["solve", "job.json"], bare)[0]).toMatchObject({
      code: "field-missing",
      field: "tag",
      limit: "a string",
    });
  });

  it("says what is of the wrong type, however deep", () => {
    const text = example.replace('"role": "outlet"', '"role": 7').replace('"flexible": false', '"flexible": "no"');
    expect(problemsOf(["solve", "job.json"], text).map(({ code, field }) => [code, field])).toEqual([
      ["field-of-wrong-type", "systems.0.nodes.4.role"],
      ["field-of-wrong-type", "systems.0.segments.0.flexible"],
    ]);
  });

  it.each([
    ["text that is not JSON", ["solve", "job.json"], "{", "not-json"],
    ["a schema that it does not know", ["solve", "job.json"], '{"schema":"cleatwork.job/9"}', "schema-unknown"],
    ["a job without systems", ["solve", "job.json"], '{"schema":"cleatwork.job/1","systems":[]}', "no-systems"],
    ["a command that there is not", ["weigh", "job.json"], "{}", "usage"],
    ["a command that every object has", ["toString", "job.json"], "{}", "usage"],
    ["a file that there is not", ["solve", "no-such.json"], "{}", "file-unreadable"],
  ])("refuses %s", (_, args, text, code) => {
    expect(problemsOf(args, text).map((problem) => problem.code)).toEqual([code]);
  });

  it("does not price without prices", () => {
    const text = JSON.stringify({ schema: "cleatwork.job/1", systems: [exampleSystem] });
    expect(problemsOf(["price", "job.json"], text)[0]).toMatchObject({ code: "no-pricing", field: "pricing" });
  });
});

describe("the program", { timeout: 60_000 }, () => {
  const program = fileURLToPath(new URL("./cli.ts", import.meta.url));
  const run = (args: readonly string[], input = "") =>
    spawnSync(process.execPath, ["--import", "tsx", program, ...args], { input, encoding: "utf8" });

  it("prints the answer to a file", () => {
    const { status, stdout, stderr } = run(["solve", examplePath]);
    expect(status, stderr).toBe(0);
    expect(JSON.parse(stdout)).toEqual(answered("solve", example));
  });

  it("tells every problem of what it read from standard input, and exits with 1", () => {
    const text = example.replace('"length_m": null', '"length_m": -1').replace('"seg_2"', '"seg_1"');
    const { status, stdout, stderr } = run(["solve", "-"], text);
    expect(status).toBe(1);
    expect(stdout).toBe("");
    const { problems } = JSON.parse(stderr) as { problems: { code: string }[] };
    expect(problems.map(({ code }) => code)).toEqual(["duplicate-id", "length-not-positive"]);
  });
});

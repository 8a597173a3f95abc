/** The same tree in a general solver of pipe networks, which knows loops and finds the flows that ours is given. */
import type { AirSystem, Solution } from "@cleatwork/calc";
import { Project, Workspace } from "epanet-js";

/** m²/s. Its viscosities are multiples of this one. */
const WATER_AT_20_C = 1.022e-6;

export interface GeneralSolverTimes {
  /** The equations alone, from a network that it has already read. */
  readonly solving_ms: number;
  /** Reading the network too, as a solve of ours reads the system. */
  readonly readingAndSolving_ms: number;
}

/** Fastest of the rounds. */
export async function timeGeneralSolver(
  system: AirSystem,
  solution: Solution,
  { rounds, now }: { readonly rounds: number; readonly now: () => number },
): Promise<GeneralSolverTimes> {
  const workspace = new Workspace();
  await workspace.loadModule();
  workspace.writeFile("tree.inp", networkText(system, solution));
  let solving = Infinity;
  let readingAndSolving = Infinity;
  for (let round = 0; round < rounds; round++) {
    const project = new Project(workspace);
    const start = now();
    project.open("tree.inp", "report.rpt", "out.bin");
    project.openH();
    project.initH(0);
    const between = now();
    project.runH();
    const end = now();
    project.closeH();
    project.close();
    solving = Math.min(solving, end - between);
    readingAndSolving = Math.min(readingAndSolving, end - start);
  }
  return { solving_ms: solving, readingAndSolving_ms: readingAndSolving };
}

/**
 * The tree in the solver's own text: liters a second, meters of air, round pipe of the hydraulic diameter. The equipment is a
 * reservoir high enough that no pressure is negative.
 */
function networkText({ nodes, segments }: AirSystem, { segments: solved, air }: Solution): string {
  const name = new Map(nodes.map(({ id }, index) => [id, `n${index}`]));
  const kinematic = air.viscosity_pa_s / air.density_kg_m3;
  const junctions = nodes
    .filter(({ role }) => role !== "equipment")
    .map(({ id, airflow_m3s }) => `${name.get(id) ?? ""} 0 ${1000 * (airflow_m3s ?? 0)}`);
  const equipment = nodes.filter(({ role }) => role === "equipment").map(({ id }) => `${name.get(id) ?? ""} 100000`);
  const pipes = segments.map(({ fromNodeId, toNodeId }, s) => {
    const { length_m, hydraulicDiameter_m } = solved[s]!;
    const ends = `${name.get(fromNodeId) ?? ""} ${name.get(toNodeId) ?? ""}`;
    return `p${s} ${ends} ${length_m} ${1000 * hydraulicDiameter_m} 0.09 0 Open`;
  });
  return [
    "[JUNCTIONS]",
    ...junctions,
    "[RESERVOIRS]",
    ...equipment,
    "[PIPES]",
    ...pipes,
    "[OPTIONS]",
    "Units LPS",
    "Headloss D-W",
    `Viscosity ${kinematic / WATER_AT_20_C}`,
    "Accuracy 0.0001",
    "Trials 200",
    "[TIMES]",
    "Duration 0",
    "[REPORT]",
    "Status No",
    "[END]",
    "",
  ].join("\n");
}

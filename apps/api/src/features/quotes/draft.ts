/** The first words of a quote, from what is drawn and how it is built. The estimator changes them at will. */
import { formatAirflow, formatThickness, type AirSystem, type Service, cubicMetersPerSecond } from "@cleatwork/calc";
import type { QuoteDraft, UnitSystem } from "@cleatwork/contracts";

const SERVICE: Readonly<Record<Service, string>> = {
  supply: "Supply air",
  return: "Return air",
  exhaust: "Exhaust air",
  "outside-air": "Outside air",
};

export function firstDraft(facts: {
  systems: readonly AirSystem[];
  units: UnitSystem;
  terms: string;
  projectName: string;
}): QuoteDraft {
  const { systems, units } = facts;
  return {
    title: "Ductwork, furnished and installed",
    greeting: `Here is our price for the ductwork of ${facts.projectName}.`,
    scope: systems.map((system) => systemScope(system, units)).join("\n"),
    inclusions: [
      "Ductwork, fittings, hangers and sealing as drawn",
      ...(systems.some(hasOutlets) ? ["Air devices as scheduled"] : []),
      ...insulationLine(systems, units),
      "Sales tax",
    ],
    exclusions: [
      "Air-moving equipment and its controls",
      "Cutting, patching and painting",
      "Electrical work and power to dampers",
      "Work outside regular hours",
    ],
    clarifications: [
      "Sizes are an aid to licensed judgment; the adopted code, the project specification and the authority having jurisdiction govern.",
    ],
    addenda: [],
    terms: facts.terms,
    validDays: 30,
    priceDetail: "by-system",
  };
}

function systemScope(system: AirSystem, units: UnitSystem): string {
  const outlets = system.nodes.filter(({ role }) => role === "outlet");
  const airflow = outlets.reduce((sum, { airflow_m3s }) => sum + (airflow_m3s ?? 0), 0);
  const shown = formatAirflow(cubicMetersPerSecond(airflow), units).text;
  return `${system.tag}: ${SERVICE[system.service]}, ${shown}, ${outlets.length} ${outlets.length === 1 ? "outlet" : "outlets"}, ${system.spec.material} duct, seal class ${system.spec.sealClass}.`;
}

const hasOutlets = (system: AirSystem) => system.nodes.some(({ deviceKey }) => deviceKey !== null);

function insulationLine(systems: readonly AirSystem[], units: UnitSystem): string[] {
  const kinds = new Set<string>();
  for (const { tag, spec } of systems)
    if (spec.insulation.kind !== "none")
      kinds.add(`${formatThickness(spec.insulation.thickness_m, units).text} ${spec.insulation.kind} on ${tag}`);
  return kinds.size === 0 ? [] : [`Insulation: ${[...kinds].join(", ")}`];
}

import { NO_COMPANY_STANDARDS, inches, meters, pascals, type ConstructionSpec } from "@cleatwork/calc";
import { describe, expect, it } from "vitest";
import { applyChangeSet } from "./change-set.ts";
import { setNodes, setSegments } from "./commands/edit-record.ts";
import { listOf, recordsOf } from "./layout.ts";
import { computeNumbers, type Numbers, type PricingDocuments } from "./project-numbers.ts";
import { countingIds, setOf, smallSystem, specId } from "./testing/fixtures.ts";
import { createTrial } from "./trial.ts";

const construction: ConstructionSpec = {
  material: "galvanized",
  pressureClass_pa: pascals(500),
  sealClass: "B",
  sectionLength_m: { rectangular: meters(1.5), round: meters(3), flatOval: meters(3) },
  rectangularJoint: "flange",
  roundJoint: "slip-coupling",
  rectangularSeam: "corner-lock",
  roundConstruction: "spiral",
  insulation: { kind: "none" },
  hangerSpacing_m: { rectangular: meters(2.4), round: meters(3) },
  sizesAre: "clear-inside",
  elbow: { rectangular: "radius", round: "smooth", radiusRatio: 1.5 },
  branch: { rectangular: "straight-tap", round: "straight-tap" },
  transitionAngle_rad: Math.PI / 6,
  flexibleSlack: 0,
};
const hourly = (key: "shop" | "field") => ({ key, name: key, parts: [{ label: "Wage", amount_micro: 40_000_000 }] });
const rates = { wasteOnMetal_bp: 0, tax_bp: 0, overhead_bp: 1000, contingency_bp: 0, profit_bp: 1000, bond_bp: 0 };

const layout = smallSystem(countingIds());
const documents: PricingDocuments = {
  records: recordsOf(layout),
  specs: [{ id: specId, construction }],
  altitude_m: meters(0),
  frictionBasis: "hydraulic-diameter",
  currency: "USD",
  items: [],
  standards: NO_COMPANY_STANDARDS,
  settings: {
    labor: [hourly("shop"), hourly("field")],
    rates,
    staleAfterDays: 30,
    marginFloor_bp: 0,
    conditionFactor: 1,
    version: 1,
  },
  pricing: { rates: null, conditionFactor: null, conditionReason: "", adds: [], version: 1 },
  pricedOn: "2026-06-16",
};
const branch = listOf(layout, "segment").find(({ name }) => name === "Branch")!;
const size = (diameter_in: number) =>
  setOf(
    setSegments(layout, {
      ids: [branch.id],
      fields: { section: { shape: "round", diameter_m: inches(diameter_in) } },
      label: "Size",
    }),
  );
const metalOf = ({ takeoffs }: Numbers) => takeoffs.reduce((sum, { totals }) => sum + totals.netWeight_kg, 0);

describe("a trial", () => {
  const trial = createTrial(documents);

  it("tells what the project's numbers become when the edit is really made", () => {
    const set = size(14);
    const applied = applyChangeSet(layout, set);
    if (!applied.ok) throw new Error("the set fits");
    const made = computeNumbers({ ...documents, records: recordsOf(applied.value) });
    const outcome = trial.of(set);
    if (!outcome.ok) throw new Error(outcome.reason);

    const { change } = outcome;
    expect(change.metal_kg).toBeCloseTo(metalOf(made) - metalOf(trial.before), 9);
    expect(change.price_minor).toBe(made.estimate!.price_minor - trial.before.estimate!.price_minor);
    expect(change.systems).toEqual([
      {
        systemId: branch.systemId,
        requiredPressure_pa: made.solutions[0]!.requiredPressure_pa - trial.before.solutions[0]!.requiredPressure_pa,
        spareAfter_pa: made.solutions[0]!.availablePressure_pa - made.solutions[0]!.requiredPressure_pa,
      },
    ]);
    expect(outcome.segments.map(({ segmentId, section }) => [segmentId, section])).toEqual([
      [branch.id, { shape: "round", diameter_m: inches(14) }],
    ]);
  });

  it("weighs more for a larger duct and asks more pressure for a smaller one", () => {
    const [larger, smaller] = [trial.of(size(16)), trial.of(size(6))];
    if (!larger.ok || !smaller.ok) throw new Error("both can be");
    expect(larger.change.metal_kg).toBeGreaterThan(0);
    expect(smaller.change.metal_kg).toBeLessThan(0);
    expect(smaller.change.systems[0]!.requiredPressure_pa).toBeGreaterThan(0);
    expect(smaller.change.raised).toContain(`velocity-over-limit:${branch.id}`);
  });

  it("tries every edit on the project as it is, not on the edit before", () => {
    const alone = createTrial(documents).of(size(12));
    trial.of(size(20));
    expect(trial.of(size(12))).toEqual(alone);
  });

  it("says why an edit cannot be", () => {
    const flexible = setOf(
      setSegments(layout, {
        ids: [listOf(layout, "segment")[0]!.id],
        fields: { flexible: true },
        label: "Flexible",
      }),
    );
    expect(trial.of(flexible)).toEqual({ ok: false, reason: "Main: needs round, since the duct is flexible." });

    const silent = listOf(layout, "node").find(({ role }) => role === "outlet")!;
    const without = setOf(setNodes(layout, { ids: [silent.id], fields: { airflow_m3s: null }, label: "No air" }));
    expect(trial.of(without)).toMatchObject({ ok: false });
  });

  it("refuses an edit made on a layout that has changed since", () => {
    const stale = { ...size(14), changes: size(14).changes.map((each) => ({ ...each, before: null })) };
    expect(trial.of(stale)).toEqual({ ok: false, reason: "The layout has changed since." });
  });
});

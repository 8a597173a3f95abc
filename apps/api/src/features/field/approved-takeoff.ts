/** What the shop and the site build, made from what was sold. Each field is named, so that no price can come along. */
import type { AirSystem, Takeoff } from "@cleatwork/calc";
import type { FieldPiece, FieldTakeoff, UnitSystem } from "@cleatwork/contracts";

export interface Sold {
  readonly quoteNumber: string;
  readonly revision: number;
  readonly project: { readonly name: string; readonly unitSystem: UnitSystem };
  readonly systems: readonly AirSystem[];
  readonly takeoffs: readonly Takeoff[];
}

export type ApprovedDocument = Omit<FieldTakeoff, "id" | "projectId" | "approvedAt">;

export function approvedDocument(sold: Sold, snapshotHash: string): ApprovedDocument {
  const levels = new Map(sold.systems.flatMap((system) => system.levels.map((level) => [level.id, level])));
  return {
    projectName: sold.project.name,
    unitSystem: sold.project.unitSystem,
    quoteNumber: sold.quoteNumber,
    revision: sold.revision,
    snapshotHash,
    levels: [...levels.values()].map(({ id, name, elevation_m }) => ({ id, name, elevation_m })),
    systems: sold.systems.map(({ id, tag, name, service, spec }) => ({
      id,
      tag,
      name,
      service,
      sealClass: spec.sealClass,
      insulation: spec.insulation,
    })),
    pieces: sold.takeoffs.flatMap(({ pieces }) => pieces.map(fieldPiece)),
    // An allowance is a share of money and hours, not a thing that a crew could look for.
    items: sold.takeoffs.flatMap(({ items }) =>
      items.flatMap(({ kind, description, systemId, levelId, quantity, unit }) =>
        kind === "allowance" || unit === "kg" ? [] : [{ kind, description, systemId, levelId, quantity, unit }],
      ),
    ),
  };
}

const fieldPiece = (piece: Takeoff["pieces"][number]): FieldPiece => ({
  mark: piece.mark,
  systemId: piece.systemId,
  levelId: piece.levelId,
  segmentName: piece.segmentName,
  kind: piece.kind,
  fitting: piece.fitting,
  section: piece.section,
  otherSection: piece.otherSection,
  angle_rad: piece.angle_rad,
  length_m: piece.length_m,
  material: piece.material,
  gauge: piece.gauge,
  joint: piece.joint,
  seam: piece.seam,
  weight_kg: piece.weight_kg,
});

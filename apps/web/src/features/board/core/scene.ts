/** What there is to draw on one level: flat shapes with true widths, made from the layout and the solved sections. */
import type { DuctClass, Section, Service } from "@cleatwork/calc";
import type { LayoutRecord, NodeRecord, SystemRecord } from "@cleatwork/contracts";
import type { PlanPoint } from "./camera.ts";

export interface SceneDuct {
  readonly id: string;
  readonly systemId: string;
  readonly service: Service;
  readonly ductClass: DuctClass;
  readonly from: PlanPoint;
  readonly to: PlanPoint;
  readonly fromNodeId: string;
  readonly toNodeId: string;
  readonly section: Section | null;
  /** Plan width: the diameter, the major axis, or the side that is said first. */
  readonly width_m: number;
  readonly flexible: boolean;
  /** Seen from above a vertical duct is only its section. */
  readonly vertical: boolean;
}

export interface SceneNode {
  readonly id: string;
  readonly systemId: string;
  readonly service: Service;
  readonly role: NodeRecord["role"];
  readonly tag: string;
  readonly at: PlanPoint;
  readonly airflow_m3s: number | null;
}

export interface Scene {
  readonly ducts: readonly SceneDuct[];
  readonly nodes: readonly SceneNode[];
}

/** Where nothing is sized yet, a duct is drawn this wide so that it can be seen and picked. */
const UNSIZED_WIDTH_M = 0.25;

export function planWidth(section: Section | null): number {
  if (section === null) return UNSIZED_WIDTH_M;
  switch (section.shape) {
    case "round":
      return section.diameter_m;
    case "annular":
      return section.outerDiameter_m;
    case "rectangular":
    case "flat-oval":
      return section.width_m;
  }
}

/**
 * The ducts and nodes of one level. A duct belongs to the level of its far end; a riser shows on both.
 * `sectionOf` answers the solved section of a segment, for those left to the sizing rule.
 */
export function sceneOf(
  records: Iterable<LayoutRecord>,
  levelId: string,
  sectionOf: (segmentId: string) => Section | null,
): Scene {
  const nodes = new Map<string, NodeRecord>();
  const systems = new Map<string, SystemRecord>();
  const segments: (LayoutRecord & { kind: "segment" })[] = [];
  for (const record of records) {
    if (record.kind === "node") nodes.set(record.id, record);
    else if (record.kind === "system") systems.set(record.id, record);
    else if (record.kind === "segment") segments.push(record);
  }
  const ducts: SceneDuct[] = [];
  for (const segment of segments) {
    const from = nodes.get(segment.fromNodeId);
    const to = nodes.get(segment.toNodeId);
    if (!from || !to || (from.levelId !== levelId && to.levelId !== levelId)) continue;
    const section = segment.section ?? sectionOf(segment.id);
    ducts.push({
      id: segment.id,
      systemId: segment.systemId,
      service: systems.get(segment.systemId)?.service ?? "supply",
      ductClass: segment.ductClass,
      from: { x_m: from.x_m, y_m: from.y_m },
      to: { x_m: to.x_m, y_m: to.y_m },
      fromNodeId: from.id,
      toNodeId: to.id,
      section,
      width_m: planWidth(section),
      flexible: segment.flexible,
      vertical: Math.hypot(to.x_m - from.x_m, to.y_m - from.y_m) < 0.01,
    });
  }
  const shown: SceneNode[] = [];
  for (const node of nodes.values()) {
    if (node.levelId !== levelId) continue;
    shown.push({
      id: node.id,
      systemId: node.systemId,
      service: systems.get(node.systemId)?.service ?? "supply",
      role: node.role,
      tag: node.tag,
      at: { x_m: node.x_m, y_m: node.y_m },
      airflow_m3s: node.airflow_m3s,
    });
  }
  return { ducts, nodes: shown };
}

/** The scene as it would be with some nodes elsewhere: the preview of a drag. */
export function withNodesAt(scene: Scene, moved: ReadonlyMap<string, PlanPoint>): Scene {
  if (moved.size === 0) return scene;
  return {
    ducts: scene.ducts.map((duct) => {
      const from = moved.get(duct.fromNodeId);
      const to = moved.get(duct.toNodeId);
      return from || to ? { ...duct, from: from ?? duct.from, to: to ?? duct.to } : duct;
    }),
    nodes: scene.nodes.map((node) => {
      const at = moved.get(node.id);
      return at ? { ...node, at } : node;
    }),
  };
}

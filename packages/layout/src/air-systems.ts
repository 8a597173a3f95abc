/** From the drawn document to what the calculation reads: one air system for each system, its segments in tree order. */
import {
  AIR_SYSTEM_SCHEMA,
  SERVICES,
  meters,
  type AirNode,
  type AirSegment,
  type AirSystem,
  type ConstructionSpec,
  type FrictionBasis,
  type Level,
  type Meters,
} from "@cleatwork/calc";
import type { DrawingId, NodeRecord, SegmentRecord, SpecId, SystemRecord } from "@cleatwork/contracts";
import { listOf, type Layout } from "./layout.ts";
import { indexOf, treeOf, type LayoutIndex } from "./layout-index.ts";

/** What a title block says of a drawing. */
export interface MeasuredDrawing {
  readonly id: DrawingId;
  readonly sheetNumber: string;
  readonly revision: string;
}

export interface AirSystemContext {
  /** Of the project; without them pieces do not know their sheet. */
  readonly drawings?: readonly MeasuredDrawing[] | undefined;
  readonly specs: readonly { readonly id: SpecId; readonly construction: ConstructionSpec }[];
  /** Of the site; a system's own design conditions keep the rest. */
  readonly altitude_m: Meters;
  /** The company's. */
  readonly frictionBasis: FrictionBasis;
}

/** Systems whose spec is not among the given are left out; the server never stores such a system. */
export function airSystemsFrom(
  layout: Layout,
  context: AirSystemContext,
  index: LayoutIndex = indexOf(layout),
): AirSystem[] {
  const specs = new Map(context.specs.map(({ id, construction }) => [id, construction]));
  const levels = levelsOf(layout, context.drawings ?? []);
  return systemsInOrder(layout).flatMap((system) => {
    const spec = specs.get(system.specId);
    return spec ? [airSystem(system, spec, levels, index, context)] : [];
  });
}

/** As the trade lists them: supply, return, exhaust, outside air; within a service by tag. */
export const systemsInOrder = (layout: Layout): SystemRecord[] =>
  listOf(layout, "system").sort(
    (a, b) =>
      SERVICES.indexOf(a.service) - SERVICES.indexOf(b.service) || a.tag.localeCompare(b.tag, "en", { numeric: true }),
  );

function levelsOf(layout: Layout, drawings: readonly MeasuredDrawing[]): Level[] {
  const sheets = new Map(drawings.map(({ id, sheetNumber, revision }) => [id, { sheetNumber, revision }]));
  return listOf(layout, "level").map(({ id, name, elevation_m, underlay }) => ({
    id,
    name,
    elevation_m,
    sheet: underlay ? (sheets.get(underlay.drawingId) ?? null) : null,
  }));
}

function airSystem(
  system: SystemRecord,
  spec: ConstructionSpec,
  levels: readonly Level[],
  index: LayoutIndex,
  { altitude_m, frictionBasis }: AirSystemContext,
): AirSystem {
  return {
    schema: AIR_SYSTEM_SCHEMA,
    id: system.id,
    tag: system.tag,
    name: system.name,
    service: system.service,
    design: { ...system.design, altitude_m: meters(altitude_m) },
    limits: system.limits,
    sizing: system.sizing,
    frictionBasis,
    spec,
    levels,
    nodes: (index.nodesOf.get(system.id) ?? []).map(airNode),
    segments: treeOf(index, system.id).map(({ segment, number }) => airSegment(segment, number)),
  };
}

const airNode = ({ kind: _kind, systemId: _systemId, ...node }: NodeRecord): AirNode => node;

const airSegment = (
  { kind: _kind, systemId: _systemId, ordinal: _ordinal, ...segment }: SegmentRecord,
  number: number,
): AirSegment => ({ ...segment, number });

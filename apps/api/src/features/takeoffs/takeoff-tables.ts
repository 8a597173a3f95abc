/** A takeoff as tables for files: pieces, sums, what is counted. In the project's units, the unit in each heading. Pure. */
import {
  formatSize,
  KILOGRAMS_PER_POUND,
  METERS_PER_FOOT,
  type AirSystem,
  type CountedItem,
  type Piece,
  type Takeoff,
} from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";

export type Cell = string | number | null;
export interface Table {
  readonly title: string;
  readonly head: readonly string[];
  readonly rows: readonly (readonly Cell[])[];
  /** Columns of numbers that are summed in the last row. */
  readonly summed: readonly number[];
}

interface Source {
  readonly takeoffs: readonly Takeoff[];
  readonly systems: readonly AirSystem[];
  readonly units: UnitSystem;
}

export const takeoffTables = (source: Source): readonly Table[] => [
  sumsTable(source),
  piecesTable(source),
  countedTable(source),
];

interface Units {
  readonly length: string;
  readonly area: string;
  readonly weight: string;
  readonly lengthOf: (meters: number) => number;
  readonly areaOf: (squareMeters: number) => number;
  readonly weightOf: (kilograms: number) => number;
}

const US: Units = {
  length: "ft",
  area: "ft²",
  weight: "lb",
  lengthOf: (meters) => meters / METERS_PER_FOOT,
  areaOf: (squareMeters) => squareMeters / METERS_PER_FOOT ** 2,
  weightOf: (kilograms) => kilograms / KILOGRAMS_PER_POUND,
};
const SI: Units = {
  length: "m",
  area: "m²",
  weight: "kg",
  lengthOf: (meters) => meters,
  areaOf: (squareMeters) => squareMeters,
  weightOf: (kilograms) => kilograms,
};
const unitsOf = (units: UnitSystem): Units => (units === "si" ? SI : US);

/** A file is read by people too: a tenth of a millimeter or of a gram is enough. */
const rounded = (value: number): number => Number(value.toFixed(4));

export function piecesTable({ takeoffs, systems, units }: Source): Table {
  const u = unitsOf(units);
  const levelName = namesOfLevels(systems);
  return {
    title: "Pieces",
    head: [
      "System",
      "Level",
      "Mark",
      "Kind",
      "Fitting",
      "Run",
      `Size, ${units === "si" ? "mm" : "in."}`,
      `Length, ${u.length}`,
      "Metal",
      "Gauge",
      "Gauge by",
      "Joint",
      "Seam",
      `Net, ${u.area}`,
      `Blank, ${u.area}`,
      `Weight, ${u.weight}`,
      "Joints",
      "Shop, h",
      "Field, h",
    ],
    rows: piecesOf(takeoffs).map((piece) => [
      piece.systemTag,
      levelName(piece.levelId),
      piece.mark,
      piece.kind,
      // A transition that is called one says nothing new.
      piece.fitting === piece.kind ? null : piece.fitting,
      piece.segmentName,
      formatSize(piece.section, units).value,
      rounded(u.lengthOf(piece.length_m)),
      piece.material,
      piece.gauge,
      piece.gaugeDecider === null ? null : piece.gaugeSource,
      piece.joint,
      piece.seam,
      rounded(u.areaOf(piece.netArea_m2)),
      rounded(u.areaOf(piece.blankArea_m2)),
      rounded(u.weightOf(piece.weight_kg)),
      piece.jointCount,
      rounded(piece.shopHours_h),
      rounded(piece.fieldHours_h),
    ]),
    summed: [13, 14, 15, 16, 17, 18],
  };
}

/** Pieces of one system, kind, size and gauge together. */
export function sumsTable({ takeoffs, units }: Source): Table {
  const u = unitsOf(units);
  const lines = new Map<string, { readonly first: Piece; readonly pieces: Piece[] }>();
  for (const piece of piecesOf(takeoffs)) {
    const key = [piece.systemId, piece.kind, formatSize(piece.section, units).value, piece.gauge ?? ""].join("|");
    const line = lines.get(key);
    if (line) line.pieces.push(piece);
    else lines.set(key, { first: piece, pieces: [piece] });
  }
  return {
    title: "Sums",
    head: [
      "System",
      "Kind",
      `Size, ${units === "si" ? "mm" : "in."}`,
      "Metal",
      "Gauge",
      "Pieces",
      `Length, ${u.length}`,
      `Net, ${u.area}`,
      `Weight, ${u.weight}`,
      "Shop, h",
      "Field, h",
    ],
    rows: [...lines.values()].map(({ first, pieces }) => {
      const sum = (of: (piece: Piece) => number) => pieces.reduce((total, piece) => total + of(piece), 0);
      const isRun = first.kind === "straight" || first.kind === "flexible";
      return [
        first.systemTag,
        first.kind,
        formatSize(first.section, units).value,
        first.material,
        first.gauge,
        pieces.length,
        isRun ? rounded(u.lengthOf(sum(({ length_m }) => length_m))) : null,
        rounded(u.areaOf(sum(({ netArea_m2 }) => netArea_m2))),
        rounded(u.weightOf(sum(({ weight_kg }) => weight_kg))),
        rounded(sum(({ shopHours_h }) => shopHours_h)),
        rounded(sum(({ fieldHours_h }) => fieldHours_h)),
      ];
    }),
    summed: [5, 7, 8, 9, 10],
  };
}

export function countedTable({ takeoffs, systems }: Source): Table {
  const tags = new Map(systems.map(({ id, tag }) => [id, tag]));
  const lines = new Map<string, { readonly first: CountedItem; quantity: number; hours_h: number }>();
  for (const item of takeoffs.flatMap(({ items }) => items)) {
    const key = `${item.systemId}|${item.key}|${item.description}|${item.basis}`;
    const line = lines.get(key);
    if (line) {
      line.quantity += item.quantity;
      line.hours_h += item.fieldHours_h;
    } else lines.set(key, { first: item, quantity: item.quantity, hours_h: item.fieldHours_h });
  }
  return {
    title: "Counted",
    head: ["System", "Item", "Quantity", "Unit", "Field, h", "Basis"],
    rows: [...lines.values()].map(({ first, quantity, hours_h }) => [
      tags.get(first.systemId) ?? "",
      first.description,
      rounded(quantity),
      first.unit,
      rounded(hours_h),
      first.basis,
    ]),
    summed: [4],
  };
}

/** What each column comes to; null where it is not summed. */
export const sumRow = ({ head, rows, summed }: Table): readonly Cell[] =>
  head.map((_, column) =>
    column === 0
      ? "Total"
      : summed.includes(column)
        ? rounded(rows.reduce((total, row) => total + Number(row[column] ?? 0), 0))
        : null,
  );

const piecesOf = (takeoffs: readonly Takeoff[]): readonly Piece[] => takeoffs.flatMap(({ pieces }) => pieces);

function namesOfLevels(systems: readonly AirSystem[]): (id: string) => string {
  const names = new Map(systems.flatMap(({ levels }) => levels.map(({ id, name }) => [id, name])));
  return (id) => names.get(id) ?? "";
}

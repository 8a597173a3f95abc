/** The takeoff grouped for reading: systems, then kinds, then sizes; each line a sum of pieces. Pure. */
import { formatSize, type Piece, type PieceKind, type Section, type Takeoff } from "@cleatwork/calc";
import type { UnitSystem } from "@cleatwork/contracts";

export const GROUPINGS = ["system", "level", "kind", "size", "gauge", "spec"] as const;
export type Grouping = (typeof GROUPINGS)[number];

export interface Sums {
  readonly count: number;
  readonly length_m: number;
  readonly netArea_m2: number;
  readonly blankArea_m2: number;
  readonly weight_kg: number;
  readonly joints: number;
  readonly shop_h: number;
  readonly field_h: number;
}

export interface Line {
  readonly key: string;
  readonly label: string;
  readonly size: string;
  readonly gauge: string;
  readonly pieces: readonly Piece[];
  readonly sums: Sums;
}

export interface Group {
  readonly key: string;
  readonly label: string;
  readonly lines: readonly Line[];
  readonly sums: Sums;
}

export interface Names {
  readonly system: (id: string) => string;
  readonly level: (id: string) => string;
  readonly spec: (systemId: string) => string;
  readonly units: UnitSystem;
}

const kindNames: Readonly<Record<PieceKind, string>> = {
  straight: "Straight",
  flexible: "Flexible duct",
  elbow: "Elbows",
  transition: "Transitions and reducers",
  branch: "Taps and branches",
  "end-cap": "End caps",
};
const shapeNames: Readonly<Record<Section["shape"], string>> = {
  round: "round",
  rectangular: "rectangular",
  "flat-oval": "flat oval",
  annular: "annular",
};

export const kindLabel = ({ kind, section }: Pick<Piece, "kind" | "section">): string =>
  kind === "straight" ? `Straight, ${shapeNames[section.shape]}` : kindNames[kind];

export function groupsOf(takeoffs: readonly Takeoff[], by: Grouping, names: Names): Group[] {
  const groups = new Map<string, { label: string; lines: Map<string, Piece[]> }>();
  for (const { pieces } of takeoffs)
    for (const piece of pieces) {
      const { key, label } = groupOf(piece, by, names);
      let group = groups.get(key);
      if (!group) groups.set(key, (group = { label, lines: new Map() }));
      const line = [
        by === "kind" ? "" : kindLabel(piece),
        formatSize(piece.section, names.units).text,
        piece.gauge ?? "",
      ].join("|");
      const known = group.lines.get(line);
      if (known) known.push(piece);
      else group.lines.set(line, [piece]);
    }
  return [...groups].map(([key, { label, lines }]) => {
    const made = [...lines].map(([line, pieces]): Line => {
      const [kind = "", size = "", gauge = ""] = line.split("|");
      return { key: `${key}|${line}`, label: kind, size, gauge, pieces, sums: sumOf(pieces) };
    });
    return { key, label, lines: made, sums: sumOf(made.flatMap(({ pieces }) => pieces)) };
  });
}

function groupOf(piece: Piece, by: Grouping, names: Names): { key: string; label: string } {
  switch (by) {
    case "system":
      return {
        key: `${piece.systemId}|${piece.levelId}`,
        label: `${names.system(piece.systemId)}, ${names.level(piece.levelId)}`,
      };
    case "level":
      return { key: piece.levelId, label: names.level(piece.levelId) };
    case "kind": {
      const label = kindLabel(piece);
      return { key: label, label };
    }
    case "size": {
      const label = formatSize(piece.section, names.units).text;
      return { key: label, label };
    }
    case "spec": {
      const label = names.spec(piece.systemId);
      return { key: label, label };
    }
    case "gauge": {
      const label = piece.gauge ? `${piece.gauge}, ${piece.material}` : "No sheet";
      return { key: label, label };
    }
  }
}

export function sumOf(pieces: readonly Piece[]): Sums {
  const sum = (of: (piece: Piece) => number) => pieces.reduce((total, piece) => total + of(piece), 0);
  return {
    count: pieces.length,
    length_m: sum(({ kind, length_m }) => (kind === "straight" || kind === "flexible" ? length_m : 0)),
    netArea_m2: sum(({ netArea_m2 }) => netArea_m2),
    blankArea_m2: sum(({ blankArea_m2 }) => blankArea_m2),
    weight_kg: sum(({ weight_kg }) => weight_kg),
    joints: sum(({ jointCount }) => jointCount),
    shop_h: sum(({ shopHours_h }) => shopHours_h),
    field_h: sum(({ fieldHours_h }) => fieldHours_h),
  };
}

import { formatSize, type Piece } from "@cleatwork/calc";
import { csvText } from "../../lib/format/csv.ts";

/** SI, with the unit in each heading: what is computed, for whoever computes on. */
export const pieceCsv = (pieces: readonly Piece[]): string =>
  csvText([
    [
      "system",
      "mark",
      "kind",
      "fitting",
      "run",
      "size_mm",
      "length_m",
      "material",
      "gauge",
      "joint",
      "seam",
      "net_area_m2",
      "blank_area_m2",
      "weight_kg",
      "shop_h",
      "field_h",
    ],
    ...pieces.map((piece) => [
      piece.systemTag,
      piece.mark,
      piece.kind,
      piece.fitting ?? "",
      piece.segmentName,
      formatSize(piece.section, "si").text,
      piece.length_m,
      piece.material,
      piece.gauge ?? "",
      piece.joint,
      piece.seam,
      piece.netArea_m2,
      piece.blankArea_m2,
      piece.weight_kg,
      piece.shopHours_h,
      piece.fieldHours_h,
    ]),
  ]);

/** Paints the plan as sheet M-101: an 11 × 17 in. page at 1/8 in. to the foot. */
import PDFDocument from "pdfkit";
import { building, chairs, doors, grid, rooms, shelves, unit, walls, type Point } from "./plan.ts";

/** 1/8 in. to the foot: 9 points a foot. */
const POINTS_PER_FOOT = 9;
export const sheet = {
  width_pt: 17 * 72,
  height_pt: 11 * 72,
  /** Where the building's north-west corner lies on the page. */
  corner_pt: { x: 108, y: 108 },
  metersPerPoint: 0.3048 / POINTS_PER_FOOT,
} as const;

const LINE = "#51606b";
const FAINT = "#a9b5bd";
const WORDS = "#394753";

export function drawLibraryPlan(printed: { on: Date }): Promise<Buffer> {
  const doc = new PDFDocument({
    size: [sheet.width_pt, sheet.height_pt],
    margin: 0,
    info: { Title: "M-101 Level 1 mechanical plan", Author: "Tallgrass demo", CreationDate: printed.on },
  });
  const chunks: Buffer[] = [];
  doc.on("data", (chunk: Buffer) => chunks.push(chunk));
  const finished = new Promise<Buffer>((resolve, reject) => {
    doc.on("end", () => resolve(Buffer.concat(chunks)));
    doc.on("error", reject);
  });

  drawGrid(doc);
  drawWalls(doc);
  drawFurniture(doc);
  drawRooms(doc);
  drawTitle(doc);
  doc.end();
  return finished;
}

type Page = PDFKit.PDFDocument;

const x = (feet: number) => sheet.corner_pt.x + feet * POINTS_PER_FOOT;
const y = (feet: number) => sheet.corner_pt.y + feet * POINTS_PER_FOOT;

function drawGrid(doc: Page): void {
  doc.lineWidth(0.5).dash(12, { space: 4 }).strokeColor(FAINT);
  for (const { at } of grid.columns)
    doc
      .moveTo(x(at), y(-5))
      .lineTo(x(at), y(building.depth_ft + 2))
      .stroke();
  for (const { at } of grid.rows)
    doc
      .moveTo(x(-4), y(at))
      .lineTo(x(building.width_ft + 3), y(at))
      .stroke();
  doc.undash().lineWidth(0.8).strokeColor(LINE).fillColor(WORDS).fontSize(9);
  const bubble = (cx: number, cy: number, label: string) => {
    doc.circle(cx, cy, 9).stroke();
    doc.text(label, cx - 9, cy - 3.5, { width: 18, align: "center", lineBreak: false });
  };
  for (const { at, label } of grid.columns) bubble(x(at), y(-6), label);
  for (const { at, label } of grid.rows) bubble(x(building.width_ft + 4), y(at), label);
}

function drawWalls(doc: Page): void {
  doc.strokeColor(LINE).lineWidth(5);
  doc.rect(x(0), y(0), building.width_ft * POINTS_PER_FOOT, building.depth_ft * POINTS_PER_FOOT).stroke();
  doc.strokeColor("#ffffff").lineWidth(3);
  doc.rect(x(0), y(0), building.width_ft * POINTS_PER_FOOT, building.depth_ft * POINTS_PER_FOOT).stroke();
  for (const [from, to] of walls) wall(doc, from, to);
  for (const door of doors) {
    const [cx, cy] = door.at;
    const half = door.width_ft / 2;
    const from: Point = door.along === "x" ? [cx - half, cy] : [cx, cy - half];
    const to: Point = door.along === "x" ? [cx + half, cy] : [cx, cy + half];
    doc.lineWidth(6).strokeColor("#ffffff").moveTo(x(from[0]), y(from[1])).lineTo(x(to[0]), y(to[1])).stroke();
    const leaf = Math.min(door.width_ft, 4) * POINTS_PER_FOOT;
    doc.lineWidth(0.6).strokeColor(FAINT);
    doc.moveTo(x(from[0]), y(from[1]));
    if (door.along === "x") doc.lineTo(x(from[0]), y(from[1]) + leaf).stroke();
    else doc.lineTo(x(from[0]) + leaf, y(from[1])).stroke();
  }
}

function wall(doc: Page, from: Point, to: Point): void {
  for (const [color, width] of [
    [LINE, 3.6],
    ["#ffffff", 2.2],
  ] as const)
    doc.strokeColor(color).lineWidth(width).moveTo(x(from[0]), y(from[1])).lineTo(x(to[0]), y(to[1])).stroke();
}

function drawFurniture(doc: Page): void {
  doc.lineWidth(0.5).strokeColor(FAINT);
  for (const shelf of shelves)
    doc
      .rect(x(shelf.at[0]), y(shelf.at[1]), shelf.width_ft * POINTS_PER_FOOT, shelf.depth_ft * POINTS_PER_FOOT)
      .stroke();
  const [west, north] = unit.from;
  const [east, south] = unit.to;
  doc.rect(x(west), y(north), (east - west) * POINTS_PER_FOOT, (south - north) * POINTS_PER_FOOT).stroke();
  doc
    .fillColor(WORDS)
    .fontSize(7.5)
    .text(unit.tag, x(west), y(north) - 9, { lineBreak: false });
  const size = chairs.size_ft * POINTS_PER_FOOT;
  for (let row = 0; row < chairs.rows; row++)
    for (let column = 0; column < chairs.columns; column++)
      doc
        .rect(x(chairs.at[0] + column * chairs.pitch_ft), y(chairs.at[1] + row * chairs.pitch_ft), size, size)
        .stroke();
  for (const cx of [98, 106]) for (const cy of [43, 47]) doc.circle(x(cx), y(cy), 13).stroke();
}

function drawRooms(doc: Page): void {
  doc.fillColor(WORDS);
  for (const room of rooms) {
    const options = { width: 120, align: "center", lineBreak: false } as const;
    doc.fontSize(7.5).text(room.name, x(room.at[0]) - 60, y(room.at[1]) - 4, options);
    doc.fontSize(7).text(room.number, x(room.at[0]) - 60, y(room.at[1]) + 5, options);
  }
}

function drawTitle(doc: Page): void {
  const top = y(building.depth_ft) + 24;
  doc.fillColor(WORDS).fontSize(13).text("MARROW CREEK BRANCH LIBRARY", x(0), top, { lineBreak: false });
  doc
    .fontSize(9)
    .text("Level 1, mechanical plan. 1/8 in. = 1 ft. Invented building, for demonstration.", x(0), top + 18, {
      lineBreak: false,
    });
  doc.fontSize(22).text("M-101", x(building.width_ft) - 90, top, { width: 90, align: "right", lineBreak: false });
  doc.lineWidth(1).strokeColor(LINE);
  const bar = y(building.depth_ft) + 14;
  doc.moveTo(x(60), bar).lineTo(x(76), bar).stroke();
  for (const at of [60, 64, 68, 76])
    doc
      .moveTo(x(at), bar - 3)
      .lineTo(x(at), bar + 3)
      .stroke();
  doc.fontSize(7).text("16 ft", x(77), bar - 3, { lineBreak: false });
}

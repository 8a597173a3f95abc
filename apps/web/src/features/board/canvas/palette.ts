/** The colors that the canvas draws with, read from the roles of the ground it lies on. */
const ROLES = {
  ground: "--b-ground",
  grid: "--b-grid",
  ductFill: "--b-duct-fill",
  ductEdge: "--b-duct-line",
  text: "--b-label",
  textHalo: "--b-ground",
  dim: "--b-dim",
  scribe: "--scribe",
  scribeKey: "--scribe-key",
  stop: "--stop",
  warn: "--warn",
  supply: "--supply",
  return: "--return",
  exhaust: "--exhaust",
  "outside-air": "--outside",
  heat1: "--heat-1",
  heat2: "--heat-2",
  heat3: "--heat-3",
  heat4: "--heat-4",
  heat5: "--heat-5",
} as const;

export type Palette = Readonly<Record<keyof typeof ROLES, string>>;

export function paletteOf(element: Element): Palette {
  const style = getComputedStyle(element);
  const entries = Object.entries(ROLES).map(([role, property]) => [role, style.getPropertyValue(property).trim()]);
  return Object.fromEntries(entries) as Palette;
}

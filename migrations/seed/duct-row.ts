/** How the demo's ducts are written down: as an estimator reads them off a plan, in feet, inches and cfm. */
export interface DuctRow {
  readonly no: number;
  /** The row it hangs on; null at the equipment. */
  readonly after: number | null;
  readonly name: string;
  readonly duct: "main" | "branch" | "runout";
  /** "24x12", "14", "18x8 oval", "10 flex", "12/4 ring" (outer and inner diameter): inches. */
  readonly size: string;
  /** Where it ends on the plan, feet from the north-west corner: to the east, to the south. */
  readonly to: readonly [number, number];
  /** Center line above the floor where it ends; the system's own height unless said. */
  readonly height_ft?: number;
  /** Where the duct is longer than the straight line. */
  readonly length_ft?: number;
  readonly accessories?: readonly ("volume-damper" | "fire-damper" | "access-door" | "flexible-connector")[];
  readonly insulation?: "none" | "liner";
  readonly outlet?: {
    readonly cfm: number;
    readonly need_inwg: number;
    readonly device: string;
    readonly space: string;
  };
}

export interface SystemRows {
  readonly tag: string;
  readonly name: string;
  readonly service: "supply" | "return" | "exhaust" | "outside-air";
  /** Which of the company's specs it is built by. */
  readonly spec: string;
  readonly equipment: { readonly tag: string; readonly at: readonly [number, number]; readonly height_ft?: number };
  readonly available_inwg: number;
  readonly temperature_f: number;
  readonly height_ft: number;
  readonly outletPrefix: string;
  readonly rows: readonly DuctRow[];
}

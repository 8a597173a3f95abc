import type { Spec, specRequest } from "@cleatwork/contracts";
import type { z } from "zod";
import { fromJson } from "../../platform/db/columns.ts";

export type SpecRequest = z.infer<typeof specRequest>;

export interface SpecRow {
  readonly id: Spec["id"];
  readonly name: string;
  readonly construction: unknown;
  readonly version: number;
}

export const specFromRow = (row: SpecRow): Spec => ({
  id: row.id,
  name: row.name,
  construction: fromJson(row.construction),
  version: row.version,
});

export const rowFromSpec = (spec: SpecRequest) => ({
  name: spec.name,
  construction: JSON.stringify(spec.construction),
});

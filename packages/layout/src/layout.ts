/** The layout document: flat records by id. Nothing computed is stored in it. */
import type {
  LayoutRecord,
  LevelRecord,
  NodeRecord,
  RecordId,
  SegmentRecord,
  SystemRecord,
} from "@cleatwork/contracts";

export interface Layout {
  readonly records: ReadonlyMap<RecordId, LayoutRecord>;
}

export const createLayout = (records: Iterable<LayoutRecord>): Layout => ({
  records: new Map([...records].map((record) => [record.id, record])),
});

export const recordsOf = (layout: Layout): LayoutRecord[] => [...layout.records.values()];

type Kinds = { level: LevelRecord; system: SystemRecord; node: NodeRecord; segment: SegmentRecord };

/** Every record of a kind, in the order of the document. */
export function listOf<K extends keyof Kinds>(layout: Layout, kind: K): Kinds[K][] {
  const found: Kinds[K][] = [];
  for (const record of layout.records.values()) if (record.kind === kind) found.push(record as Kinds[K]);
  return found;
}

/** The record when it is there and of this kind. */
export function find<K extends keyof Kinds>(layout: Layout, kind: K, id: string | null): Kinds[K] | null {
  const record = layout.records.get(id as RecordId);
  return record?.kind === kind ? (record as Kinds[K]) : null;
}

/** What a person would call a record. */
export function nameOf(record: LayoutRecord): string {
  switch (record.kind) {
    case "level":
      return record.name;
    case "system":
      return record.tag;
    case "node":
      return record.tag || record.spaceName || `the ${record.role}`;
    case "segment":
      return record.name || "the unnamed segment";
  }
}

/** Edits that the server has not taken yet, kept in the browser's own database so that neither a crash nor a flat battery loses one. */
import type { ChangeSet } from "@cleatwork/contracts";
import { openDB, type DBSchema, type IDBPDatabase } from "idb";

/** One batch as it is sent: its id stays the same however often it is tried. */
export interface KeptBatch {
  readonly batchId: string;
  readonly project: string;
  /** Order of making. */
  readonly order: number;
  readonly sets: readonly ChangeSet[];
}

export interface EditHistory {
  readonly undo: readonly ChangeSet[];
  readonly redo: readonly ChangeSet[];
}

/** Where edits wait. Tests keep them in memory. */
export interface EditShelf {
  batches(project: string): Promise<readonly KeptBatch[]>;
  put(batch: KeptBatch): Promise<void>;
  remove(batchId: string): Promise<void>;
  history(project: string): Promise<EditHistory | null>;
  keepHistory(project: string, history: EditHistory): Promise<void>;
}

interface Schema extends DBSchema {
  batches: { key: string; value: KeptBatch; indexes: { project: string } };
  history: { key: string; value: EditHistory };
}

let opened: Promise<IDBPDatabase<Schema>> | null = null;

const database = () =>
  (opened ??= openDB<Schema>("cleatwork-edits", 1, {
    upgrade(db) {
      db.createObjectStore("batches", { keyPath: "batchId" }).createIndex("project", "project");
      db.createObjectStore("history");
    },
  }));

export const browserShelf: EditShelf = {
  async batches(project) {
    const kept = await (await database()).getAllFromIndex("batches", "project", project);
    return kept.sort((a, b) => a.order - b.order);
  },
  async put(batch) {
    await (await database()).put("batches", batch);
  },
  async remove(batchId) {
    await (await database()).delete("batches", batchId);
  },
  async history(project) {
    return (await (await database()).get("history", project)) ?? null;
  },
  async keepHistory(project, history) {
    await (await database()).put("history", history, project);
  },
};

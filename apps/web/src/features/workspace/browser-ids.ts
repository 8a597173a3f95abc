import { makeId } from "@cleatwork/contracts";
import type { IdSource } from "@cleatwork/layout";

const make = <K extends string>(kind: K) =>
  makeId(kind, { now: Date.now(), random: (bytes) => crypto.getRandomValues(bytes) });

/** Ids made in the browser: by time and chance, so that two browsers never make the same. */
export const browserIds: IdSource = {
  level: () => make("lvl"),
  system: () => make("sys"),
  node: () => make("nod"),
  segment: () => make("seg"),
};

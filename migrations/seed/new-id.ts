import { makeId } from "@cleatwork/contracts";
import { webcrypto } from "node:crypto";

/** A new id of a kind, as the browser would make it. */
export const newId = <K extends string>(kind: K) =>
  makeId(kind, { now: Date.now(), random: (bytes) => webcrypto.getRandomValues(bytes) });

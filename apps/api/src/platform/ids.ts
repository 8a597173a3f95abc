import { makeId } from "@cleatwork/contracts";
import type { Clock } from "./clock.ts";

/** Makes ids that carry their kind: `ids.make("prj")`. */
export interface Ids {
  make<K extends string>(kind: K): ReturnType<typeof makeId<K>>;
}

export const idsFrom = (clock: Clock): Ids => ({
  make: (kind) => makeId(kind, { now: clock.now().getTime(), random: (bytes) => crypto.getRandomValues(bytes) }),
});

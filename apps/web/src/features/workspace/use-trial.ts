import type { ChangeSet } from "@cleatwork/contracts";
import type { TrialOutcome } from "@cleatwork/layout";
import { useEffect, useState } from "react";
import { useWorkspace } from "./workspace-context.ts";

/**
 * What each edit would do to the project, were it made now: change of required pressure, metal, hours and price, findings
 * that go and come. In the order of the edits; null until it is computed. The sets must stay the same objects between two
 * renderings (useMemo), or they are tried again.
 */
export function useTrial(sets: readonly ChangeSet[]): readonly (TrialOutcome | null)[] {
  const { trials, documents } = useWorkspace();
  const [, setTold] = useState(0);
  useEffect(() => {
    const off = sets
      .filter((set) => trials.known(documents, set) === null)
      .map((set) => trials.ask(documents, set, () => setTold((count) => count + 1)));
    return () => {
      for (const callOff of off) callOff();
    };
  }, [sets, trials, documents]);
  return sets.map((set) => trials.known(documents, set));
}

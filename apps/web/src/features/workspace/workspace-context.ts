import type { Company, LayoutRecord, Project, SystemRecord, UnitSystem } from "@cleatwork/contracts";
import type { CompanyStandards, Solution, SolvedSegment } from "@cleatwork/calc";
import type { Layout, LayoutIndex, Numbers, PricingDocuments, TreeRow } from "@cleatwork/layout";
import { createContext, useContext } from "react";
import type { ApplyResult, LayoutState, LayoutStore } from "./core/layout-store.ts";
import type { TrialDesk } from "./core/trial-desk.ts";
import type { Selection } from "./use-selection.ts";

/** Everything a step of a project works with. */
export interface Workspace {
  readonly project: Project;
  readonly company: Company;
  readonly units: UnitSystem;
  readonly store: LayoutStore;
  readonly state: LayoutState;
  readonly layout: Layout;
  readonly index: LayoutIndex;
  readonly systems: readonly SystemRecord[];
  /** The segments of a system, from the equipment outward, with their numbers. */
  readonly rowsOf: (systemId: string) => readonly TreeRow[];
  readonly numberOf: (segmentId: string) => string;
  /** What the numbers are made from, as it is now. */
  readonly documents: PricingDocuments;
  /** Where edits are tried before they are made; read through `useTrial`. */
  readonly trials: TrialDesk;
  /** Null until the first are computed. */
  readonly numbers: Numbers | null;
  readonly solutionOf: (systemId: string) => Solution | null;
  readonly solvedOf: (segmentId: string) => SolvedSegment | null;
  /** The company's own schedules, in force today. */
  readonly standards: CompanyStandards;
  readonly selection: Selection;
  readonly mayEdit: boolean;
  /** Runs a command and says why when it cannot be. */
  readonly run: (command: Parameters<LayoutStore["run"]>[0]) => ApplyResult;
  readonly undo: () => void;
  readonly redo: () => void;
  readonly record: (id: string | null) => LayoutRecord | null;
}

export const WorkspaceContext = createContext<Workspace | null>(null);

export function useWorkspace(): Workspace {
  const workspace = useContext(WorkspaceContext);
  if (!workspace) throw new Error("useWorkspace is used outside of a project");
  return workspace;
}

/**
 * A tool is a small state machine: it takes an event and the world as it is, and answers with its next state and with
 * what it wants done. It touches neither the document nor the screen.
 */
import type { PlanPoint, ScreenPoint } from "../core/camera.ts";
import type { Hit } from "../core/hit-test.ts";
import type { Snap } from "../core/snapping.ts";

export interface PointerInput {
  readonly plan: PlanPoint;
  readonly screen: ScreenPoint;
  readonly hit: Hit | null;
  readonly shift: boolean;
}

export type BoardEvent =
  | ({ readonly type: "pointer-down" } & PointerInput)
  | ({ readonly type: "pointer-move" } & PointerInput)
  | ({ readonly type: "pointer-up" } & PointerInput)
  | { readonly type: "key"; readonly key: string }
  /** The document took what the tool asked for, and the run now ends at this node. */
  | { readonly type: "placed"; readonly nodeId: string; readonly at: PlanPoint }
  | { readonly type: "cancel" };

/** Where a run may start: at a node, or on a duct, where it becomes a tap. */
export type Anchor =
  | { readonly kind: "node"; readonly nodeId: string; readonly at: PlanPoint }
  | { readonly kind: "duct"; readonly segmentId: string; readonly share: number; readonly at: PlanPoint };

/** What is typed while a run is drawn; empty means as pointed, or left to sizing. */
export interface RunDraft {
  readonly length: string;
  readonly size: string;
  readonly airflow: string;
}

export type Intent =
  | { readonly kind: "hover"; readonly hit: Hit | null }
  | { readonly kind: "select"; readonly hit: Hit | null; readonly add: boolean }
  | { readonly kind: "move-node"; readonly nodeId: string; readonly to: PlanPoint }
  | { readonly kind: "place-run"; readonly anchor: Anchor; readonly to: Snap; readonly draft: RunDraft }
  | { readonly kind: "place-equipment"; readonly at: PlanPoint }
  | { readonly kind: "set-outlet"; readonly nodeId: string }
  | { readonly kind: "say"; readonly message: string }
  | { readonly kind: "leave-tool" };

export interface World {
  /** Snaps a pointer; `anchor` is where a run starts, `ignoreNodeId` what is being dragged. */
  readonly snap: (pointer: PlanPoint, options: { anchor: PlanPoint | null; ignoreNodeId: string | null }) => Snap;
  readonly nodeAt: (nodeId: string) => PlanPoint | null;
}

export interface Step<State> {
  readonly state: State;
  readonly intents: readonly Intent[];
}

export const stay = <State>(state: State, ...intents: Intent[]): Step<State> => ({ state, intents });

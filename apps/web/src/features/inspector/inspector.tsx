import { useWorkspace } from "../workspace/index.ts";
import { NodeInspector } from "./node-inspector.tsx";
import { SegmentInspector } from "./segment-inspector.tsx";

/** What is chosen: its fields, where each came from, and what the air does in it. */
export function Inspector() {
  const { selection, record } = useWorkspace();
  const records = [...selection.ids].flatMap((id) => record(id) ?? []);
  const segments = records.filter((each) => each.kind === "segment");
  const nodes = records.filter((each) => each.kind === "node");
  return (
    <aside
      aria-label="Inspector"
      className="w-72 shrink-0 overflow-y-auto border-l border-line-strong bg-sheet max-lg:hidden"
    >
      {segments.length > 0 ? (
        <SegmentInspector key={segments.map(({ id }) => id).join()} segments={segments} />
      ) : nodes.length > 0 ? (
        <NodeInspector key={nodes.map(({ id }) => id).join()} nodes={nodes} />
      ) : (
        <p className="p-4 text-ink-3">Choose a duct or a node to see and change it. Shift adds to what is chosen.</p>
      )}
    </aside>
  );
}

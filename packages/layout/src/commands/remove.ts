/** Takes ducts out, with what hangs on them. */
import type { SegmentRecord } from "@cleatwork/contracts";
import type { Layout } from "../layout.ts";
import { indexOf, subtreeOf, type LayoutIndex } from "../layout-index.ts";
import { changed, changeSet, need, refuse, removed, type CommandResult } from "./command.ts";
import { farNodes } from "./move.ts";

/** The segments, everything that hangs on them, and the nodes that are left alone. */
export function removeBranches(
  layout: Layout,
  input: { segmentIds: readonly string[] },
  index: LayoutIndex = indexOf(layout),
): CommandResult {
  const segments = new Map<string, ReturnType<typeof removed>>();
  const nodes = new Map<string, ReturnType<typeof removed>>();
  for (const id of input.segmentIds) {
    if (segments.has(id)) continue;
    const root = need(layout, "segment", id);
    if (!root.ok) return root;
    for (const segment of subtreeOf(index, root.value)) segments.set(segment.id, removed(segment));
    for (const node of farNodes(layout, index, root.value)) nodes.set(node.id, removed(node));
  }
  const count = segments.size;
  return changeSet(count === 1 ? "Remove duct" : `Remove ${count} ducts`, [...segments.values(), ...nodes.values()]);
}

/** Takes a joint out of a run: the two ducts become the first, as long as both. */
export function joinAtNode(
  layout: Layout,
  input: { nodeId: string },
  index: LayoutIndex = indexOf(layout),
): CommandResult {
  const node = need(layout, "node", input.nodeId);
  if (!node.ok) return node;
  const before = index.parentOf.get(node.value.id);
  const [after, ...others] = index.childrenOf.get(node.value.id) ?? [];
  if (!before || !after || others.length > 0)
    return refuse(
      "root-is-taken",
      "Only a joint with one duct before and one after it can be taken out.",
      node.value.id,
    );
  const length =
    before.length_m !== null && after.length_m !== null
      ? ((before.length_m + after.length_m) as typeof before.length_m)
      : null;
  return changeSet("Take joint out", [
    changed(before, { ...before, ...endOf(after), toNodeId: after.toNodeId, length_m: length }),
    removed(after),
    removed(node.value),
  ]);
}

/** How a duct ends at its outlet, where it says so. */
const endOf = ({ mouth }: SegmentRecord): Pick<SegmentRecord, "mouth"> => (mouth ? { mouth } : {});

/** Where each segment goes in the building: its length and its direction away from the equipment. */
import type { AirSystem } from "../air-system.ts";
import { problem, nodeSubject, segmentSubject } from "./problems.ts";
import { ranges } from "./ranges.table.ts";
import type { SystemProblem } from "./solution.ts";
import { NONE, type Tree } from "./tree.ts";

export interface Course {
  readonly length: Float64Array;
  /** Unit vector of segment s at 3s: along x, along y, up. Zero where the nodes stand on one point. */
  readonly direction: Float64Array;
}

export function layCourse(system: AirSystem, tree: Tree, problems: SystemProblem[]): Course {
  const { nodes, segments } = system;
  const height = heights(system, problems);
  const length = new Float64Array(segments.length);
  const direction = new Float64Array(3 * segments.length);

  for (let s = 0; s < segments.length; s++) {
    const segment = segments[s]!;
    const tail = tree.from[s]!;
    const head = tree.to[s]!;
    if (tail === NONE || head === NONE || tail === head) continue;
    const dx = nodes[head]!.x_m - nodes[tail]!.x_m;
    const dy = nodes[head]!.y_m - nodes[tail]!.y_m;
    const dz = height[head]! - height[tail]!;
    const distance = Math.sqrt(dx * dx + dy * dy + dz * dz);
    if (distance > 0) {
      direction[3 * s] = dx / distance;
      direction[3 * s + 1] = dy / distance;
      direction[3 * s + 2] = dz / distance;
    }
    if (segment.length_m !== null) length[s] = segment.length_m;
    else if (distance > 0 && distance <= ranges.length.to) length[s] = distance;
    else {
      const limit = `${ranges.length.words}; its nodes are ${distance} m apart`;
      problems.push(problem("length-not-positive", segmentSubject(segment), "length_m", distance, limit));
    }
  }
  return { length, direction };
}

/** Elevation of each node above the building's zero: of its level, and above it. */
function heights({ nodes, levels }: AirSystem, problems: SystemProblem[]): Float64Array {
  const elevationOf = new Map(levels.map((level) => [level.id, level.elevation_m]));
  const height = new Float64Array(nodes.length);
  let levelId: string | null = null;
  let elevation = 0;
  for (let n = 0; n < nodes.length; n++) {
    const node = nodes[n]!;
    // Nodes of one level mostly follow one another.
    if (node.levelId !== levelId) {
      const found = elevationOf.get(node.levelId);
      if (found === undefined) {
        problems.push(
          problem("value-out-of-range", nodeSubject(node), "levelId", node.levelId, "a level of this system"),
        );
        continue;
      }
      levelId = node.levelId;
      elevation = found;
    }
    height[n] = elevation + node.elevation_m;
  }
  return height;
}

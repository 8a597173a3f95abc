export type { Section } from "@cleatwork/calc";
export type {
  LayoutRecord,
  NodeId,
  NodeRecord,
  RecordId,
  SegmentId,
  SegmentRecord,
  SystemId,
} from "@cleatwork/contracts";

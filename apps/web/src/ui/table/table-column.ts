import type { ReactNode } from "react";

export interface TableColumn<Row> {
  readonly id: string;
  readonly head: string;
  /** What sorting, finding and the CSV go by; null is last and empty. */
  readonly value: (row: Row) => string | number | null;
  /** What is shown; without it, the value. */
  readonly cell?: (row: Row) => ReactNode;
  readonly align?: "right";
  /** Heading and value in the CSV, where they differ: a unit belongs in the heading there. */
  readonly csv?: { readonly head: string; readonly value: (row: Row) => string | number | null };
  readonly className?: string;
}

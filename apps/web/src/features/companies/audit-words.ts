import type { endpoints, ResponseOf } from "@cleatwork/contracts";

export type AuditItem = ResponseOf<typeof endpoints.listAudit>["items"][number];

/** `price-item.changed` as words: "price item changed". */
export const eventWords = (event: string): string => event.replace(/[._-]+/g, " ");

/** The kind of thing it is about, for narrowing: `quote.issued` is about a quote. */
export const eventSubject = (event: string): string => event.split(".")[0]?.replace(/[_-]+/g, " ") ?? event;

/** What changed, as `role: foreman → owner`; anything else as `name: value`. */
export function detailLines(details: Readonly<Record<string, unknown>>): readonly string[] {
  return Object.entries(details).map(([key, value]) => {
    const name = key
      .replace(/_(m|pa|m3s|kg|k|bp|minor|micro)$/, "")
      .replace(/([a-z])([A-Z])/g, "$1 $2")
      .toLowerCase();
    if (isChange(value)) return `${name}: ${plain(value.before)} → ${plain(value.after)}`;
    return `${name}: ${plain(value)}`;
  });
}

const isChange = (value: unknown): value is { before: unknown; after: unknown } =>
  typeof value === "object" && value !== null && "before" in value && "after" in value;

function plain(value: unknown): string {
  if (value === null || value === undefined || value === "") return "nothing";
  if (typeof value === "string") return value;
  if (typeof value === "number" || typeof value === "boolean") return String(value);
  return JSON.stringify(value);
}

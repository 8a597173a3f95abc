import type { endpoints, ResponseOf } from "@cleatwork/contracts";
import { moneyText, unitPriceText } from "../../lib/format/money.ts";
import { percentText } from "../../lib/format/percent.ts";

export type AuditItem = ResponseOf<typeof endpoints.listAudit>["items"][number];

/** `price-item.changed` as words: "price item changed". */
export const eventWords = (event: string): string => event.replace(/[._-]+/g, " ");

/** The kind of thing it is about, for narrowing: `quote.issued` is about a quote. */
export const eventSubject = (event: string): string => event.split(".")[0]?.replace(/[_-]+/g, " ") ?? event;

/** What it was about, a line each: `tax: 7 % → 7.5 %`, `added: Scissor lift, 19 ft`. Ids and hashes say nothing to people. */
export function detailLines(details: Readonly<Record<string, unknown>>, currency: string): readonly string[] {
  return Object.entries(details).flatMap(([key, value]) => {
    if (isChange(value)) return changeLine(key, value, currency);
    const text = words(key, value, currency);
    return text === null ? [] : [`${nameOf(key)}: ${text}`];
  });
}

function changeLine(key: string, { old: before, new: after }: Change, currency: string): readonly string[] {
  const was = words(key, before, currency);
  const is = words(key, after, currency);
  // A thing in a list is named by itself; its key is an id.
  const listed = key.includes(".") ? (titleOf(after) ?? titleOf(before)) : null;
  if (listed !== null && isNothing(before)) return [`added: ${is ?? listed}`];
  if (listed !== null && isNothing(after)) return [`taken out: ${was ?? listed}`];
  if (was === is) return [];
  return [`${nameOf(key)}: ${was ?? "nothing"} → ${is ?? "nothing"}`];
}

interface Change {
  readonly old: unknown;
  readonly new: unknown;
}
const isRecord = (value: unknown): value is Readonly<Record<string, unknown>> =>
  typeof value === "object" && value !== null && !Array.isArray(value);
const isChange = (value: unknown): value is Change & Readonly<Record<string, unknown>> =>
  isRecord(value) && "old" in value && "new" in value;
const isNothing = (value: unknown) => value === null || value === undefined || value === "";

const UNITS = /_(m|pa|m3s|kg|k|bp|minor|micro)$/;

const nameOf = (key: string): string =>
  key
    .replace(UNITS, "")
    .replace(/[._]/g, " ")
    .replace(/([a-z])([A-Z])/g, "$1 $2")
    .toLowerCase();

function titleOf(value: unknown): string | null {
  if (!isRecord(value)) return null;
  const title = value.description ?? value.name ?? value.label ?? value.email;
  return typeof title === "string" ? title : null;
}

/** A value as people say it; null when it would tell them nothing. */
function words(key: string, value: unknown, currency: string): string | null {
  if (isNothing(value)) return null;
  if (typeof value === "number") {
    if (key.endsWith("_minor")) return moneyText(value, currency);
    if (key.endsWith("_micro")) return unitPriceText(value, currency);
    if (key.endsWith("_bp")) return percentText(value);
    return String(value);
  }
  if (typeof value === "boolean") return value ? "yes" : "no";
  if (typeof value === "string") return /^([a-z]{3}_[0-9a-z]{26}|[0-9a-f]{64})$/.test(value) ? null : value;
  if (Array.isArray(value)) {
    const parts = value.map((one) => words(key, one, currency)).filter((one) => one !== null);
    return parts.length > 0 ? parts.join(", ") : null;
  }
  if (!isRecord(value)) return null;
  const title = titleOf(value);
  const rest = Object.entries(value).flatMap(([inner, one]) => {
    if (one === title || inner === "id" || inner === "key") return [];
    const text = words(inner, one, currency);
    return text === null ? [] : [`${nameOf(inner)} ${text}`];
  });
  return [title, rest.length > 0 && title ? `(${rest.join(", ")})` : rest.join(", ")].filter(Boolean).join(" ") || null;
}

/** Pure decisions about people, links and names. */
import type { Role } from "@cleatwork/contracts";

const HOUR_MS = 3600_000;
export const TOKEN_LASTS_MS = { verify: 7 * 24 * HOUR_MS, reset: 2 * HOUR_MS, invitation: 14 * 24 * HOUR_MS } as const;

export const expiry = (now: Date, kind: keyof typeof TOKEN_LASTS_MS): Date =>
  new Date(now.getTime() + TOKEN_LASTS_MS[kind]);

/** "Tallgrass Sheet Metal, Inc." → "tallgrass-sheet-metal-inc"; numbered when another company has the name. */
export function slugFrom(companyName: string, attempt: number): string {
  const base =
    companyName
      .normalize("NFKD")
      .replace(/\p{Mark}+/gu, "")
      .toLowerCase()
      .replace(/[^a-z0-9]+/g, "-")
      .slice(0, 40)
      .replace(/^-+|-+$/g, "") || "company";
  return attempt === 1 ? base : `${base}-${attempt}`;
}

export type Removal = { readonly allowed: true } | { readonly allowed: false; readonly reason: "last-owner" };

/** A company keeps at least one owner, or no one could ever invite, price or pay again. */
export const mayStopBeing = (role: Role, ownerCount: number): Removal =>
  role === "owner" && ownerCount <= 1 ? { allowed: false, reason: "last-owner" } : { allowed: true };

export function invitationState(
  invitation: { expiresAt: Date; acceptedAt: Date | null; revokedAt: Date | null },
  now: Date,
): "open" | "accepted" | "revoked" | "expired" {
  if (invitation.acceptedAt) return "accepted";
  if (invitation.revokedAt) return "revoked";
  return invitation.expiresAt <= now ? "expired" : "open";
}

import { describe, expect, it } from "vitest";
import { invitationState, mayStopBeing, slugFrom } from "./people.rules.ts";

describe("slug", () => {
  it("is the company's name as an address can hold it", () => {
    expect(slugFrom("Tallgrass Sheet Metal, Inc.", 1)).toBe("tallgrass-sheet-metal-inc");
    expect(slugFrom("Ångström Lüftung", 2)).toBe("angstrom-luftung-2");
  });

  it("is never empty", () => {
    expect(slugFrom("風", 1)).toBe("company");
  });
});

describe("owners", () => {
  it("never number zero", () => {
    expect(mayStopBeing("owner", 1)).toEqual({ allowed: false, reason: "last-owner" });
    expect(mayStopBeing("owner", 2)).toEqual({ allowed: true });
    expect(mayStopBeing("foreman", 1)).toEqual({ allowed: true });
  });
});

describe("invitation", () => {
  const now = new Date("2026-12-01T12:00:00Z");
  const open = { expiresAt: new Date("2026-12-02T12:00:00Z"), acceptedAt: null, revokedAt: null };

  it("ends at its hour", () => {
    expect(invitationState(open, now)).toBe("open");
    expect(invitationState({ ...open, expiresAt: now }, now)).toBe("expired");
  });

  it("is used once", () => {
    expect(invitationState({ ...open, acceptedAt: now }, now)).toBe("accepted");
  });
});

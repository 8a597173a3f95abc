import * as fc from "fast-check";
import { describe, expect, it } from "vitest";
import { canonicalJson } from "./canonical-json.ts";
import { dayIn, isExpired, mayIssue, mayRespond, NEXT_STATES, stateAt, validUntil } from "./quotes.rules.ts";

const zone = "America/Chicago";

describe("validity", () => {
  it("counts days where the company is, over a change of clocks too", () => {
    expect(validUntil(new Date("2026-10-20T02:00:00Z"), 30, zone)).toBe("2026-11-18");
  });

  it("lasts through the whole of its last day there", () => {
    expect(isExpired("2026-12-01", zone, new Date("2026-12-02T05:59:00Z"))).toBe(false);
    expect(isExpired("2026-12-01", zone, new Date("2026-12-02T06:01:00Z"))).toBe(true);
    expect(dayIn(zone, new Date("2026-12-02T05:59:00Z"))).toBe("2026-12-01");
  });
});

describe("answers", () => {
  const now = new Date("2026-12-01T18:00:00Z");
  const open = { state: "issued", validUntilOn: "2026-12-15", snapshotHash: "a" } as const;

  it("are taken while the quote is open", () => {
    expect(mayRespond(open, "a", zone, now)).toEqual({ allowed: true });
  });

  it("are refused for another snapshot than the client saw", () => {
    expect(mayRespond(open, "b", zone, now)).toEqual({ allowed: false, reason: "other-snapshot" });
  });

  it.each(["superseded", "accepted", "declined", "withdrawn"] as const)("are refused once it is %s", (state) => {
    expect(mayRespond({ ...open, state }, "a", zone, now)).toEqual({ allowed: false, reason: state });
  });

  it("are refused once it has expired, unless it was answered before", () => {
    const late = new Date("2027-01-05T18:00:00Z");
    expect(stateAt(open, zone, late)).toBe("expired");
    expect(stateAt({ ...open, state: "accepted" }, zone, late)).toBe("accepted");
  });

  it("end a revision for good", () => {
    expect(NEXT_STATES.accepted).toEqual([]);
    expect(NEXT_STATES.withdrawn).toEqual([]);
  });
});

describe("issuing", () => {
  const facts = {
    emailVerified: true,
    seen: { layoutSequence: 7, price_minor: 100 },
    now: { layoutSequence: 7, price_minor: 100, problems: [], stops: [] },
  };

  it("sends what the estimator saw and nothing else", () => {
    expect(mayIssue(facts)).toEqual({ allowed: true });
    expect(mayIssue({ ...facts, now: { ...facts.now, layoutSequence: 8 } })).toMatchObject({ reason: "layout-moved" });
    expect(mayIssue({ ...facts, now: { ...facts.now, price_minor: 101 } })).toMatchObject({ reason: "price-differs" });
  });

  it("waits for a confirmed address, a sound layout and every price", () => {
    expect(mayIssue({ ...facts, emailVerified: false })).toMatchObject({ reason: "email-unverified" });
    expect(
      mayIssue({ ...facts, now: { ...facts.now, price_minor: null, problems: ["D-1 has no airflow"] } }),
    ).toMatchObject({
      reason: "cannot-be-computed",
    });
    expect(mayIssue({ ...facts, now: { ...facts.now, stops: ["no price for liner"] } })).toMatchObject({
      reason: "price-missing",
    });
  });
});

describe("canonical JSON", () => {
  it("does not depend on the order in which members were set", () => {
    fc.assert(
      fc.property(fc.dictionary(fc.string(), fc.jsonValue()), (value) => {
        const turned = Object.fromEntries(Object.entries(value).reverse());
        expect(canonicalJson(turned)).toBe(canonicalJson(value));
        expect(JSON.parse(canonicalJson(value))).toEqual(JSON.parse(JSON.stringify(value)));
      }),
    );
  });

  // RFC 8785, section 3.2.3: members in the order of their UTF-16 code units.
  it("sorts as RFC 8785 prints it", () => {
    const value = {
      "\u20ac": "Euro Sign",
      "\r": "Carriage Return",
      "\ufb33": "Hebrew",
      "1": "One",
      "\u0080": "Control",
      "\u00f6": "o",
    };
    expect(Object.values(JSON.parse(canonicalJson(value)) as object)).toEqual([
      "One",
      "Carriage Return",
      "Control",
      "o",
      "Euro Sign",
      "Hebrew",
    ]);
  });

  it("holds no number that JSON cannot", () => {
    expect(() => canonicalJson({ a: Number.NaN })).toThrow("finite");
  });
});

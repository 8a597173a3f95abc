import { describe, expect, it } from "vitest";
import { detailLines, eventSubject, eventWords } from "./audit-words.ts";

describe("an audit entry in words", () => {
  it("says a changed rate with its unit", () => {
    expect(detailLines({ "rates.tax_bp": { old: 700, new: 750 } }, "USD")).toEqual(["rates tax: 7 % → 7.5 %"]);
  });
  it("names a thing that was added by its description", () => {
    const lift = { id: "x", description: "Scissor lift", quantity: 1, unitPrice_micro: 640_000_000 };
    expect(detailLines({ "adds.x": { old: null, new: lift } }, "USD")).toEqual([
      "added: Scissor lift (quantity 1, unit price $640.00)",
    ]);
  });
  it("names a thing that was taken out", () => {
    expect(detailLines({ "adds.x": { old: { description: "Crane day" }, new: null } }, "USD")).toEqual([
      "taken out: Crane day",
    ]);
  });
  it("keeps money exact to the cent", () => {
    expect(detailLines({ price_minor: 823_257 }, "USD")).toEqual(["price: $8,232.57"]);
  });
  it("leaves out hashes and ids, which tell a person nothing", () => {
    expect(detailLines({ snapshotHash: "a".repeat(64), projectId: "prj_01m8rr0g388e6gqf15fagw4tj9" }, "USD")).toEqual(
      [],
    );
  });
  it("says an event and what it is about", () => {
    expect(eventWords("price-item.changed")).toBe("price item changed");
    expect(eventSubject("price-item.changed")).toBe("price item");
  });
});

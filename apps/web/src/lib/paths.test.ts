import { describe, expect, it } from "vitest";
import { linkToken } from "./link-token.ts";
import { ownPath } from "./paths.ts";

describe("where to go after signing in", () => {
  it("is the page that was asked for", () => {
    expect(ownPath("/c/tallgrass/clients?x=1")).toBe("/c/tallgrass/clients?x=1");
  });
  it.each(["https://elsewhere.example", "//elsewhere.example", "/\\elsewhere.example", "javascript:1", "", null])(
    "is never %s",
    (wanted) => expect(ownPath(wanted)).toBeNull(),
  );
});

describe("the token of a mailed link", () => {
  const token = "a".repeat(43);
  it.each([
    { search: `?token=${token}`, hash: "" },
    { search: "", hash: `#token=${token}` },
    { search: "", hash: `#${token}` },
  ])("is found in $search$hash", (location) => expect(linkToken(location)).toBe(token));
  it("is empty where the link was cut", () => expect(linkToken({ search: "", hash: "" })).toBe(""));
});

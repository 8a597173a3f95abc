import { describe, expect, it, vi } from "vitest";
import { match, pressOf } from "./keys.ts";
import { registerActions, allActions, type Action } from "./registry.ts";
import { searchActions } from "./search.ts";

const action = (id: string, label: string, keys?: string): Action => ({
  id,
  label,
  group: "Go to",
  run: () => undefined,
  ...(keys ? { keys } : {}),
});
const press = (key: string, held: Partial<Record<"ctrlKey" | "metaKey" | "altKey" | "shiftKey", boolean>> = {}) =>
  pressOf({ key, ctrlKey: false, metaKey: false, altKey: false, shiftKey: false, ...held });

describe("keys", () => {
  it("takes Ctrl and ⌘ for the same", () => {
    expect(press("k", { ctrlKey: true })).toBe("mod k");
    expect(press("k", { metaKey: true })).toBe("mod k");
  });
  it("writes a shifted sign as the sign that it makes", () => expect(press("?", { shiftKey: true })).toBe("?"));
  it("keeps shift where the key has a name", () => expect(press("Enter", { shiftKey: true })).toBe("shift enter"));

  const places = [
    action("p", "Projects", "g p"),
    action("find", "Find", "mod k"),
    action("old", "Old", "n"),
    action("new", "New", "n"),
  ];
  it("waits for the second key of a sequence", () => {
    expect(match(places, "", "g")).toBe("begins");
    expect(match(places, "g", "p")).toMatchObject({ id: "p" });
    expect(match(places, "g", "x")).toBeNull();
  });
  it("does not take a held key for the beginning of a sequence", () => expect(match(places, "", "mod")).toBeNull());
  it("prefers the action that was offered last", () => expect(match(places, "", "n")).toMatchObject({ id: "new" }));
});

describe("the palette", () => {
  const all = [action("a", "Company settings"), action("b", "Switch to Setter Ducts"), action("c", "Projects")];
  it("finds by the beginnings of words, the closest first", () => {
    expect(searchActions(all, "set").map(({ id }) => id)).toEqual(["a", "b"]);
    expect(searchActions([...all, action("d", "Set the scale")], "set").map(({ id }) => id)[0]).toBe("d");
  });
  it("wants every word", () => expect(searchActions(all, "set duct").map(({ id }) => id)).toEqual(["b"]));
  it("shows everything while nothing is typed", () => expect(searchActions(all, " ")).toHaveLength(3));
});

describe("the registry", () => {
  it("forgets what a screen offered when it is left", () => {
    const run = vi.fn();
    const before = allActions().length;
    const leave = registerActions([{ ...action("x", "Here only"), run }]);
    expect(allActions()).toHaveLength(before + 1);
    leave();
    expect(allActions()).toHaveLength(before);
  });
});

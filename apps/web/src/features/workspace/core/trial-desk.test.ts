import type { ChangeSet } from "@cleatwork/contracts";
import type { PricingDocuments, TrialOutcome } from "@cleatwork/layout";
import { describe, expect, it, vi } from "vitest";
import type { TrialAnswer, TrialRequest } from "../trial.worker.ts";
import { TrialDesk, type TrialWorker } from "./trial-desk.ts";

const setNamed = (label: string): ChangeSet => ({ label, changes: [] });
const documentsOf = (pricedOn: string) => ({ pricedOn }) as unknown as PricingDocuments;
const outcomeOf = (reason: string): TrialOutcome => ({ ok: false, reason });

function aDesk() {
  const asked: TrialRequest[] = [];
  const terminated = vi.fn();
  const worker: TrialWorker = {
    onmessage: null,
    postMessage: (request) => void asked.push(request),
    terminate: () => void terminated(),
  };
  const answer = (reason: string) => {
    const last = asked.at(-1);
    if (last?.kind !== "try") throw new Error("nothing is being tried");
    worker.onmessage?.({ data: { ticket: last.ticket, outcome: outcomeOf(reason) } } as MessageEvent<TrialAnswer>);
  };
  const tried = () => asked.flatMap((each) => (each.kind === "try" ? [each.set.label] : []));
  return { desk: new TrialDesk(() => worker), asked, answer, tried, terminated };
}

describe("the trial desk", () => {
  const documents = documentsOf("today");
  const [a, b] = [setNamed("a"), setNamed("b")];

  it("tries one edit at a time and sends the documents once", () => {
    const { desk, asked, answer, tried } = aDesk();
    const told = vi.fn();
    desk.ask(documents, a, told);
    desk.ask(documents, b, told);
    expect(tried()).toEqual(["a"]);
    answer("of a");
    expect(told).toHaveBeenLastCalledWith(outcomeOf("of a"));
    expect(tried()).toEqual(["a", "b"]);
    answer("of b");
    expect(asked.filter(({ kind }) => kind === "documents")).toHaveLength(1);
    expect(desk.known(documents, b)).toEqual(outcomeOf("of b"));
  });

  it("does not try what was called off before its turn", () => {
    const { desk, answer, tried } = aDesk();
    desk.ask(documents, a, vi.fn());
    desk.ask(documents, b, vi.fn())();
    answer("of a");
    expect(tried()).toEqual(["a"]);
  });

  it("asks again on new documents what was computed on old ones", () => {
    const { desk, answer, tried } = aDesk();
    const told = vi.fn();
    const edited = documentsOf("after an edit");
    desk.ask(documents, a, vi.fn())();
    desk.ask(edited, a, told);
    answer("of the old");
    expect(told).not.toHaveBeenCalled();
    expect(tried()).toEqual(["a", "a"]);
    answer("of the new");
    expect(told).toHaveBeenCalledExactlyOnceWith(outcomeOf("of the new"));
    expect(desk.known(documents, a)).toBeNull();
    expect(desk.known(edited, a)).toEqual(outcomeOf("of the new"));
  });

  it("works on after it was closed", () => {
    const { desk, terminated, tried } = aDesk();
    desk.ask(documents, a, vi.fn());
    desk.close();
    expect(terminated).toHaveBeenCalledOnce();
    desk.ask(documents, b, vi.fn());
    expect(tried()).toEqual(["a", "b"]);
  });
});

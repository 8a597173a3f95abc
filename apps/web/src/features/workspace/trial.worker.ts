/** Tries edits away from the screen, and away from the numbers that every edit waits for. */
import type { ChangeSet } from "@cleatwork/contracts";
import { createTrial, type PricingDocuments, type Trial, type TrialOutcome } from "@cleatwork/layout";

export type TrialRequest =
  | { readonly kind: "documents"; readonly documents: PricingDocuments }
  | { readonly kind: "try"; readonly ticket: number; readonly set: ChangeSet };
export interface TrialAnswer {
  readonly ticket: number;
  readonly outcome: TrialOutcome;
}

let documents: PricingDocuments | null = null;
let trial: Trial | null = null;

self.onmessage = ({ data }: MessageEvent<TrialRequest>) => {
  if (data.kind === "documents") {
    documents = data.documents;
    trial = null;
    return;
  }
  if (!documents) throw new Error("an edit is tried before the documents are there");
  trial ??= createTrial(documents);
  const answer: TrialAnswer = { ticket: data.ticket, outcome: trial.of(data.set) };
  self.postMessage(answer);
};

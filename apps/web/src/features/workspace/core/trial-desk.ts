/**
 * Hands edits to the worker that tries them, one at a time, and keeps every outcome for as long as the documents stay.
 * One at a time, so that what is no longer asked for is dropped before it costs anything. No React here.
 */
import type { ChangeSet } from "@cleatwork/contracts";
import type { PricingDocuments, TrialOutcome } from "@cleatwork/layout";
import type { TrialAnswer, TrialRequest } from "../trial.worker.ts";

export interface TrialWorker {
  postMessage(request: TrialRequest): void;
  onmessage: ((event: MessageEvent<TrialAnswer>) => void) | null;
  terminate(): void;
}

interface Wanted {
  readonly set: ChangeSet;
  readonly tell: (outcome: TrialOutcome) => void;
}

export class TrialDesk {
  private worker: TrialWorker | null = null;
  private documents: PricingDocuments | null = null;
  private sent: PricingDocuments | null = null;
  private outcomes = new Map<ChangeSet, TrialOutcome>();
  private readonly wanted = new Set<Wanted>();
  private running: { readonly ticket: number; readonly set: ChangeSet; readonly documents: PricingDocuments } | null =
    null;
  private tickets = 0;

  constructor(private readonly hire: () => TrialWorker) {}

  known(documents: PricingDocuments, set: ChangeSet): TrialOutcome | null {
    return documents === this.documents ? (this.outcomes.get(set) ?? null) : null;
  }

  /**
   * Tells the outcome when it is there; the answer calls the question off. With other documents than before, what was found
   * out on the earlier ones is forgotten.
   */
  ask(documents: PricingDocuments, set: ChangeSet, tell: (outcome: TrialOutcome) => void): () => void {
    if (documents !== this.documents) {
      this.documents = documents;
      this.outcomes = new Map();
    }
    const wanted = { set, tell };
    this.wanted.add(wanted);
    this.next();
    return () => this.wanted.delete(wanted);
  }

  close(): void {
    this.worker?.terminate();
    this.worker = null;
    this.sent = null;
    this.running = null;
    this.wanted.clear();
  }

  private next(): void {
    const [first] = this.wanted;
    const { documents } = this;
    if (this.running || !first || !documents) return;
    this.worker ??= this.hireOne();
    if (this.sent !== documents) {
      this.worker.postMessage({ kind: "documents", documents });
      this.sent = documents;
    }
    this.running = { ticket: ++this.tickets, set: first.set, documents };
    this.worker.postMessage({ kind: "try", ticket: this.running.ticket, set: first.set });
  }

  private hireOne(): TrialWorker {
    const worker = this.hire();
    worker.onmessage = ({ data }) => this.take(data);
    return worker;
  }

  private take({ ticket, outcome }: TrialAnswer): void {
    const { running } = this;
    if (running?.ticket !== ticket) return;
    this.running = null;
    // What was computed on earlier documents is asked again on these.
    if (running.documents === this.documents) {
      this.outcomes.set(running.set, outcome);
      for (const wanted of [...this.wanted])
        if (wanted.set === running.set) {
          this.wanted.delete(wanted);
          wanted.tell(outcome);
        }
    }
    this.next();
  }
}

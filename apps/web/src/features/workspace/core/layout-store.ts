/**
 * The layout while someone works on it: applied at once, kept durably, sent in batches, undone and redone. No React here;
 * the screen subscribes.
 */
import type { ChangeSet, LayoutResponse, SaveLayoutRequest, SaveLayoutResponse } from "@cleatwork/contracts";
import { applyChangeSet, checkLayout, createLayout, invert, type CommandResult, type Layout } from "@cleatwork/layout";
import type { EditHistory, EditShelf, KeptBatch } from "./saved-edits.ts";

export type SaveState =
  | { readonly kind: "saved"; readonly at: Date | null }
  | { readonly kind: "saving"; readonly waiting: number }
  | { readonly kind: "offline"; readonly waiting: number };

export interface LayoutState {
  readonly layout: Layout;
  /** Of the server's log, as far as this browser has seen it. */
  readonly sequence: number;
  readonly save: SaveState;
  readonly undoLabel: string | null;
  readonly redoLabel: string | null;
  /** Edits that could not be kept, each with the reason; shown until dismissed. */
  readonly lost: readonly { readonly label: string; readonly reason: string }[];
}

/** What the server may say to a batch. */
export type SendResult =
  | { readonly kind: "taken"; readonly answer: SaveLayoutResponse }
  | { readonly kind: "unreachable" }
  /** Someone else changed the same records: what still fits is sent again. */
  | { readonly kind: "conflict" }
  /** The whole batch cannot be. */
  | { readonly kind: "refused"; readonly reason: string };

export interface LayoutStoreParts {
  readonly project: string;
  readonly shelf: EditShelf;
  readonly load: () => Promise<LayoutResponse>;
  readonly send: (request: SaveLayoutRequest) => Promise<SendResult>;
  readonly newBatchId: () => string;
  readonly now: () => Date;
  /** Runs a function later; answers how to call it off. */
  readonly later: (work: () => void, after_ms: number) => () => void;
}

/** Edits made within this time travel together. */
const GATHER_MS = 300;
const RETRY_MS = [1000, 2000, 5000, 10_000, 20_000];
const KEPT_UNDO_STEPS = 500;

export type ApplyResult = { readonly ok: true } | { readonly ok: false; readonly message: string };

export class LayoutStore {
  private state: LayoutState;
  private history: { undo: ChangeSet[]; redo: ChangeSet[] } = { undo: [], redo: [] };
  private batches: KeptBatch[] = [];
  /** The batch that edits are still added to; on the shelf from its first edit on. */
  private open: KeptBatch | null = null;
  private readonly listeners = new Set<() => void>();
  private callOff: (() => void) | null = null;
  private sending = false;
  private failures = 0;
  private order = 0;

  constructor(
    private readonly parts: LayoutStoreParts,
    start: LayoutResponse,
  ) {
    this.state = {
      layout: createLayout(start.records),
      sequence: start.sequence,
      save: { kind: "saved", at: null },
      undoLabel: null,
      redoLabel: null,
      lost: [],
    };
  }

  readonly getState = (): LayoutState => this.state;
  readonly subscribe = (listener: () => void): (() => void) => {
    this.listeners.add(listener);
    return () => this.listeners.delete(listener);
  };

  /** Takes up what an earlier visit left: unsent edits first, then the steps that can be undone. */
  async resume(): Promise<void> {
    const { shelf, project } = this.parts;
    const [batches, history] = await Promise.all([shelf.batches(project), shelf.history(project)]);
    this.order = batches.at(-1)?.order ?? 0;
    if (history) this.history = { undo: [...history.undo], redo: [...history.redo] };
    this.batches = [...batches];
    if (batches.length > 0) await this.flush();
    this.tell({});
  }

  /** Runs a command on the layout as it is now. */
  run(command: (layout: Layout) => CommandResult): ApplyResult {
    const result = command(this.state.layout);
    if (!result.ok) {
      const [first] = result.problems;
      return first?.code === "nothing-changes" ? { ok: true } : { ok: false, message: first?.message ?? "" };
    }
    return this.apply(result.value);
  }

  apply(set: ChangeSet): ApplyResult {
    const answer = this.take(set);
    if (!answer.ok) return answer;
    this.history.undo.push(set);
    this.history.redo = [];
    this.remember();
    return answer;
  }

  undo(): ApplyResult {
    return this.step("undo", "redo");
  }

  redo(): ApplyResult {
    return this.step("redo", "undo");
  }

  dismissLost(): void {
    this.tell({ lost: [] });
  }

  /** Sends what waits, now. */
  async flush(): Promise<void> {
    this.callOff?.();
    this.callOff = null;
    this.seal();
    if (this.sending) return;
    this.sending = true;
    try {
      for (let batch = this.batches[0]; batch; batch = this.batches[0]) {
        this.tell({ save: { kind: this.failures > 0 ? "offline" : "saving", waiting: this.waiting() } });
        if (!(await this.sendOne(batch))) return;
        this.seal();
      }
      this.tell({ save: { kind: "saved", at: this.parts.now() } });
    } finally {
      this.sending = false;
    }
  }

  stop(): void {
    this.callOff?.();
    this.listeners.clear();
  }

  private step(from: "undo" | "redo", to: "undo" | "redo"): ApplyResult {
    const set = this.history[from].pop();
    if (!set) return { ok: false, message: `There is nothing to ${from}.` };
    // Undo reads the set backwards; redo of an undone set reads it forwards again.
    const answer = this.take(from === "undo" ? invert(set) : set);
    if (!answer.ok) {
      this.history[from].push(set);
      return {
        ok: false,
        message: `Someone else has changed the same thing since, so it cannot be ${from === "undo" ? "undone" : "redone"}.`,
      };
    }
    this.history[to].push(set);
    this.remember();
    return answer;
  }

  private take(set: ChangeSet): ApplyResult {
    const applied = applyChangeSet(this.state.layout, set);
    if (!applied.ok) return { ok: false, message: "Someone else has changed the same thing meanwhile." };
    const unsound = checkLayout(applied.value)[0];
    if (unsound) return { ok: false, message: `${unsound.name}: needs ${unsound.message}.` };
    this.gather([set]);
    this.tell({
      layout: applied.value,
      save: { kind: this.failures > 0 ? "offline" : "saving", waiting: this.waiting() },
    });
    this.schedule(GATHER_MS);
    return { ok: true };
  }

  /** On the shelf before it goes anywhere else. */
  private gather(sets: readonly ChangeSet[]): void {
    this.open = this.open
      ? { ...this.open, sets: [...this.open.sets, ...sets] }
      : { batchId: this.parts.newBatchId(), project: this.parts.project, order: ++this.order, sets };
    void this.parts.shelf.put(this.open);
  }

  /** What was gathered is closed: its content and its id now belong together. */
  private seal(): void {
    if (!this.open) return;
    this.batches.push(this.open);
    this.open = null;
  }

  /** False when it must wait. */
  private async sendOne(batch: KeptBatch): Promise<boolean> {
    const sent = await this.parts.send({
      batchId: batch.batchId,
      baseSequence: this.state.sequence,
      sets: [...batch.sets],
    });
    if (sent.kind === "unreachable") {
      const wait = RETRY_MS[Math.min(this.failures, RETRY_MS.length - 1)] ?? 20_000;
      this.failures += 1;
      this.tell({ save: { kind: "offline", waiting: this.waiting() } });
      this.schedule(wait);
      return false;
    }
    this.failures = 0;
    if (sent.kind === "conflict") {
      await this.rebase([]);
      return true;
    }
    await this.drop(batch);
    if (sent.kind === "taken") {
      const { sequence, previousSequence } = sent.answer;
      const alone = previousSequence <= this.state.sequence;
      this.tell({ sequence: Math.max(sequence, this.state.sequence) });
      if (!alone) await this.rebase([]);
    } else await this.rebase(batch.sets.map(({ label }) => ({ label, reason: sent.reason })));
    return true;
  }

  /** Others have edited too: the server's layout, with every edit of ours that still fits on top. */
  private async rebase(lost: LayoutState["lost"]): Promise<void> {
    this.seal();
    const fresh = await this.parts.load();
    let layout = createLayout(fresh.records);
    const gone = [...lost];
    for (const batch of [...this.batches]) {
      const fitting = batch.sets.filter((set) => {
        const applied = applyChangeSet(layout, set);
        if (applied.ok) layout = applied.value;
        else gone.push({ label: set.label, reason: "someone else changed the same thing" });
        return applied.ok;
      });
      // A batch that was refused, or that changes, travels on under a new id.
      await this.drop(batch);
      if (fitting.length > 0) this.gather(fitting);
    }
    this.seal();
    this.tell({ layout, sequence: fresh.sequence, lost: [...this.state.lost, ...gone] });
  }

  private async drop(batch: KeptBatch): Promise<void> {
    this.batches = this.batches.filter(({ batchId }) => batchId !== batch.batchId);
    await this.parts.shelf.remove(batch.batchId);
  }

  private schedule(after_ms: number): void {
    if (this.callOff && after_ms <= GATHER_MS) return;
    this.callOff?.();
    this.callOff = this.parts.later(() => {
      this.callOff = null;
      void this.flush();
    }, after_ms);
  }

  private waiting(): number {
    return (this.open?.sets.length ?? 0) + this.batches.reduce((sum, { sets }) => sum + sets.length, 0);
  }

  private remember(): void {
    const history: EditHistory = {
      undo: this.history.undo.slice(-KEPT_UNDO_STEPS),
      redo: this.history.redo.slice(-KEPT_UNDO_STEPS),
    };
    void this.parts.shelf.keepHistory(this.parts.project, history);
    this.tell({});
  }

  private tell(changes: Partial<LayoutState>): void {
    this.state = {
      ...this.state,
      ...changes,
      undoLabel: this.history.undo.at(-1)?.label ?? null,
      redoLabel: this.history.redo.at(-1)?.label ?? null,
    };
    for (const listener of this.listeners) listener();
  }
}

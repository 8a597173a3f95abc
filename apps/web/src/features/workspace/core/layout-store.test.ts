import { meters } from "@cleatwork/calc";
import type { LayoutRecord, LevelId, SaveLayoutRequest } from "@cleatwork/contracts";
import { applyChangeSet, createLayout, find, setLevel } from "@cleatwork/layout";
import { describe, expect, it } from "vitest";
import { LayoutStore, type SendResult } from "./layout-store.ts";
import type { EditHistory, EditShelf, KeptBatch } from "./saved-edits.ts";

const id = (n: number) => `lvl_${String(n).padStart(26, "0")}` as LevelId;
const level = (n: number, name = `Level ${n}`): LayoutRecord => ({
  kind: "level",
  id: id(n),
  name,
  elevation_m: meters(0),
  underlay: null,
});

class MemoryShelf implements EditShelf {
  readonly kept = new Map<string, KeptBatch>();
  past: EditHistory | null = null;
  batches = () => Promise.resolve([...this.kept.values()].sort((a, b) => a.order - b.order));
  put = (batch: KeptBatch) => Promise.resolve(void this.kept.set(batch.batchId, batch));
  remove = (batchId: string) => Promise.resolve(void this.kept.delete(batchId));
  history = () => Promise.resolve(this.past);
  keepHistory = (_project: string, history: EditHistory) => Promise.resolve(void (this.past = history));
}

/** A server that keeps the log, as the real one does: a batch counts once, and must fit. */
class Server {
  layout = createLayout([level(1), level(2)]);
  sequence = 1;
  reachable = true;
  readonly seen = new Map<string, SendResult>();
  send = (request: SaveLayoutRequest): Promise<SendResult> => {
    if (!this.reachable) return Promise.resolve({ kind: "unreachable" });
    const before = this.seen.get(request.batchId);
    if (before) return Promise.resolve(before);
    let layout = this.layout;
    for (const set of request.sets) {
      const applied = applyChangeSet(layout, set);
      if (!applied.ok) return Promise.resolve({ kind: "conflict" });
      layout = applied.value;
    }
    const answer: SendResult = {
      kind: "taken",
      answer: { sequence: this.sequence + request.sets.length, previousSequence: this.sequence },
    };
    this.layout = layout;
    this.sequence += request.sets.length;
    this.seen.set(request.batchId, answer);
    return Promise.resolve(answer);
  };
  load = () => Promise.resolve({ sequence: this.sequence, records: [...this.layout.records.values()] });
  name = (n: number) => find(this.layout, "level", id(n))?.name;
}

function workOn(server: Server, shelf = new MemoryShelf()) {
  let count = 0;
  const store = new LayoutStore(
    {
      project: "prj",
      shelf,
      load: server.load,
      send: server.send,
      newBatchId: () => `batch-${shelf.kept.size}-${++count}-${Math.random()}`,
      now: () => new Date(0),
      later: () => () => {},
    },
    { sequence: server.sequence, records: [...server.layout.records.values()] },
  );
  const rename = (n: number, name: string) => store.run((layout) => setLevel(layout, { id: id(n), fields: { name } }));
  const name = (n: number) => find(store.getState().layout, "level", id(n))?.name;
  return { store, shelf, rename, name };
}

describe("edits", () => {
  it("show at once and are saved together", async () => {
    const server = new Server();
    const { store, rename, name } = workOn(server);
    rename(1, "Ground");
    rename(2, "Upper");
    expect(name(1)).toBe("Ground");
    expect(store.getState().save).toEqual({ kind: "saving", waiting: 2 });
    await store.flush();
    expect([server.name(1), server.name(2), server.seen.size]).toEqual(["Ground", "Upper", 1]);
    expect(store.getState().save.kind).toBe("saved");
  });

  it("wait on the shelf while the server cannot be reached, and arrive once", async () => {
    const server = new Server();
    server.reachable = false;
    const { store, shelf, rename } = workOn(server);
    rename(1, "Ground");
    await store.flush();
    expect(store.getState().save).toEqual({ kind: "offline", waiting: 1 });
    expect(shelf.kept.size).toBe(1);
    server.reachable = true;
    await store.flush();
    expect(server.name(1)).toBe("Ground");
    expect(shelf.kept.size).toBe(0);
  });

  it("are on the shelf before they are sent", () => {
    const { shelf, rename } = workOn(new Server());
    rename(1, "Ground");
    rename(2, "Upper");
    expect([...shelf.kept.values()].flatMap(({ sets }) => sets)).toHaveLength(2);
  });

  it("left by a visit that ended are sent by the next one, even if the server had taken them", async () => {
    const server = new Server();
    const shelf = new MemoryShelf();
    const first = workOn(server, shelf);
    server.reachable = false;
    first.rename(1, "Ground");
    await first.store.flush();
    const [batch] = await shelf.batches();
    server.reachable = true;
    await server.send({ batchId: batch?.batchId ?? "", baseSequence: 1, sets: [...(batch?.sets ?? [])] });
    const second = workOn(server, shelf);
    await second.store.resume();
    expect(server.name(1)).toBe("Ground");
    expect(server.sequence).toBe(2);
    expect(second.store.getState().lost).toEqual([]);
    expect(shelf.kept.size).toBe(0);
  });
});

describe("two people", () => {
  it("keep both edits when they touch different things", async () => {
    const server = new Server();
    const [mine, theirs] = [workOn(server), workOn(server)];
    theirs.rename(2, "Theirs");
    await theirs.store.flush();
    mine.rename(1, "Mine");
    await mine.store.flush();
    expect([server.name(1), server.name(2)]).toEqual(["Mine", "Theirs"]);
    expect([mine.name(1), mine.name(2)]).toEqual(["Mine", "Theirs"]);
  });

  it("see which edit was not kept when they touch the same thing", async () => {
    const server = new Server();
    const [mine, theirs] = [workOn(server), workOn(server)];
    theirs.rename(1, "Theirs");
    await theirs.store.flush();
    mine.rename(1, "Mine");
    mine.rename(2, "Also mine");
    await mine.store.flush();
    expect([mine.name(1), mine.name(2)]).toEqual(["Theirs", "Also mine"]);
    expect([server.name(1), server.name(2)]).toEqual(["Theirs", "Also mine"]);
    expect(mine.store.getState().lost).toEqual([
      { label: "Change Level 1", reason: "someone else changed the same thing" },
    ]);
  });
});

describe("undo", () => {
  it("goes back and forth, and is saved like any edit", async () => {
    const server = new Server();
    const { store, rename, name } = workOn(server);
    rename(1, "Ground");
    rename(1, "Street");
    store.undo();
    expect(name(1)).toBe("Ground");
    store.undo();
    expect(name(1)).toBe("Level 1");
    expect(store.undo()).toMatchObject({ ok: false });
    store.redo();
    await store.flush();
    expect(server.name(1)).toBe("Ground");
    expect(store.getState()).toMatchObject({ undoLabel: "Change Level 1", redoLabel: "Change Ground" });
  });

  it("survives a reload", async () => {
    const server = new Server();
    const first = workOn(server);
    first.rename(1, "Ground");
    await first.store.flush();
    const second = workOn(server, first.shelf);
    await second.store.resume();
    expect(second.store.undo()).toEqual({ ok: true });
    expect(second.name(1)).toBe("Level 1");
  });
});

/** `npm start` on a machine where it has run before: how long until there is a page, and that nothing stays behind. */
import { throwawayFolder } from "@cleatwork/local-stack/stack";
import { spawn } from "node:child_process";
import { readdirSync, readFileSync, rmSync } from "node:fs";
import { connect } from "node:net";
import { join } from "node:path";
import type { Figure } from "./figure.ts";

const program = join(import.meta.dirname, "..", "..", "packages", "local-stack", "run.mjs");

export async function secondStartFigures(): Promise<readonly Figure[]> {
  const folder = throwawayFolder();
  try {
    await startOnce(folder);
    const second = await startOnce(folder);
    return [
      { what: "second start: until the page answers", figure: second.page_s, unit: "s", most: 15 },
      { what: "second start: until /readyz answers", figure: second.ready_s, unit: "s", most: 15 },
      { what: "processes left after SIGTERM", figure: second.processesLeft, unit: "", most: 0 },
      { what: "ports still open after SIGTERM", figure: second.portsLeft, unit: "", most: 0 },
    ];
  } finally {
    rmSync(folder, { recursive: true, force: true });
  }
}

async function startOnce(folder: string) {
  const began = performance.now();
  const child = spawn(process.execPath, [program, "start"], {
    env: { ...process.env, CLEATWORK_DATA: folder },
    stdio: ["ignore", "pipe", "inherit"],
  });
  const exited = new Promise<void>((resolve) => child.once("exit", () => resolve()));
  let said = "";
  child.stdout.on("data", (chunk: Buffer) => (said += chunk.toString()));
  const since = () => (performance.now() - began) / 1000;
  const running = () => {
    if (child.exitCode !== null) throw new Error(`the start-up ended by itself:\n${said}`);
  };

  const page_s = await until(since, running, () => answersOk(folder, "/sign-in"));
  const ready_s = await until(since, running, () => answersOk(folder, "/readyz"));
  await until(since, running, () => Promise.resolve(said.includes("Ctrl-C")));
  const children = child.pid ? childrenOf(child.pid) : [];
  child.kill("SIGTERM");
  await exited;
  const open = await Promise.all(Object.values(portsOf(folder)).map(isOpen));
  return {
    page_s,
    ready_s,
    processesLeft: children.filter(isAlive).length + (children.length === 0 ? NaN : 0),
    portsLeft: open.filter(Boolean).length,
  };
}

async function until(since: () => number, running: () => void, condition: () => Promise<boolean>): Promise<number> {
  while (!(await condition())) {
    running();
    if (since() > 300) throw new Error("the start-up took more than five minutes");
    await new Promise((resolve) => setTimeout(resolve, 25));
  }
  return since();
}

function portsOf(folder: string): Readonly<Record<string, number>> {
  try {
    return (JSON.parse(readFileSync(join(folder, "stack.json"), "utf8")) as { ports: Record<string, number> }).ports;
  } catch {
    return {};
  }
}

async function answersOk(folder: string, path: string): Promise<boolean> {
  const port = portsOf(folder)["web"];
  if (!port) return false;
  try {
    return (await fetch(`http://127.0.0.1:${port}${path}`)).ok;
  } catch {
    return false;
  }
}

/** From /proc, since a child is known to its parent alone. */
function childrenOf(parent: number): number[] {
  return readdirSync("/proc")
    .map(Number)
    .filter((pid) => Number.isInteger(pid))
    .filter((pid) => {
      try {
        const stat = readFileSync(`/proc/${pid}/stat`, "utf8");
        return Number(stat.slice(stat.lastIndexOf(")") + 2).split(" ")[1]) === parent;
      } catch {
        return false;
      }
    });
}

function isAlive(pid: number): boolean {
  try {
    process.kill(pid, 0);
    return true;
  } catch {
    return false;
  }
}

const isOpen = (port: number) =>
  new Promise<boolean>((resolve) => {
    const socket = connect({ port, host: "127.0.0.1" });
    socket.once("connect", () => (socket.destroy(), resolve(true)));
    socket.once("error", () => resolve(false));
  });

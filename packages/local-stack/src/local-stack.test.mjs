import { mkdtempSync, rmSync, writeFileSync } from "node:fs";
import { createServer } from "node:net";
import { tmpdir } from "node:os";
import { join } from "node:path";
import nodemailer from "nodemailer";
import { afterEach, beforeEach, describe, expect, it } from "vitest";
import { isAlive, startChild, stopChild } from "./children.mjs";
import { missing } from "./debian.mjs";
import { bornAt, endLeftovers, writeDown } from "./leftovers.mjs";
import { readLock, releaseLock, takeLock, updateLock } from "./lock.mjs";
import { startMailCatcher } from "./mail/catcher.mjs";
import { freePort, LOOPBACK } from "./ports.mjs";
import { readState, writeState } from "./state.mjs";

let folder;
beforeEach(() => {
  folder = mkdtempSync(join(tmpdir(), "cleatwork-test-"));
});
afterEach(() => rmSync(folder, { recursive: true, force: true }));

describe("ports", () => {
  it("passes over a port that someone else listens on", async () => {
    const usual = await freePort(42_000);
    const server = createServer();
    await new Promise((resolve) => server.listen(usual, LOOPBACK, resolve));
    expect(await freePort(usual)).toBeGreaterThan(usual);
    await new Promise((resolve) => server.close(resolve));
  });

  it("never promises one port twice", async () => {
    const taken = new Set();
    expect(await freePort(42_500, taken)).not.toBe(await freePort(42_500, taken));
  });
});

describe("lock", () => {
  it("is refused while its holder lives", () => {
    expect(takeLock(folder, { address: "http://here.example" })).toBeNull();
    expect(takeLock(folder, {})).toMatchObject({ pid: process.pid, address: "http://here.example" });
  });

  it("keeps its holder while it says more", () => {
    takeLock(folder, {});
    updateLock(folder, { address: "http://there.example" });
    expect(readLock(folder)).toEqual({ pid: process.pid, address: "http://there.example" });
  });

  it("is taken over from a process that is gone", async () => {
    const child = startChild("gone", process.execPath, ["-e", ""], { logFile: join(folder, "log") });
    await child.exited;
    takeLock(folder, { pid: child.pid }); // as that process would have left it
    expect(readLock(folder)).toBeNull();
    expect(takeLock(folder, {})).toBeNull();
    releaseLock(folder);
    expect(readLock(folder)).toBeNull();
  });
});

describe("leftovers", () => {
  const idle = (name) =>
    startChild(name, process.execPath, ["-e", "setInterval(() => {}, 1000)"], { logFile: join(folder, "log") });

  it("of a start-up that was ended without warning are ended by the next one", async () => {
    const child = idle("left");
    writeDown(folder, child);
    expect(await endLeftovers(folder)).toEqual(["left"]);
    await child.exited;
    expect(isAlive(child.pid)).toBe(false);
    expect(await endLeftovers(folder)).toEqual([]);
  });

  it("do not include a process that has got the same pid since", async () => {
    const child = idle("stranger");
    const record = [{ name: "left", pid: child.pid, born: String(Number(bornAt(child.pid)) - 1) }];
    writeFileSync(join(folder, "children.json"), JSON.stringify(record));
    expect(await endLeftovers(folder)).toEqual([]);
    expect(child.isRunning()).toBe(true);
    await stopChild(child);
  });
});

describe("state", () => {
  it("is the same at the next start", () => {
    const written = { ...readState(folder), ports: { web: 8080 } };
    writeState(folder, written);
    expect(readState(folder)).toEqual(written);
  });
});

describe("children", () => {
  it("end by their own pid, even when they will not listen", async () => {
    const stubborn = "process.on('SIGTERM', () => {}); setInterval(() => {}, 1000); console.log('up')";
    const child = startChild("stubborn", process.execPath, ["-e", stubborn], { logFile: join(folder, "log") });
    while (!child.lastLines().includes("up")) await new Promise((resolve) => setTimeout(resolve, 10));
    await stopChild(child, { grace_ms: 100 });
    expect(isAlive(child.pid)).toBe(false);
  });
});

describe("Debian's packages", () => {
  it("names what is missing and nothing else", () => {
    const wanted = [
      { package: "here", program: "/here" },
      { package: "gone", program: "/gone" },
    ];
    expect(missing(wanted, (path) => path === "/here")).toEqual(["gone"]);
  });
});

describe("mail catcher", () => {
  const pdf = Buffer.from(Array.from({ length: 5000 }, (_, index) => index % 256));
  const json = async (url, init) => (await fetch(url, init)).json();

  const withCatcher = async (work) => {
    const catcher = await startMailCatcher({ smtpPort: 0, httpPort: 0, folder });
    const transport = nodemailer.createTransport({ host: LOOPBACK, port: catcher.smtpPort, ignoreTLS: true });
    try {
      return await work(`http://${LOOPBACK}:${catcher.httpPort}`, transport);
    } finally {
      transport.close();
      await catcher.stop();
    }
  };
  const send = (transport) =>
    transport.sendMail({
      from: "Teo <teo@tallgrass.example>",
      to: "priya@oxbow.example",
      subject: "Angebot für Lüftung",
      text: "See http://127.0.0.1/q/abc",
      html: "<p>See <script>alert(1)</script></p>",
      attachments: [{ filename: "quote.pdf", content: pdf }],
    });

  it("answers a caught mail in MailHog's shapes", async () => {
    await withCatcher(async (url, transport) => {
      await send(transport);
      const list = await json(`${url}/api/v2/messages?limit=10`);
      expect(list).toMatchObject({ total: 1, count: 1, start: 0 });
      expect(list.items[0]).toMatchObject({
        From: { Mailbox: "teo", Domain: "tallgrass.example" },
        To: [{ Mailbox: "priya", Domain: "oxbow.example" }],
      });
      expect(list.items[0].Content.Headers.Subject).toHaveLength(1);
      expect(await json(`${url}/api/v2/search?kind=to&query=priya`)).toMatchObject({ total: 1 });
      expect(await json(`${url}/api/v2/search?kind=from&query=priya`)).toMatchObject({ total: 0 });
    });
  });

  it("gives attachments back byte for byte", async () => {
    await withCatcher(async (url, transport) => {
      await send(transport);
      const [message] = await json(`${url}/api/v1/messages`);
      const bytes = await (await fetch(`${url}/messages/${message.ID}/attachments/0`)).arrayBuffer();
      expect(Buffer.from(bytes).equals(pdf)).toBe(true);
    });
  });

  it("keeps its mail over a restart and forgets what is deleted", async () => {
    await withCatcher(async (_url, transport) => send(transport));
    await withCatcher(async (url) => {
      const [message] = await json(`${url}/api/v1/messages`);
      await fetch(`${url}/api/v1/messages/${message.ID}`, { method: "DELETE" });
    });
    await withCatcher(async (url) => {
      expect(await json(`${url}/api/v1/messages`)).toEqual([]);
    });
  });

  it("shows a message's own markup only in a frame that runs nothing", async () => {
    await withCatcher(async (url, transport) => {
      await send(transport);
      const [message] = await json(`${url}/api/v1/messages`);
      const page = await fetch(`${url}/messages/${message.ID}`);
      const html = await page.text();
      expect(html).not.toContain("<script>");
      expect(html).toContain('sandbox="allow-popups');
      expect(page.headers.get("content-security-policy")).toContain("default-src 'none'");
    });
  });
});

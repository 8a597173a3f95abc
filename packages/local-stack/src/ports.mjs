/** Ports on loopback: the usual one when it is free, another when it is not. */
import { createServer, connect } from "node:net";

export const LOOPBACK = "127.0.0.1";

const canListen = (port) =>
  new Promise((resolve) => {
    const server = createServer();
    server.once("error", () => resolve(false));
    server.listen({ port, host: LOOPBACK, exclusive: true }, () => server.close(() => resolve(true)));
  });

/** `usual` or the next free one after it; `taken` are promised to others. */
export async function freePort(usual, taken = new Set()) {
  for (let port = usual; port < usual + 200; port++) {
    if (!taken.has(port) && (await canListen(port))) {
      taken.add(port);
      return port;
    }
  }
  throw new Error(`no free port from ${usual} to ${usual + 199}`);
}

/** True when someone greets or accepts within the time. */
export const answers = (port, { greets = false, timeout_ms = 300 } = {}) =>
  new Promise((resolve) => {
    const socket = connect({ port, host: LOOPBACK });
    const done = (value) => {
      socket.destroy();
      resolve(value);
    };
    socket.setTimeout(timeout_ms, () => done(false));
    socket.once("error", () => done(false));
    if (greets) socket.once("data", () => done(true));
    else socket.once("connect", () => done(true));
  });

export async function until(condition, { timeout_ms, every_ms = 20, failed = async () => false }) {
  const end = Date.now() + timeout_ms;
  while (Date.now() < end) {
    if (await condition()) return true;
    if (await failed()) return false;
    await new Promise((resolve) => setTimeout(resolve, every_ms));
  }
  return false;
}

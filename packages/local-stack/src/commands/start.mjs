/** `npm start` and `npm run dev`: everything on this machine, until Ctrl-C. */
import { join } from "node:path";
import { startChild, stopChild } from "../children.mjs";
import { DATABASE, ensureDebian } from "../debian.mjs";
import { releaseLock, takeLock } from "../lock.mjs";
import { ensurePackages } from "../packages.mjs";
import { dataFolder, inRoot } from "../paths.mjs";
import { freePort, LOOPBACK } from "../ports.mjs";
import { say } from "../say.mjs";
import { startWholeStack } from "../stack.mjs";
import { readState, writeState } from "../state.mjs";
import { buildWebIfChanged } from "../web-build.mjs";

/** A part that dies is started again this often, then left, so that it cannot spin. */
const RESTARTS = 5;

export async function start({ watch }) {
  const holder = takeLock(dataFolder, {});
  if (holder) {
    say(
      `Cleatwork is running already (process ${holder.pid})${holder.address ? `: ${holder.address}` : ", still starting"}.`,
    );
    return 0;
  }
  const stopped = stopSignal();
  let stack = null;
  let vite = null;
  try {
    await ensureDebian(DATABASE);
    await ensurePackages();
    if (!watch) {
      const state = readState(dataFolder);
      await buildWebIfChanged(state);
      writeState(dataFolder, state);
    }
    say("Starting");
    stack = await startWholeStack({ folder: dataFolder, watch, onDeath: restarter(() => stack) });
    if (!stack.state.signIns) {
      say("Setting up the demo company (once)");
      stack.state.signIns = stack.seed();
      stack.saveState();
    }
    let address = stack.publicUrl;
    if (watch) {
      const port = await freePort(5173);
      address = `http://${LOOPBACK}:${port}`;
      vite = startChild(
        "Vite",
        process.execPath,
        [inRoot("apps/web/node_modules/vite/bin/vite.js"), "--port", String(port), "--strictPort", "--host", LOOPBACK],
        {
          cwd: inRoot("apps/web"),
          env: { API_URL: stack.publicUrl },
          logFile: join(dataFolder, "logs", "vite.log"),
        },
      );
    }
    releaseLock(dataFolder);
    takeLock(dataFolder, { address });
    announce(address, stack);
    await stopped;
    say("\nStopping");
  } finally {
    if (vite) await stopChild(vite);
    if (stack) await stack.stop();
    releaseLock(dataFolder);
  }
  return 0;
}

function announce(address, stack) {
  say();
  say(`  Cleatwork   ${address}`);
  say(`  Inbox       ${stack.mailUrl}`);
  say();
  say("  Demo sign-ins");
  for (const { email, password, role, company } of stack.state.signIns)
    say(`    ${role.padEnd(10)} ${email.padEnd(36)} ${password}   ${company}`);
  say();
  say("  Ctrl-C stops everything; the data stays.");
}

/** Resolves at the first Ctrl-C or TERM; a second one while stopping changes nothing. */
function stopSignal() {
  return new Promise((resolve) => {
    for (const signal of ["SIGINT", "SIGTERM", "SIGHUP"]) process.on(signal, () => resolve(signal));
  });
}

function restarter(current) {
  const counts = new Map();
  return (child) => {
    const count = (counts.get(child.name) ?? 0) + 1;
    counts.set(child.name, count);
    say(`The ${child.name} ended by itself. Its last words:\n${child.lastLines()}`);
    const stack = current();
    const again =
      stack && { API: stack.startApi, worker: stack.startWorker, "mail catcher": stack.startMail }[child.name];
    if (!again || count > RESTARTS) return;
    setTimeout(() => void Promise.resolve(again()).catch((error) => say(error.message)), 500 * 2 ** count);
  };
}

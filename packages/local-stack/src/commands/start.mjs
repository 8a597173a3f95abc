/** `npm start` and `npm run dev`: everything on this machine, until Ctrl-C. */
import { join } from "node:path";
import { pause, startChild, stopChild } from "../children.mjs";
import { DATABASE, ensureDebian } from "../debian.mjs";
import { releaseLock, takeLock, updateLock } from "../lock.mjs";
import { ensurePackages } from "../packages.mjs";
import { dataFolder, inRoot } from "../paths.mjs";
import { freePort, LOOPBACK } from "../ports.mjs";
import { say } from "../say.mjs";
import { startWholeStack } from "../stack.mjs";
import { readState, writeState } from "../state.mjs";
import { buildWebIfChanged } from "../web-build.mjs";

/** A part that dies is started again this often within the time, then left, so that it cannot spin. */
const RESTARTS = 5;
const WITHIN_MS = 10 * 60_000;

export async function start({ watch }) {
  const holder = takeLock(dataFolder, {});
  if (holder) {
    say(
      `Cleatwork is running already (process ${holder.pid})${holder.address ? `: ${holder.address}` : ", still starting"}.`,
    );
    return 0;
  }
  const stopped = stopSignal();
  let asked = false;
  void stopped.then(() => (asked = true));
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
    updateLock(dataFolder, { address });
    announce(address, stack);
    await stopped;
    say("\nStopping");
  } catch (error) {
    // Ctrl-C reaches what we wait for as well: that it failed is then no news.
    await pause(50);
    if (!asked) throw error;
    say("\nStopped before everything was there.");
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
  const deaths = new Map();
  return (child) => {
    if (current()?.isStopping()) return;
    const recent = [...(deaths.get(child.name) ?? []), Date.now()].filter((at) => Date.now() - at < WITHIN_MS);
    deaths.set(child.name, recent);
    say(`The ${child.name} ended by itself. Its last words:\n${child.lastLines()}`);
    if (recent.length > RESTARTS) {
      say(`The ${child.name} has ended ${recent.length} times and is left. Stop with Ctrl-C and start again.`);
      return;
    }
    setTimeout(() => void startAgain(current(), child.name), 250 * 2 ** recent.length);
  };
}

async function startAgain(stack, name) {
  if (!stack || stack.isStopping()) return;
  const parts = {
    API: stack.startApi,
    worker: stack.startWorker,
    "mail catcher": stack.startMail,
    MariaDB: stack.startDatabase,
  };
  try {
    await parts[name]();
    say(`The ${name} runs again.`);
  } catch (error) {
    if (!stack.isStopping()) say(error.message);
  }
}

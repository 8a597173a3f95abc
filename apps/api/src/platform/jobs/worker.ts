/** Works the outbox until told to stop: claims what is due, sends it, and sweeps what has expired. */
import { createTransport } from "nodemailer";
import type { Deps } from "../http/route.ts";
import { outboxRepository } from "../mail/outbox.repository.ts";
import { sendMail, type Transport } from "../mail/send.ts";

const IDLE_MS = 500;
const SWEEP_EVERY_MS = 10 * 60_000;

export function startWorker(deps: Deps): { stop(): Promise<void> } {
  const outbox = outboxRepository(deps.db.system("the post is one for all companies"));
  const transport: Transport = createTransport(deps.config.smtpUrl, {
    from: deps.config.mailFrom,
  });
  let running = true;
  let wake = () => {};
  let sweptAt = 0;

  const loop = async () => {
    while (running) {
      try {
        if (deps.clock.now().getTime() - sweptAt > SWEEP_EVERY_MS) {
          await outbox.sweep();
          sweptAt = deps.clock.now().getTime();
        }
        const mail = await outbox.claim();
        if (mail) {
          await sendMail(mail, { ...deps, outbox, transport });
          continue;
        }
      } catch (error) {
        deps.log.error({ err: error }, "the worker stumbled and goes on");
      }
      await new Promise<void>((resolve) => {
        const timer = setTimeout(resolve, IDLE_MS);
        wake = () => {
          clearTimeout(timer);
          resolve();
        };
      });
    }
  };
  const ended = loop();
  return {
    async stop() {
      running = false;
      wake();
      await ended;
      transport.close();
    },
  };
}

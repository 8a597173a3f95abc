/** Catches every mail of this machine: SMTP in, a MailHog-compatible HTTP API and a plain inbox out. Loopback only. */
import { startMailCatcher } from "./src/mail/catcher.mjs";

const catcher = await startMailCatcher({
  smtpPort: Number(process.env.SMTP_PORT ?? 11025),
  httpPort: Number(process.env.HTTP_PORT ?? 18025),
  folder: process.env.MAIL_FOLDER ?? ".data/mail",
});
for (const signal of ["SIGTERM", "SIGINT"]) process.on(signal, () => void catcher.stop().then(() => process.exit(0)));

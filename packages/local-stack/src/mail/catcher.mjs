import { createServer } from "node:http";
import { SMTPServer } from "smtp-server";
import { LOOPBACK } from "../ports.mjs";
import { handle } from "./http.mjs";
import { openMailbox } from "./mailbox.mjs";

const MAX_BYTES = 30 * 2 ** 20;

export async function startMailCatcher({ smtpPort, httpPort, folder }) {
  const mailbox = await openMailbox(folder);
  const smtp = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS", "AUTH"],
    disableReverseLookup: true,
    size: MAX_BYTES,
    onData(stream, session, callback) {
      const chunks = [];
      stream.on("data", (chunk) => chunks.push(chunk));
      stream.on("end", () => {
        if (stream.sizeExceeded) {
          const error = new Error("Message exceeds the size that is accepted here");
          error.responseCode = 552;
          return callback(error);
        }
        const envelope = {
          from: session.envelope.mailFrom?.address ?? "",
          to: session.envelope.rcptTo.map(({ address }) => address),
        };
        // Acknowledged only once it is on disk.
        mailbox.add(Buffer.concat(chunks), envelope).then(() => callback(), callback);
      });
    },
  });
  smtp.on("error", () => {});
  await new Promise((resolve, reject) => smtp.listen(smtpPort, LOOPBACK, resolve).on("error", reject));
  const http = createServer((request, response) => void handle(mailbox, request, response));
  await new Promise((resolve, reject) => http.listen(httpPort, LOOPBACK, resolve).on("error", reject));
  return {
    smtpPort: smtp.server.address().port,
    httpPort: http.address().port,
    stop: async () => {
      http.closeAllConnections();
      await Promise.all([new Promise((resolve) => smtp.close(resolve)), new Promise((resolve) => http.close(resolve))]);
    },
  };
}

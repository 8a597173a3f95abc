import { attachment, inboxPage, messageBody, messagePage } from "./pages.mjs";
import { mailhogMessage, search } from "./mailhog.mjs";

/** Pages are our own and hold no script; a message's own markup stays in a frame that may do nothing. */
const SAFE = {
  "content-security-policy":
    "default-src 'none'; style-src 'unsafe-inline'; img-src data:; frame-src 'self'; form-action 'self'; frame-ancestors 'self'",
  "x-content-type-options": "nosniff",
  "referrer-policy": "no-referrer",
};

export async function handle(mailbox, request, response) {
  const send = (status, type, body, headers = {}) => {
    response.writeHead(status, { "content-type": type, ...SAFE, ...headers });
    response.end(body);
  };
  const json = (value, status = 200) => send(status, "application/json; charset=utf-8", JSON.stringify(value));
  const page = (html) => send(200, "text/html; charset=utf-8", html);
  const url = new URL(request.url ?? "/", "http://inbox.example");
  const [, first, second, third, fourth] = url.pathname.split("/").map(decodeURIComponent);
  const { method } = request;
  try {
    if (url.pathname === "/healthz") return json({ ok: true });
    if (method === "POST" && first === "messages" && third === "delete") {
      await mailbox.remove(second);
      response.writeHead(303, { location: "/" });
      return response.end();
    }
    if (first === "api" && second === "v1" && third === "messages")
      return await v1(mailbox, method, fourth, json, send);
    if (first === "api" && second === "v2" && method === "GET") return v2(mailbox, third, url.searchParams, json);
    if (method !== "GET") return json({ error: "method not allowed" }, 405);
    if (url.pathname === "/") return page(inboxPage(mailbox.all()));
    const message = first === "messages" ? mailbox.find(second) : undefined;
    if (!message) return json({ error: "not found" }, 404);
    if (third === undefined) return page(messagePage(message));
    if (third === "body") return page(messageBody(message));
    const file = third === "attachments" ? attachment(message, Number(fourth)) : undefined;
    return file
      ? send(200, "application/octet-stream", file.bytes, { "content-disposition": file.disposition })
      : json({ error: "not found" }, 404);
  } catch {
    return json({ error: "something went wrong" }, 500);
  }
}

async function v1(mailbox, method, id, json, send) {
  if (method === "DELETE") {
    if (id) await mailbox.remove(id);
    else await mailbox.clear();
    return send(200, "text/plain", "");
  }
  if (id === undefined) return json(mailbox.all().map(mailhogMessage));
  const message = mailbox.find(id);
  return message ? json(mailhogMessage(message)) : json({ error: "not found" }, 404);
}

function v2(mailbox, what, query, json) {
  const start = Math.max(0, Number(query.get("start") ?? 0) || 0);
  const limit = Math.min(250, Math.max(0, Number(query.get("limit") ?? 50) || 0));
  const found =
    what === "messages"
      ? mailbox.all()
      : what === "search"
        ? search(mailbox.all(), query.get("kind") ?? "", query.get("query") ?? "")
        : null;
  if (!found) return json({ error: "not found" }, 404);
  const items = found.slice(start, start + limit).map(mailhogMessage);
  return json({ total: found.length, count: items.length, start, items });
}

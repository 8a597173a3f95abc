/** A message in the shape that MailHog's HTTP API answers with. */
const path = (address) => {
  const at = address.lastIndexOf("@");
  return { Relays: null, Mailbox: address.slice(0, Math.max(at, 0)), Domain: address.slice(at + 1), Params: "" };
};

export function mailhogMessage({ id, raw, from, to, at }) {
  const text = raw.toString("utf8");
  const split = text.search(/\r?\n\r?\n/);
  const head = split < 0 ? text : text.slice(0, split);
  const headers = {};
  for (const line of head.replace(/\r?\n[ \t]+/g, " ").split(/\r?\n/)) {
    const colon = line.indexOf(":");
    if (colon > 0) (headers[line.slice(0, colon)] ??= []).push(line.slice(colon + 1).trim());
  }
  return {
    ID: id,
    From: path(from),
    To: to.map(path),
    Content: {
      Headers: headers,
      Body: split < 0 ? "" : text.slice(split).replace(/^\r?\n\r?\n/, ""),
      Size: raw.length,
      MIME: null,
    },
    Created: at,
    MIME: null,
    Raw: { From: from, To: to, Data: text, Helo: "" },
  };
}

export function search(messages, kind, query) {
  const words = query.toLowerCase();
  const has = {
    from: ({ from }) => from.toLowerCase().includes(words),
    to: ({ to }) => to.some((address) => address.toLowerCase().includes(words)),
    containing: ({ raw, parsed }) =>
      raw.toString("utf8").toLowerCase().includes(words) ||
      `${parsed.subject ?? ""} ${parsed.text ?? ""}`.toLowerCase().includes(words),
  }[kind];
  return has ? messages.filter(has) : null;
}

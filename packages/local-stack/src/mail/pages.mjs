/** The inbox, plain: a list, a message, its attachments. */
const escape = (text) =>
  String(text ?? "").replace(
    /[&<>"']/g,
    (sign) => ({ "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" })[sign],
  );

const STYLE = `
  body{margin:0;font:14px/20px system-ui,sans-serif;background:#dce2e5;color:#14202b}
  main{max-width:60rem;margin:0 auto;padding:24px 16px}
  h1{font-size:20px;line-height:28px;margin:0 0 12px}
  table{width:100%;border-collapse:collapse;background:#f8fafb}
  th{font-weight:500;text-align:left;color:#394753;background:#cfd7db}
  td,th{padding:8px 12px;border-bottom:1px solid #d3dadf;vertical-align:top}
  a{color:#1a3d92}
  dl{display:grid;grid-template-columns:max-content 1fr;gap:4px 16px;margin:0 0 16px}
  dt{color:#394753} dd{margin:0}
  iframe{width:100%;height:36rem;border:1px solid #75838e;background:#fff}
  pre{white-space:pre-wrap;background:#f8fafb;border:1px solid #b7c1c8;padding:12px}
  button{font:inherit;padding:6px 12px;border:1px solid #75838e;border-radius:2px;background:#f8fafb;cursor:pointer}
  @media print{button{display:none}}`;

const layout = (title, body) =>
  `<!doctype html><html lang="en"><head><meta charset="utf-8"><meta name="viewport" content="width=device-width,initial-scale=1"><title>${escape(title)}</title><style>${STYLE}</style></head><body><main>${body}</main></body></html>`;

const when = (at) => `${at.slice(0, 10)} ${at.slice(11, 19)} UTC`;

export function inboxPage(messages) {
  const rows = messages
    .map(
      ({ id, from, to, at, parsed }) =>
        `<tr><td>${escape(when(at))}</td><td>${escape(to.join(", "))}</td><td><a href="/messages/${escape(id)}">${escape(parsed.subject ?? "(no subject)")}</a>${parsed.attachments.length > 0 ? ` · ${parsed.attachments.length} attached` : ""}</td><td>${escape(from)}</td></tr>`,
    )
    .join("");
  const table = `<table><thead><tr><th>When</th><th>To</th><th>Subject</th><th>From</th></tr></thead><tbody>${rows}</tbody></table>`;
  return layout(
    "Inbox",
    `<h1>Inbox of this machine</h1>${messages.length === 0 ? "<p>No mail yet. What the product sends appears here.</p>" : table}`,
  );
}

export function messagePage({ id, from, to, at, parsed }) {
  const files = parsed.attachments
    .map(
      ({ filename, size }, index) =>
        `<li><a href="/messages/${escape(id)}/attachments/${index}">${escape(filename ?? "attachment")}</a>, ${Math.ceil(size / 1024)} KB</li>`,
    )
    .join("");
  const replyTo = parsed.replyTo?.text ? `<dt>Reply to</dt><dd>${escape(parsed.replyTo.text)}</dd>` : "";
  return layout(
    parsed.subject ?? "Message",
    `<p><a href="/">Inbox</a></p><h1>${escape(parsed.subject ?? "(no subject)")}</h1>
     <dl><dt>From</dt><dd>${escape(parsed.from?.text ?? from)}</dd><dt>To</dt><dd>${escape(to.join(", "))}</dd>${replyTo}<dt>When</dt><dd>${escape(when(at))}</dd></dl>
     ${files ? `<h2>Attached</h2><ul>${files}</ul>` : ""}
     ${parsed.html ? `<iframe sandbox="allow-popups allow-popups-to-escape-sandbox" src="/messages/${escape(id)}/body" title="The message"></iframe>` : ""}
     <h2>Plain text</h2><pre>${linked(parsed.text ?? "")}</pre>
     <form method="post" action="/messages/${escape(id)}/delete"><button>Delete this message</button></form>`,
  );
}

const linked = (text) => escape(text).replace(/https?:\/\/[^\s<]+/g, (url) => `<a href="${url}">${url}</a>`);

export const messageBody = ({ parsed }) => `<base target="_blank">${parsed.html || ""}`;

export function attachment({ parsed }, index) {
  const file = parsed.attachments[index];
  if (!file) return undefined;
  const name = (file.filename ?? "attachment").replace(/[^\w.() -]/g, "_");
  return { bytes: file.content, disposition: `attachment; filename="${name}"` };
}

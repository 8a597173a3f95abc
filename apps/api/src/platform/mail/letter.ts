/** A short letter in plain text and in HTML, made from one source so that both say the same. No image, no tracking. */
export interface Letter {
  readonly subject: string;
  readonly paragraphs: readonly string[];
  readonly action?: { readonly label: string; readonly link: string };
  readonly after?: readonly string[];
  /** Accent of the button, #rrggbb. */
  readonly color?: string;
}

export function letter({ subject, paragraphs, action, after = [], color = "#1C429C" }: Letter) {
  const text = [...paragraphs, ...(action ? [`${action.label}:\n${action.link}`] : []), ...after].join("\n\n");
  const body = [
    ...paragraphs.map(paragraph),
    ...(action
      ? [
          `<p style="margin:24px 0"><a href="${escapeHtml(action.link)}" style="display:inline-block;padding:12px 20px;background:${color};color:#ffffff;text-decoration:none;font-weight:600">${escapeHtml(action.label)}</a></p>`,
          `<p style="margin:0 0 16px;font-size:13px;color:#4F5D68">Or open this address: <a href="${escapeHtml(action.link)}" style="color:#1A3D92">${escapeHtml(action.link)}</a></p>`,
        ]
      : []),
    ...after.map(paragraph),
  ].join("\n");
  const html = `<!doctype html><html lang="en"><head><meta charset="utf-8"><title>${escapeHtml(subject)}</title></head><body style="margin:0;padding:24px;background:#DCE2E5"><div style="max-width:560px;margin:0 auto;padding:24px 28px;background:#ffffff;border-top:4px solid ${color};font:15px/22px Arial,Helvetica,sans-serif;color:#14202B">${body}</div></body></html>`;
  return { subject: oneLine(subject), text, html };
}

const paragraph = (text: string) => `<p style="margin:0 0 16px">${escapeHtml(text).replaceAll("\n", "<br>")}</p>`;

/** A header has one line, whatever a name holds. */
const oneLine = (text: string) => text.replace(/[\r\n]+/g, " ").slice(0, 300);

const SIGNS: Readonly<Record<string, string>> = { "&": "&amp;", "<": "&lt;", ">": "&gt;", '"': "&quot;", "'": "&#39;" };
export const escapeHtml = (text: string) => text.replace(/[&<>"']/g, (sign) => SIGNS[sign] ?? sign);

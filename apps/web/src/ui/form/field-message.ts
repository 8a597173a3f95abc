/** What a form error says: what was typed, and what is allowed. The field's label stands right above it. */
export function fieldMessage(value: unknown, allowed: string): string {
  const said = typeof value === "number" ? String(value) : typeof value === "string" ? value.trim() : "";
  const short = said.length > 40 ? `${said.slice(0, 40)}…` : said;
  const words = plainWords(allowed).replace(/\.$/, "");
  return short === "" ? `Needed: ${words}.` : `“${short}” cannot be used here. Allowed: ${words}.`;
}

/** The schema library's own sentences, where a contract gives none of its own, in a person's words. */
function plainWords(allowed: string): string {
  const limit = /^Too (?:big|small): expected \w+ to (?:have|be) (<=|>=|<|>)(-?[\d.e+]+)(?: (characters|items))?/.exec(
    allowed,
  );
  if (limit) {
    const [, sign = "", bound = "", of] = limit;
    if (sign === ">=" && bound === "1" && of) return of === "items" ? "at least one" : "some words";
    const unit = of ? ` ${of}` : "";
    const words = { "<=": "at most", ">=": "at least", "<": "less than", ">": "more than" }[sign] ?? sign;
    return `${words} ${bound}${unit}`;
  }
  if (/^an id that starts with/.test(allowed)) return "one of the list";
  if (/^Invalid option/.test(allowed)) return "one of the choices";
  if (/^Invalid ISO date/.test(allowed)) return "a date";
  if (/^Invalid/.test(allowed)) return "a value";
  return allowed.trim();
}

/**
 * One text for one value, so that a hash of it means something: members sorted by their UTF-16 code units, no white
 * space, numbers and strings as ECMAScript writes them.
 *
 * Source   RFC 8785 (JSON Canonicalization Scheme), sections 3.2.2 and 3.2.3
 * @example canonicalJson({ b: 1, a: [true, null] }) // {"a":[true,null],"b":1}
 */
export function canonicalJson(value: unknown): string {
  if (value === null || typeof value === "boolean" || typeof value === "string") return JSON.stringify(value);
  if (typeof value === "number") {
    if (!Number.isFinite(value)) throw new Error("a snapshot holds finite numbers only");
    return JSON.stringify(value);
  }
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(",")}]`;
  if (typeof value === "object") {
    const members = Object.entries(value)
      .filter(([, member]) => member !== undefined)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([name, member]) => `${JSON.stringify(name)}:${canonicalJson(member)}`);
    return `{${members.join(",")}}`;
  }
  throw new Error(`a snapshot cannot hold a ${typeof value}`);
}

/** Whether every typed word stands somewhere in the text, whatever the case and the accents. */
export function holdsAllWords(text: string, typed: string): boolean {
  const plain = bare(text);
  return bare(typed)
    .split(/\s+/)
    .filter(Boolean)
    .every((word) => plain.includes(word));
}

const bare = (text: string) => text.normalize("NFD").replace(/\p{M}/gu, "").toLowerCase();

const words = new Intl.Collator("en-US", { numeric: true, sensitivity: "base" });

/** Numbers by size, words as in a phone book, with the numbers inside them by size: M-9 before M-10. */
export function compare(a: unknown, b: unknown): number {
  if (typeof a === "number" && typeof b === "number") return a - b;
  return words.compare(String(a), String(b));
}

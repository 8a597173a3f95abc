/** Private links carry their token in the path: the log keeps the place, not the key. */
export const redactPath = (url: string): string => (url.split("?")[0] ?? "").replace(/[A-Za-z0-9_-]{43}/g, "[token]");

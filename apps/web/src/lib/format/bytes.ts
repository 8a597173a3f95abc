export function bytesText(count: number): string {
  if (count < 1000) return `${count} B`;
  const units = ["kB", "MB", "GB"];
  let value = count / 1000;
  let unit = 0;
  while (value >= 1000 && unit < units.length - 1) {
    value /= 1000;
    unit++;
  }
  return `${value.toFixed(value < 10 ? 1 : 0)} ${units[unit] ?? ""}`;
}

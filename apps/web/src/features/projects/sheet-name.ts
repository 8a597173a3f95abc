/** What a file name tells of a sheet: `M-101 Level 1 HVAC plan rev B.pdf`. Only a first guess; the person sees and corrects it. */
export function sheetFromFileName(fileName: string): { sheetNumber: string; title: string; revision: string } {
  const bare = fileName
    .replace(/\.[a-z0-9]+$/i, "")
    .replace(/[_+]+/g, " ")
    .trim();
  const sheet = /^([A-Z]{1,3}[- ]?\d{1,3}(?:\.\d{1,2})?[A-Z]?)(?:[\s-]+|$)(.*)$/i.exec(bare);
  const rest = sheet?.[2] ?? "";
  const revision = /(?:^|[\s-])rev(?:ision)?[\s.-]*([A-Z0-9]{1,4})\s*$/i.exec(rest);
  return {
    sheetNumber: sheet?.[1]?.toUpperCase().replace(" ", "-") ?? "",
    title: (revision ? rest.slice(0, revision.index) : rest).replace(/[\s-]+$/, ""),
    revision: revision?.[1]?.toUpperCase() ?? "",
  };
}

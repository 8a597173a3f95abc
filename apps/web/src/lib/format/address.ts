import type { Address } from "@cleatwork/contracts";

export const emptyAddress: Address = { line1: "", line2: "", city: "", region: "", postalCode: "" };

/** On one line: "12 Mill St, Suite 4, Marrow Creek, KS 67000". */
export const addressText = ({ line1, line2, city, region, postalCode }: Address): string =>
  [line1, line2, city, [region, postalCode].filter(Boolean).join(" ")].filter(Boolean).join(", ");

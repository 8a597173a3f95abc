import type { Role } from "@cleatwork/contracts";

/** What each role may do, in words. */
export const roleText: Record<Role, { readonly name: string; readonly sees: string }> = {
  owner: {
    name: "Owner",
    sees: "All that an estimator does, and people, prices, rates, brand and the audit.",
  },
  estimator: {
    name: "Estimator",
    sees: "Projects, layouts, prices and quotes, with margins. Changes neither prices nor rates.",
  },
  foreman: {
    name: "Foreman",
    sees: "The approved takeoffs of sold jobs. Never a price, a cost or a margin.",
  },
};

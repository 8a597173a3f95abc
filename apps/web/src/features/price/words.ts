import type { Estimate, LineGroup } from "@cleatwork/calc";

export const groupNames: Readonly<Record<LineGroup, string>> = {
  metal: "Metal",
  devices: "Devices",
  accessories: "Accessories",
  labor: "Labor",
  subcontracts: "Subcontracts",
  "rentals-freight": "Rentals, freight",
};

export const stepNames: Readonly<Record<Estimate["steps"][number]["step"], string>> = {
  direct: "Direct cost",
  tax: "Sales tax",
  cost: "Cost",
  overhead: "Overhead",
  contingency: "Contingency",
  profit: "Profit",
  bond: "Bond",
  price: "Price",
};

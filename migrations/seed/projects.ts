/** The demo's three projects: one being bid, one with the client, one won and in the shop. All invented. */
import type { SystemRows } from "./duct-row.ts";
import { fireStation } from "./fire-station.ts";
import { exhaust, outsideAir, returnAir } from "./library/other-air.ts";
import { supply } from "./library/supply.ts";
import { visitorCenter } from "./visitor-center.ts";

export interface DemoProject {
  readonly name: string;
  readonly number: string;
  readonly client: string;
  readonly contact: string;
  readonly site: { line1: string; line2: string; city: string; region: string; postalCode: string };
  readonly altitude_ft: number;
  /** Days from the day of the seed, and the hour in the company's zone. */
  readonly due: { days: number; hour: number };
  readonly systems: readonly SystemRows[];
  readonly adds: readonly DemoAdd[];
  readonly quote: "none" | "draft" | "issued" | "accepted";
}

export interface DemoAdd {
  readonly description: string;
  readonly group: "subcontracts" | "rentals-freight";
  readonly quantity: number;
  readonly unit: "lot" | "week" | "day" | "ea";
  readonly dollars: number;
  readonly taxable: boolean;
}

const balancing = (dollars: number): DemoAdd => ({
  description: "Testing and balancing, with report",
  group: "subcontracts",
  quantity: 1,
  unit: "lot",
  dollars,
  taxable: false,
});
const lift = (weeks: number): DemoAdd => ({
  description: "Scissor lift, 19 ft",
  group: "rentals-freight",
  quantity: weeks,
  unit: "week",
  dollars: 640,
  taxable: true,
});
const freight = (drops: number): DemoAdd => ({
  description: "Freight, a drop",
  group: "rentals-freight",
  quantity: drops,
  unit: "ea",
  dollars: 240,
  taxable: false,
});

export const library: DemoProject = {
  name: "Marrow Creek Branch Library",
  number: "26-031",
  client: "Oxbow Builders",
  contact: "Priya Lindqvist",
  site: { line1: "77 Cottonwood Street", line2: "", city: "Marrow Creek", region: "KS", postalCode: "67001" },
  altitude_ft: 1340,
  due: { days: 2, hour: 14 },
  systems: [supply, returnAir, exhaust, outsideAir],
  adds: [
    balancing(3850),
    lift(2),
    {
      description: "Crane day, roof fan and curb",
      group: "rentals-freight",
      quantity: 1,
      unit: "day",
      dollars: 1450,
      taxable: false,
    },
    freight(2),
  ],
  quote: "draft",
};

export const projects: readonly DemoProject[] = [
  library,
  {
    name: "Quill Street Fire Station 4",
    number: "26-028",
    client: "Harrow & Pell",
    contact: "Dana Whitlock",
    site: { line1: "4 Quill Street", line2: "", city: "Sorrel Ridge", region: "KS", postalCode: "67009" },
    altitude_ft: 1290,
    due: { days: 3, hour: 11 },
    systems: [fireStation],
    adds: [balancing(1650), lift(1), freight(1)],
    quote: "issued",
  },
  {
    name: "Tern Lake Visitor Center",
    number: "26-019",
    client: "Meridian West",
    contact: "Ilse Moreno",
    site: { line1: "1 Boardwalk", line2: "", city: "Tern Lake", region: "KS", postalCode: "67020" },
    altitude_ft: 1410,
    due: { days: -12, hour: 15 },
    systems: [visitorCenter],
    adds: [balancing(1250), lift(1), freight(1)],
    quote: "accepted",
  },
];

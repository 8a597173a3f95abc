/** The demo's company and people: invented, and their e-mail ends in `.example`. */
import type { BodyOf, endpoints, Role } from "@cleatwork/contracts";

export const TIME_ZONE = "America/Chicago";

export const company = {
  name: "Tallgrass Sheet Metal",
  unitSystem: "inch-pound",
  timeZone: TIME_ZONE,
  address: {
    line1: "410 Bluestem Avenue",
    line2: "",
    city: "Marrow Creek",
    region: "KS",
    postalCode: "67000",
  },
  phone: "316 555 0140",
  licenseNumber: "SM-0417 (demo)",
  brandColor: "#1C5C46",
  frictionBasis: "hydraulic-diameter",
  quoteTerms: [
    "Progress billing monthly, net 30 days. Retainage 10 %, released at substantial completion.",
    "Work in regular hours on weekdays, with clear access and one mobilization a phase.",
    "Metal prices hold for the validity of this quote; afterwards they follow the supplier's price of the day.",
  ].join("\n"),
} satisfies BodyOf<typeof endpoints.updateCompany>;

export interface DemoPerson {
  readonly name: string;
  readonly email: string;
  /** Printed by the start-up: these accounts hold nothing but invented data. */
  readonly password: string;
  readonly role: Role;
}

export const owner: DemoPerson = {
  name: "Ruth Amsel",
  email: "ruth@tallgrass.example",
  password: "bluestem-owner-demo",
  role: "owner",
};

export const invited: readonly DemoPerson[] = [
  { name: "Teo Varga", email: "teo@tallgrass.example", password: "bluestem-estimator-demo", role: "estimator" },
  { name: "Hollis Brandt", email: "hollis@tallgrass.example", password: "bluestem-foreman-demo", role: "foreman" },
];

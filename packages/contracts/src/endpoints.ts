/** Every row of the API, in one table. */
import { clientEndpoints } from "./clients.ts";
import { companyEndpoints } from "./companies.ts";
import { fieldEndpoints } from "./field.ts";
import { layoutEndpoints } from "./layouts.ts";
import { peopleEndpoints } from "./people.ts";
import { pricingEndpoints } from "./pricing.ts";
import { projectEndpoints } from "./projects.ts";
import { quoteEndpoints } from "./quotes.ts";
import { specEndpoints } from "./specs.ts";
import { standardsEndpoints } from "./standards.ts";
import { takeoffEndpoints } from "./takeoff.ts";

export const endpoints = {
  ...peopleEndpoints,
  ...companyEndpoints,
  ...clientEndpoints,
  ...projectEndpoints,
  ...specEndpoints,
  ...standardsEndpoints,
  ...takeoffEndpoints,
  ...layoutEndpoints,
  ...pricingEndpoints,
  ...quoteEndpoints,
  ...fieldEndpoints,
};
export type EndpointName = keyof typeof endpoints;

import type { companyEndpoints } from "@cleatwork/contracts";
import { recordAudit } from "../../platform/audit.ts";
import { problem } from "../../platform/http/problem.ts";
import type { Handlers } from "../../platform/http/route.ts";
import { companiesRepository } from "./companies.repository.ts";

export const companyHandlers = {
  getCompany: ({ tenant }) => companiesRepository(tenant).get(),
  updateCompany: ({ tenant, body, version, person }) =>
    tenant.transaction(async (tx) => {
      const companies = companiesRepository(tx);
      if ((await companies.lockVersion()) !== version)
        throw problem("stale", "The company's settings were saved by someone else meanwhile.");
      await companies.update(body, version + 1);
      await recordAudit(tx, { by: person.id, event: "company.changed", subject: body.name, details: { new: body } });
      return companies.get();
    }),
  listAudit: ({ tenant, query }) => companiesRepository(tenant).listAudit(query),
  listMail: ({ tenant, query }) => companiesRepository(tenant).listMail(query),
} satisfies Handlers<typeof companyEndpoints>;

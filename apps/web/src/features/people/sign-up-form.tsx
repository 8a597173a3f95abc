import { endpoints, signUpRequest } from "@cleatwork/contracts";
import { useQueryClient } from "@tanstack/react-query";
import { useNavigate } from "react-router-dom";
import type { z } from "zod";
import { api } from "../../lib/http.ts";
import { paths } from "../../lib/paths.ts";
import { Button } from "../../ui/button.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { sessionQueries } from "../session/index.ts";
import { timeZoneChoices } from "../../lib/format/time-zones.ts";

const { Text, Password, Select } = formParts<z.input<typeof signUpRequest>>();

/** A company and its owner, in one step. */
export function SignUpForm() {
  const client = useQueryClient();
  const navigate = useNavigate();
  const contractForm = useContractForm({
    schema: signUpRequest,
    initial: {
      companyName: "",
      name: "",
      email: "",
      password: "",
      timeZone: Intl.DateTimeFormat().resolvedOptions().timeZone,
    },
    save: (body) => api(endpoints.signUp, { body }),
    onSaved: async (me) => {
      client.setQueryData(sessionQueries.me().queryKey, me);
      const slug = me.memberships[0]?.company.slug;
      await navigate(slug ? paths.home(slug) : "/");
    },
    fieldOf: { "email-taken": "email" },
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      actions={
        <Button type="submit" rank="primary" busy={contractForm.busy} className="h-11! text-[0.9375rem]">
          {contractForm.busy ? "Setting up" : "Set up the company"}
        </Button>
      }
    >
      <Text tall name="companyName" label="Company" autoComplete="organization" autoFocus />
      <Text tall name="name" label="Your name" autoComplete="name" />
      <Text tall name="email" label="E-mail" type="email" autoComplete="email" />
      <Password
        tall
        name="password"
        label="Password"
        autoComplete="new-password"
        hint="12 characters or more. A few unrelated words are easy to keep and hard to guess."
      />
      <Select name="timeZone" label="Time zone of the company" choices={timeZoneChoices()} />
    </ContractFormView>
  );
}

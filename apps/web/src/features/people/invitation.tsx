import { acceptInvitationRequest, endpoints, pathParameters } from "@cleatwork/contracts";
import { useQueryClient, useSuspenseQuery } from "@tanstack/react-query";
import { useNavigate } from "react-router-dom";
import { api } from "../../lib/http.ts";
import { paths } from "../../lib/paths.ts";
import { Button } from "../../ui/button.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { sessionQueries } from "../session/index.ts";
import { peopleQueries } from "./people.queries.ts";
import { roleText } from "./roles.ts";

const newcomer = acceptInvitationRequest.required({ name: true });
const { Text, Password } = formParts<{ name?: string | undefined; password: string }>();

export const isLinkToken = (token: string) => pathParameters.token.safeParse(token).success;

/** A newcomer gives a name and a password; who has an account already gives its password. */
export function AcceptInvitation({ token }: { token: string }) {
  const { data: invitation } = useSuspenseQuery(peopleQueries.invitation(token));
  const client = useQueryClient();
  const navigate = useNavigate();
  const contractForm = useContractForm({
    schema: invitation.hasAccount ? acceptInvitationRequest : newcomer,
    initial: invitation.hasAccount ? { password: "" } : { name: "", password: "" },
    save: (body) => api(endpoints.acceptInvitation, { params: { token }, body }),
    onSaved: async (me) => {
      client.setQueryData(sessionQueries.me().queryKey, me);
      const joined = me.memberships.find((one) => one.company.name === invitation.companyName) ?? me.memberships.at(-1);
      await navigate(joined ? paths.home(joined.company.slug) : "/", { replace: true });
    },
    fieldOf: { "credentials-wrong": "password" },
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      actions={
        <Button type="submit" rank="primary" busy={contractForm.busy} className="h-11!">
          Join {invitation.companyName}
        </Button>
      }
    >
      <p className="text-ink-2">
        {invitation.invitedBy} invites <b className="text-ink">{invitation.email}</b> to {invitation.companyName} as{" "}
        {roleText[invitation.role].name.toLowerCase()}. {roleText[invitation.role].sees}
      </p>
      {invitation.hasAccount ? (
        <Password
          tall
          name="password"
          label="The password of your account"
          autoComplete="current-password"
          hint="You have an account with this e-mail; both companies will be in it."
        />
      ) : (
        <>
          <Text tall name="name" label="Your name" autoComplete="name" autoFocus />
          <Password
            tall
            name="password"
            label="Choose a password"
            autoComplete="new-password"
            hint="12 characters or more. A few unrelated words are easy to keep and hard to guess."
          />
        </>
      )}
    </ContractFormView>
  );
}

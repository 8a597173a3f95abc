import { emailRequest, endpoints, resetPasswordRequest } from "@cleatwork/contracts";
import { useState } from "react";
import type { z } from "zod";
import { api } from "../../lib/http.ts";
import { Button } from "../../ui/button.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { Notice } from "../../ui/notice.tsx";

const request = formParts<z.input<typeof emailRequest>>();
const newPassword = resetPasswordRequest.pick({ password: true });
const reset = formParts<z.input<typeof newPassword>>();

/** Orders the mail. The answer is the same for every address, so that nobody learns who has an account. */
export function AskForReset() {
  const [sentTo, setSentTo] = useState<string | null>(null);
  const contractForm = useContractForm({
    schema: emailRequest,
    initial: { email: "" },
    save: async (body) => {
      await api(endpoints.requestPasswordReset, { body });
      return body.email;
    },
    onSaved: (email) => setSentTo(email),
  });
  if (sentTo !== null) {
    return (
      <Notice severity="good" title="Look into your mail">
        If {sentTo} has an account, a link to set a new password is on its way. It works once, for one hour.
      </Notice>
    );
  }
  return (
    <ContractFormView
      contractForm={contractForm}
      actions={
        <Button type="submit" rank="primary" busy={contractForm.busy} className="h-11!">
          Send me a link
        </Button>
      }
    >
      <p className="text-ink-2">We mail you a link with which you set a new one.</p>
      <request.Text tall name="email" label="E-mail" type="email" autoComplete="username" autoFocus />
    </ContractFormView>
  );
}

export function SetNewPassword({ token }: { token: string }) {
  const contractForm = useContractForm({
    schema: newPassword,
    initial: { password: "" },
    save: ({ password }) => api(endpoints.resetPassword, { body: { token, password } }),
    onSaved: () => window.location.assign("/sign-in?did=reset"),
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      actions={
        <Button type="submit" rank="primary" busy={contractForm.busy} className="h-11!">
          Set the new password
        </Button>
      }
    >
      <p className="text-ink-2">You are then signed out everywhere else.</p>
      <reset.Password
        tall
        name="password"
        label="New password"
        autoComplete="new-password"
        autoFocus
        hint="12 characters or more. A few unrelated words are easy to keep and hard to guess."
      />
    </ContractFormView>
  );
}

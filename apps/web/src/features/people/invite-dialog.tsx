import { ROLES, endpoints, inviteRequest } from "@cleatwork/contracts";
import { useQueryClient } from "@tanstack/react-query";
import { useWatch } from "react-hook-form";
import type { z } from "zod";
import { api } from "../../lib/http.ts";
import { Button } from "../../ui/button.tsx";
import { Dialog, DialogActions } from "../../ui/dialog.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { peopleQueries } from "./people.queries.ts";
import { roleText } from "./roles.ts";

type Values = z.input<typeof inviteRequest>;
const { Text, Select } = formParts<Values>();

export function InviteDialog({ open, onOpenChange }: { open: boolean; onOpenChange: (open: boolean) => void }) {
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="Invite someone">
      <InviteForm onDone={() => onOpenChange(false)} />
    </Dialog>
  );
}

function InviteForm({ onDone }: { onDone: () => void }) {
  const { slug } = useSession();
  const cache = useQueryClient();
  const contractForm = useContractForm({
    schema: inviteRequest,
    initial: { email: "", role: "estimator" },
    save: (body, { idempotencyKey }) =>
      api(endpoints.invitePerson, { params: { company: slug }, body, idempotencyKey }),
    onSaved: async (invitation) => {
      notify(`An invitation is on its way to ${invitation.email}.`, { severity: "good" });
      onDone();
      await cache.invalidateQueries(peopleQueries.list(slug));
    },
    fieldOf: { "email-taken": "email", "wrong-state": "email" },
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      actions={
        <DialogActions>
          <Button onClick={onDone}>Cancel</Button>
          <Button type="submit" rank="primary" busy={contractForm.busy}>
            Send the invitation
          </Button>
        </DialogActions>
      }
    >
      <Text name="email" label="E-mail" type="email" autoComplete="off" autoFocus />
      <RoleSelect />
    </ContractFormView>
  );
}

function RoleSelect() {
  const role = useWatch<Values, "role">({ name: "role" });
  return (
    <Select
      name="role"
      label="Role"
      hint={roleText[role].sees}
      choices={ROLES.map((one) => ({ value: one, label: roleText[one].name }))}
    />
  );
}

import type { Client } from "@cleatwork/contracts";
import { Dialog } from "../../ui/dialog.tsx";
import { ClientForm } from "./client-form.tsx";

export function ClientDialog({
  client,
  open,
  onOpenChange,
  onSaved,
}: {
  client: Client | null;
  open: boolean;
  onOpenChange: (open: boolean) => void;
  onSaved: (client: Client) => void;
}) {
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title={client ? client.name : "New client"} wide>
      <ClientForm
        client={client}
        onCancel={() => onOpenChange(false)}
        onSaved={(saved) => {
          onSaved(saved);
          onOpenChange(false);
        }}
      />
    </Dialog>
  );
}

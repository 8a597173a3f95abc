import { useState } from "react";
import { Button } from "./button.tsx";
import { TextField } from "./controls.tsx";
import { Dialog, DialogActions } from "./dialog.tsx";

/** For what cannot be undone: the person types the name of what will be gone. */
export function ConfirmByName({
  open,
  onOpenChange,
  title,
  name,
  consequence,
  action,
  busy,
  onConfirm,
}: {
  open: boolean;
  onOpenChange: (open: boolean) => void;
  title: string;
  name: string;
  consequence: string;
  action: string;
  busy?: boolean;
  onConfirm: () => void;
}) {
  const [typed, setTyped] = useState("");
  const [missed, setMissed] = useState(false);
  const same = typed.trim().toLowerCase() === name.trim().toLowerCase();
  const change = (next: boolean) => {
    setTyped("");
    setMissed(false);
    onOpenChange(next);
  };
  return (
    <Dialog open={open} onOpenChange={change} title={title} description={consequence}>
      <form
        noValidate
        onSubmit={(event) => {
          event.preventDefault();
          if (same) onConfirm();
          else setMissed(true);
        }}
      >
        <TextField
          label={`Type “${name}” to confirm`}
          value={typed}
          autoComplete="off"
          onChange={(event) => setTyped(event.target.value)}
          error={missed && !same ? `This does not say “${name}”.` : undefined}
        />
        <DialogActions>
          <Button onClick={() => change(false)}>Keep it</Button>
          <Button type="submit" rank="danger" busy={busy ?? false}>
            {action}
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

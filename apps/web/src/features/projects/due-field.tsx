import { useState } from "react";
import { useFormContext, useWatch } from "react-hook-form";
import { dueText, instantFromZonedClock, zonedClock, zoneName } from "../../lib/format/dates.ts";
import { timeZoneChoices } from "../../lib/format/time-zones.ts";
import { SelectField, TextField } from "../../ui/controls.tsx";
import { fieldMessage } from "../../ui/form/field-message.ts";
import type { ProjectValues } from "./project-values.ts";

/** The hour of the bid on the clocks of a zone. Another zone keeps what the clock shows, since that is what was printed. */
export function DueField() {
  const { setValue, getFieldState, formState } = useFormContext<ProjectValues>();
  const dueAt = useWatch<ProjectValues, "dueAt">({ name: "dueAt" });
  const zone = useWatch<ProjectValues, "dueZone">({ name: "dueZone" });
  const [clock, setClock] = useState(() => (dueAt ? zonedClock(dueAt, zone) : ""));
  const error = getFieldState("dueAt", formState).error?.message;

  const change = (nextClock: string, nextZone: string) => {
    setClock(nextClock);
    setValue("dueZone", nextZone, { shouldDirty: true });
    setValue("dueAt", nextClock ? instantFromZonedClock(nextClock, nextZone) : null, {
      shouldDirty: true,
      shouldValidate: formState.isSubmitted,
    });
  };
  return (
    <div className="grid items-start gap-3 sm:grid-cols-2">
      <TextField
        label="Bid due"
        type="datetime-local"
        value={clock}
        onChange={(event) => change(event.target.value, zone)}
        error={error ? fieldMessage(clock, error) : undefined}
        hint={dueAt ? `${dueText(dueAt, zone)} ${zoneName(zone, dueAt)}` : "Leave empty while there is no date."}
      />
      <SelectField
        label="On the clocks of"
        value={zone}
        onChange={(event) => change(clock, event.target.value)}
        choices={timeZoneChoices(zone)}
      />
    </div>
  );
}

import type { Service } from "@cleatwork/calc";
import type { SystemRecord } from "@cleatwork/contracts";
import { SelectField } from "../../ui/controls.tsx";

/** Services differ by line pattern first, hue second. */
const DASH: Readonly<Record<Service, string>> = { supply: "", return: "8 4", exhaust: "8 3 2 3", "outside-air": "2 3" };
const STROKE: Readonly<Record<Service, string>> = {
  supply: "stroke-supply",
  return: "stroke-return",
  exhaust: "stroke-exhaust",
  "outside-air": "stroke-outside",
};

export function SystemChoice({
  systems,
  value,
  onChange,
}: {
  systems: readonly SystemRecord[];
  value: string;
  onChange: (id: string) => void;
}) {
  const system = systems.find(({ id }) => id === value);
  return (
    <span className="inline-flex items-center gap-2">
      {system && (
        <svg width={28} height={8} aria-hidden>
          <path
            d="M0 4h28"
            strokeWidth={2.5}
            strokeDasharray={DASH[system.service]}
            className={STROKE[system.service]}
          />
        </svg>
      )}
      <SelectField
        label="Air system"
        hideLabel
        value={value}
        onChange={(event) => onChange(event.target.value)}
        choices={systems.map(({ id, tag, name }) => ({ value: id, label: `${tag} ${name}` }))}
      />
    </span>
  );
}

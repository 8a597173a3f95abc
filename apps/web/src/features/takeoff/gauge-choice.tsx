import { sheetLabels, type GaugeDecider, type Piece, type Reinforcement } from "@cleatwork/calc";
import { setSegments } from "@cleatwork/layout";
import { SelectField } from "../../ui/controls.tsx";
import { useWorkspace } from "../workspace/index.ts";

const deciders: Readonly<Record<GaugeDecider, string>> = {
  piece: "set for this duct",
  spec: "the system's spec",
  company: "our schedule",
  shipped: "the shipped schedule",
};

const stiffWords = (reinforcement: Reinforcement): string => {
  switch (reinforcement.kind) {
    case "required":
      return `grade ${reinforcement.grade}`;
    case "not-required":
      return "not required";
    case "not-designed":
      return "not designed";
    case "blank":
      return "the schedule does not say";
  }
};

/** Who decided the sheet of a piece, what stiffens it, and the place to decide otherwise for its duct. */
export function GaugeChoice({ piece }: { piece: Piece }) {
  const { run, record, mayEdit } = useWorkspace();
  if (piece.material === "flexible") return null;
  const segment = record(piece.segmentId);
  const own = segment?.kind === "segment" ? (segment.gauge ?? "") : "";
  return (
    <div className="grid gap-1">
      <p className="text-ink-2">
        Gauge by <b>{piece.gaugeDecider === null ? "nobody" : deciders[piece.gaugeDecider]}</b> ({piece.gaugeSource})
        {piece.scheduledGauge !== null &&
          piece.scheduledGauge !== piece.gauge &&
          `; the schedule asks for ${piece.scheduledGauge}`}
        . Reinforcement: {stiffWords(piece.reinforcement)}
        {piece.otherReinforcement && `, shorter side ${stiffWords(piece.otherReinforcement)}`}.
      </p>
      {mayEdit && segment?.kind === "segment" && (
        <SelectField
          label="Sheet of this duct"
          className="w-56"
          value={own}
          empty="As spec and schedule say"
          onChange={(event) => {
            const gauge = event.target.value === "" ? null : event.target.value;
            run((layout) =>
              setSegments(layout, {
                ids: [segment.id],
                fields: { gauge },
                label: gauge === null ? "Sheet by schedule" : `Sheet ${gauge}`,
              }),
            );
          }}
          choices={sheetLabels(piece.material).map((value) => ({ value, label: value }))}
        />
      )}
    </div>
  );
}

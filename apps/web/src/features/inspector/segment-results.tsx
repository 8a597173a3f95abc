import {
  formatAirflow,
  formatFrictionRate,
  formatLength,
  formatPressure,
  formatPressureChange,
  formatVelocity,
  frictionRateOnBasis,
  decimal,
  pascals,
  type Shown,
  type SolvedAccessory,
  type SolvedFitting,
  type SolvedSegment,
} from "@cleatwork/calc";
import type { SegmentRecord } from "@cleatwork/contracts";
import { find } from "@cleatwork/layout";
import { Figure } from "../../ui/figure.tsx";
import { classNames } from "../../lib/class-names.ts";
import { useWorkspace } from "../workspace/index.ts";
import { accessoryNames, fittingInputNames, fittingNames, referenceNames } from "./words.ts";

/** What the air does in this duct, and how the pressure is spent. */
export function SegmentResults({ segment }: { segment: SegmentRecord }) {
  const { solvedOf, units, layout } = useWorkspace();
  const solved = solvedOf(segment.id);
  const system = find(layout, "system", segment.systemId);
  if (!solved || !system) return <p className="text-ink-3">No result while a stop stands.</p>;
  const velocityLimit = system.limits.velocity_m_s[segment.ductClass];
  const frictionLimit = system.limits.frictionRate_pa_m[segment.ductClass];
  return (
    <div className="grid gap-3 border-t border-line pt-3">
      <dl className="grid grid-cols-[1fr_auto_auto] items-baseline gap-x-2 gap-y-1">
        <Row
          label="Airflow"
          shown={formatAirflow(solved.volumetricFlowRate_m3s, units)}
          aside={`${solved.outletCount} ${solved.outletCount === 1 ? "outlet" : "outlets"}`}
        />
        <Row
          label="Velocity"
          shown={formatVelocity(solved.meanVelocity_m_s, units)}
          aside={`limit ${formatVelocity(velocityLimit, units).value}`}
          over={solved.meanVelocity_m_s > velocityLimit}
        />
        <Row
          label="Friction"
          shown={formatFrictionRate(solved.frictionRate_pa_m, units)}
          aside={`limit ${formatFrictionRate(frictionLimit, units).value}`}
          over={solved.frictionRate_pa_m > frictionLimit}
        />
        {solved.section.shape !== "round" && <OtherBasis solved={solved} />}
        <Row
          label="Velocity pressure"
          shown={formatPressure(solved.velocityPressure_pa, units)}
          aside={`Re ${decimal(solved.reynoldsNumber / 1000, 0)} k`}
        />
        <Row label="Length" shown={formatLength(solved.length_m, units)} aside={solved.regime} />
      </dl>
      <section>
        <h3 className="text-help font-semibold">Pressure</h3>
        <dl className="grid grid-cols-[1fr_auto_auto] items-baseline gap-x-2 gap-y-1">
          <Row label="Left on entering" shown={formatPressure(solved.pressureLeftEntering_pa, units)} />
          {solved.fittings.map((fitting, position) => (
            <Row
              key={position}
              label={fittingNames[fitting.type]}
              shown={formatPressureChange(pascals(0 - fitting.loss_pa), units)}
              aside={`${decimal(fitting.lossCoefficient, 2)} × ${formatPressure(fitting.velocityPressure_pa, units).value}`}
              title={lookedUp(fitting)}
            />
          ))}
          {solved.accessories.map((accessory, position) => (
            <Row
              key={`accessory ${position}`}
              label={accessoryNames[accessory.kind]}
              shown={formatPressureChange(pascals(0 - accessory.loss_pa), units)}
              aside={`${decimal(accessory.lossCoefficient, 2)} × ${formatPressure(solved.velocityPressure_pa, units).value}`}
              title={lookedUp(accessory)}
            />
          ))}
          <Row label="Straight duct" shown={formatPressureChange(pascals(0 - solved.frictionLoss_pa), units)} />
          <Row label="Left on leaving" shown={formatPressure(solved.pressureLeftLeaving_pa, units)} />
          <Row
            label="Static, gauge"
            shown={formatPressureChange(solved.staticPressureEntering_pa, units)}
            aside={`to ${formatPressureChange(solved.staticPressureLeaving_pa, units).value}`}
            title="Against the room, when the fan makes what is required: past the fittings at its beginning, and at its end."
          />
        </dl>
      </section>
    </div>
  );
}

/** Source of a coefficient and what it was looked up by, in one breath. */
function lookedUp(loss: SolvedFitting | SolvedAccessory): string {
  const inputs = loss.inputs.map(({ name, value }) => `${fittingInputNames[name]} ${Number(value.toPrecision(3))}`);
  const reference = "reference" in loss ? `on the velocity pressure of ${referenceNames[loss.reference]}` : "";
  const edge = loss.clamped ? "read at the edge of its table" : "";
  return [loss.source, inputs.join(", "), reference, edge].filter((part) => part !== "").join("; ");
}

/** What the friction would be on the diameter that the company does not use. */
function OtherBasis({ solved }: { solved: SolvedSegment }) {
  const { numbers, units } = useWorkspace();
  const system = numbers?.systems.find(({ segments }) => segments.some(({ id }) => id === solved.segmentId));
  if (!system) return null;
  const isHydraulic = system.frictionBasis === "hydraulic-diameter";
  const rate = frictionRateOnBasis(system, solved, isHydraulic ? "laminar-equivalent-diameter" : "hydraulic-diameter");
  const more = 100 * (rate / solved.frictionRate_pa_m - 1);
  return (
    <Row
      label={`on ${isHydraulic ? "laminar-equivalent" : "hydraulic"} diameter`}
      shown={formatFrictionRate(rate, units)}
      aside={`${more < 0 ? "−" : "+"}${decimal(Math.abs(more), 1)} %`}
    />
  );
}

function Row({
  label,
  shown,
  aside,
  over = false,
  title,
}: {
  label: string;
  shown: Shown;
  aside?: string;
  over?: boolean;
  title?: string;
}) {
  return (
    <>
      <dt className="text-ink-2">{label}</dt>
      <dd className={classNames("text-right font-semibold", over && "text-warn-ink")}>
        <Figure value={shown.value} unit={shown.unit} />
      </dd>
      <dd className="label-width text-right text-label text-ink-3" {...(title ? { title } : {})}>
        {aside}
      </dd>
    </>
  );
}

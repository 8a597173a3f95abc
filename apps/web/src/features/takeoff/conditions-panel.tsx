import { decimal, shippedStandards } from "@cleatwork/calc";
import { useSuspenseQuery } from "@tanstack/react-query";
import { CheckField } from "../../ui/controls.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { notify } from "../../ui/toast.tsx";
import { useSaveProjectPricing } from "../price/index.ts";
import { useSession } from "../session/index.ts";
import { useWorkspace, workspaceQueries } from "../workspace/index.ts";
import { factorOf, reasonOf, reasonsIn } from "./work-conditions.ts";

/** What holds for this project: each named condition multiplies the field hours, and each is seen. */
export function ConditionsPanel() {
  const { company, project, standards } = useWorkspace();
  const { may } = useSession();
  const { data: pricing } = useSuspenseQuery(workspaceQueries.pricing(company.slug, project.id));
  const save = useSaveProjectPricing(company.slug, project.id);
  const { conditions } = standards.hours ?? shippedStandards.productivity;
  const picked = reasonsIn(pricing.conditionReason, conditions);
  const byHand = pricing.conditionFactor !== null && Math.abs(factorOf(picked) - pricing.conditionFactor) > 1e-9;
  const set = (names: ReadonlySet<string>) => {
    const chosen = conditions.filter(({ name }) => names.has(name));
    save.mutate(
      {
        ...pricing,
        conditionFactor: chosen.length === 0 ? null : factorOf(chosen),
        conditionReason: reasonOf(chosen),
      },
      { onError: (error) => notify(error.message, { severity: "warn" }) },
    );
  };
  return (
    <Panel label="Conditions">
      <PanelHead
        title="Conditions of the work"
        fact={
          pricing.conditionFactor === null
            ? "the company's usual"
            : `field hours × ${decimal(pricing.conditionFactor, 3)}`
        }
      />
      <PanelBody className="grid gap-1">
        {byHand && (
          <p className="text-help text-ink-3">
            The factor was set by hand{pricing.conditionReason && `: ${pricing.conditionReason}`}. Picking here replaces
            it.
          </p>
        )}
        {conditions.map((condition) => (
          <CheckField
            key={condition.name}
            label={`${condition.name} × ${condition.factor}`}
            hint={condition.standing === "own" ? undefined : condition.standing}
            checked={!byHand && picked.includes(condition)}
            disabled={!may("estimates.write") || save.isPending}
            onChange={(event) => {
              const names = new Set(byHand ? [] : picked.map(({ name }) => name));
              if (event.target.checked) names.add(condition.name);
              else names.delete(condition.name);
              set(names);
            }}
          />
        ))}
        <p className="text-help text-ink-3">Multiply only what has causes of its own.</p>
      </PanelBody>
    </Panel>
  );
}

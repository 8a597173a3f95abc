import { formatCounted, formatWeight, kilograms, type CountedItem } from "@cleatwork/calc";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { useWorkspace } from "../workspace/index.ts";

/** Where the pounds are. */
export function MetalByGauge() {
  const { numbers, units } = useWorkspace();
  const weights = new Map<string, number>();
  for (const { pieces } of numbers?.takeoffs ?? [])
    for (const { gauge, weight_kg } of pieces) if (gauge) weights.set(gauge, (weights.get(gauge) ?? 0) + weight_kg);
  const most = Math.max(...weights.values(), 1);
  return (
    <Panel label="Metal by gauge">
      <PanelHead title="Metal by gauge" fact="net" />
      <PanelBody>
        {weights.size === 0 ? (
          <p className="text-ink-3">No metal yet.</p>
        ) : (
          <table className="w-full">
            <tbody>
              {[...weights].sort().map(([gauge, weight]) => (
                <tr key={gauge}>
                  <th scope="row" className="py-0.5 pr-3 text-left font-normal">
                    {gauge}
                  </th>
                  <td className="pr-3 text-right">{formatWeight(kilograms(weight), units).text}</td>
                  <td className="w-1/2">
                    <div className="h-2 bg-ink-2" style={{ width: `${(100 * weight) / most}%` }} />
                  </td>
                </tr>
              ))}
            </tbody>
          </table>
        )}
      </PanelBody>
    </Panel>
  );
}

/** What is counted and not cut from sheet. */
export function Counted() {
  const { numbers, units } = useWorkspace();
  const sums = new Map<string, { quantity: number; unit: CountedItem["unit"]; basis: string }>();
  for (const { items } of numbers?.takeoffs ?? [])
    for (const { description, quantity, unit, basis } of items) {
      const known = sums.get(description);
      if (known) known.quantity += quantity;
      else sums.set(description, { quantity, unit, basis });
    }
  return (
    <Panel label="Counted">
      <PanelHead title="Hangers, sealant, dampers, devices" />
      {sums.size === 0 ? (
        <PanelBody className="text-ink-3">Nothing counted yet.</PanelBody>
      ) : (
        <table className="grid-table">
          <tbody>
            {[...sums].map(([description, { quantity, unit, basis }]) => (
              <tr key={description} title={basis}>
                <td>{description}</td>
                <td className="num">{formatCounted(quantity, unit, units).text}</td>
              </tr>
            ))}
          </tbody>
        </table>
      )}
    </Panel>
  );
}

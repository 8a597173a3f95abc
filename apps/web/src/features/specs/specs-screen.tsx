import { formatPressure } from "@cleatwork/calc/display/index";
import { useSuspenseQuery } from "@tanstack/react-query";
import { Link, useNavigate, useSearchParams } from "react-router-dom";
import type { Spec } from "@cleatwork/contracts";
import { classNames } from "../../lib/class-names.ts";
import { useActions } from "../../ui/actions/registry.ts";
import { EmptyState } from "../../ui/empty-state.tsx";
import { PlusIcon } from "../../ui/icons/icon.tsx";
import { LinkButton } from "../../ui/link-button.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { useSession } from "../session/index.ts";
import { SpecForm } from "./spec-form.tsx";
import { materialWord } from "./spec-words.ts";
import { specQueries } from "./specs.queries.ts";

/** The company's ways of building duct: the list at the left, the chosen one beside it. */
export function SpecsScreen() {
  const { slug, may } = useSession();
  const { data } = useSuspenseQuery(specQueries.list(slug));
  const [search, setSearch] = useSearchParams();
  const navigate = useNavigate();
  const wanted = search.get("spec");
  const chosen = data.items.find((spec) => spec.id === wanted) ?? (wanted === "new" ? null : (data.items[0] ?? null));
  const mayWrite = may("specs.write");
  useActions(
    mayWrite
      ? [{ id: "new spec", label: "New spec", group: "Make", keys: "n", run: () => void navigate("?spec=new") }]
      : [],
  );
  const add = mayWrite && (
    <LinkButton size="small" rank="primary" to="?spec=new">
      <PlusIcon />
      New spec
    </LinkButton>
  );
  return (
    <main className="grid min-h-0 flex-1 content-start items-start gap-4 overflow-auto p-4 lg:grid-cols-[20rem_minmax(0,1fr)]">
      <Panel>
        <PanelHead title="Specs" fact={`${data.items.length} in all`}>
          {add}
        </PanelHead>
        {data.items.length === 0 ? (
          <EmptyState title="No spec yet">
            A spec says how the duct of a system is built. Every air system has one.
          </EmptyState>
        ) : (
          <SpecList specs={data.items} chosen={chosen} />
        )}
      </Panel>
      {(chosen !== null || wanted === "new") && (
        <Panel live>
          <PanelHead
            title={chosen ? chosen.name : "New spec"}
            fact="how duct is built, where the layout does not say otherwise"
          />
          <PanelBody>
            <p className="mb-4 max-w-3xl text-ink-2">
              A starting point from common practice, to be made yours. The project’s specification, the adopted code and
              the authority having jurisdiction govern.
            </p>
            <SpecForm
              key={chosen?.id ?? "new"}
              spec={chosen}
              onSaved={(saved) => setSearch({ spec: saved.id }, { replace: true })}
            />
          </PanelBody>
        </Panel>
      )}
    </main>
  );
}

function SpecList({ specs, chosen }: { specs: readonly Spec[]; chosen: Spec | null }) {
  const units = useSession().company.unitSystem;
  return (
    <ul>
      {specs.map((spec) => (
        <li key={spec.id} className="border-b border-line-soft last:border-b-0">
          <Link
            to={`?spec=${spec.id}`}
            {...(spec.id === chosen?.id ? { "aria-current": "true" as const } : {})}
            className={classNames(
              "block px-4 py-2 text-ink no-underline",
              spec.id === chosen?.id ? "bg-dye-tint" : "hover:bg-dye-tint-2",
            )}
          >
            <span className="block font-[560]">{spec.name}</span>
            <span className="block text-help text-ink-3">
              {materialWord(spec.construction.material)},{" "}
              {formatPressure(spec.construction.pressureClass_pa, units).text}, seal {spec.construction.sealClass}
            </span>
          </Link>
        </li>
      ))}
    </ul>
  );
}

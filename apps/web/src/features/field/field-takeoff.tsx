import { formatCounted, formatWeight } from "@cleatwork/calc/display/index";
import type { Kilograms } from "@cleatwork/calc";
import type { CompanySlug, FieldPiece, FieldTakeoff, ProjectId } from "@cleatwork/contracts";
import { useSuspenseQuery } from "@tanstack/react-query";
import { useMemo } from "react";
import { useSearchParams } from "react-router-dom";
import { fieldQueries } from "./field.queries.ts";
import { filterPieces, runsOf, weightOf } from "./field-list.ts";
import { pieceDetail, pieceWords } from "./piece-words.ts";

/** What to make and hang, readable at arm's length: big marks, by run, narrowed by level and system. No price exists here. */
export function FieldTakeoffPage({ company, projectId }: { company: CompanySlug; projectId: ProjectId }) {
  const { data: takeoff } = useSuspenseQuery(fieldQueries.takeoff(company, projectId));
  const [search, setSearch] = useSearchParams();
  const levelId = search.get("level");
  const systemId = search.get("system");
  const words = search.get("find") ?? "";

  const pieces = useMemo(
    () => filterPieces(takeoff, { levelId, systemId, words }, (piece) => pieceWords(piece, takeoff.unitSystem)),
    [takeoff, levelId, systemId, words],
  );
  const narrow = (key: string, value: string) =>
    setSearch(
      (before) => {
        const after = new URLSearchParams(before);
        if (value === "") after.delete(key);
        else after.set(key, value);
        return after;
      },
      { replace: true },
    );

  return (
    <main className="mx-auto w-full max-w-3xl pb-16">
      <FieldHead takeoff={takeoff} pieces={pieces} />
      <div className="grid grid-cols-2 gap-2 border-b border-line-strong bg-recess p-3 print:hidden">
        <Choice
          label="Level"
          value={levelId ?? ""}
          onChoose={(value) => narrow("level", value)}
          options={takeoff.levels}
        />
        <Choice
          label="System"
          value={systemId ?? ""}
          onChoose={(value) => narrow("system", value)}
          options={takeoff.systems.map(({ id, tag, name }) => ({ id, name: name ? `${tag} ${name}` : tag }))}
        />
        <label className="col-span-2 grid gap-1 text-sm text-ink-2">
          Find a mark, size or run
          <input
            type="search"
            defaultValue={words}
            onChange={(event) => narrow("find", event.target.value)}
            className="h-12 border border-line-strong bg-sheet-hi px-3 text-lg text-ink"
          />
        </label>
      </div>
      {pieces.length === 0 ? (
        <p className="p-4 text-ink-2">No piece fits. Choose another level or system, or clear the search.</p>
      ) : (
        runsOf(pieces).map((run, index) => (
          <section key={`${index} ${run.name}`}>
            <h2 className="flex justify-between border-b border-line-strong bg-recess px-4 py-2 font-semibold text-ink">
              {run.name || "Unnamed run"}
              <span className="font-normal text-ink-2">
                {run.pieces.length} {run.pieces.length === 1 ? "piece" : "pieces"}
              </span>
            </h2>
            <ul>
              {run.pieces.map((piece) => (
                <PieceRow key={`${piece.systemId} ${piece.mark}`} piece={piece} takeoff={takeoff} />
              ))}
            </ul>
          </section>
        ))
      )}
      <FieldItems takeoff={takeoff} levelId={levelId} systemId={systemId} />
      <p className="px-4 pt-6 text-sm text-ink-3">
        Cut from this sheet only what the adopted code and the project specification allow. Fire, smoke and ceiling
        dampers, rated assemblies, seismic bracing and lifting are for the authority having jurisdiction and a licensed
        professional.
      </p>
    </main>
  );
}

function FieldHead({ takeoff, pieces }: { takeoff: FieldTakeoff; pieces: readonly FieldPiece[] }) {
  const approved = new Intl.DateTimeFormat("en-US", { dateStyle: "medium" }).format(new Date(takeoff.approvedAt));
  return (
    <header className="border-b border-line-strong bg-sheet px-4 py-3 text-ink">
      <h1 className="text-xl leading-7 font-semibold">{takeoff.projectName}</h1>
      <p className="text-sm text-ink-2">
        Quote {takeoff.quoteNumber}, revision {takeoff.revision}, approved {approved}
      </p>
      <p className="mt-2 text-lg">
        <b>{pieces.length}</b> of {takeoff.pieces.length} pieces,{" "}
        <b>{formatWeight(weightOf(pieces) as Kilograms, takeoff.unitSystem).text}</b>
      </p>
    </header>
  );
}

function PieceRow({ piece, takeoff }: { piece: FieldPiece; takeoff: FieldTakeoff }) {
  const system = takeoff.systems.find(({ id }) => id === piece.systemId);
  const weight = formatWeight(piece.weight_kg as Kilograms, takeoff.unitSystem).text;
  return (
    <li className="grid min-h-18 grid-cols-[5.5rem_1fr] items-center gap-3 border-b border-line bg-sheet-hi px-4 py-2 break-inside-avoid">
      <b className="text-4xl leading-none font-bold tracking-tight text-ink">{piece.mark}</b>
      <span>
        <span className="block text-lg leading-6 font-medium text-ink">{pieceWords(piece, takeoff.unitSystem)}</span>
        <span className="block text-ink-2">
          {pieceDetail(piece, weight)}
          {system ? ` · ${system.tag}, seal ${system.sealClass}` : ""}
          {piece.seam ? ` · ${piece.seam}` : ""}
        </span>
      </span>
    </li>
  );
}

function FieldItems({
  takeoff,
  levelId,
  systemId,
}: {
  takeoff: FieldTakeoff;
  levelId: string | null;
  systemId: string | null;
}) {
  const items = takeoff.items.filter(
    (item) => (levelId === null || item.levelId === levelId) && (systemId === null || item.systemId === systemId),
  );
  const sums = new Map<
    string,
    { description: string; quantity: number; unit: FieldTakeoff["items"][number]["unit"] }
  >();
  for (const item of items) {
    const known = sums.get(item.description);
    if (known) known.quantity += item.quantity;
    else sums.set(item.description, { ...item });
  }
  if (sums.size === 0) return null;
  return (
    <section>
      <h2 className="border-b border-line-strong bg-recess px-4 py-2 font-semibold text-ink">
        Hangers, dampers, devices
      </h2>
      <ul>
        {[...sums.values()].map(({ description, quantity, unit }) => (
          <li
            key={description}
            className="flex justify-between border-b border-line bg-sheet-hi px-4 py-3 text-lg text-ink"
          >
            {description}
            <b>{formatCounted(quantity, unit, takeoff.unitSystem).text}</b>
          </li>
        ))}
      </ul>
    </section>
  );
}

function Choice({
  label,
  value,
  options,
  onChoose,
}: {
  label: string;
  value: string;
  options: readonly { id: string; name: string }[];
  onChoose: (id: string) => void;
}) {
  return (
    <label className="grid gap-1 text-sm text-ink-2">
      {label}
      <select
        value={value}
        onChange={(event) => onChoose(event.target.value)}
        className="h-12 border border-line-strong bg-sheet-hi px-2 text-lg text-ink"
      >
        <option value="">All</option>
        {options.map((option) => (
          <option key={option.id} value={option.id}>
            {option.name}
          </option>
        ))}
      </select>
    </label>
  );
}

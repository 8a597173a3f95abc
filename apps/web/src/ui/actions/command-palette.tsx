import { Dialog as Radix } from "radix-ui";
import { useId, useRef, useState } from "react";
import { classNames } from "../../lib/class-names.ts";
import { SearchIcon } from "../icons/icon.tsx";
import { KeyCap } from "../key-cap.tsx";
import { useAllActions, type Action } from "./registry.ts";
import { searchActions } from "./search.ts";

/** Everything that can be done from here, found by typing. */
export function CommandPalette({ open, onOpenChange }: { open: boolean; onOpenChange: (open: boolean) => void }) {
  return (
    <Radix.Root open={open} onOpenChange={onOpenChange}>
      <Radix.Portal>
        <Radix.Overlay className="fixed inset-0 z-40 bg-veil" />
        <Radix.Content
          aria-describedby={undefined}
          className="hem hem-live float-in fixed! left-1/2 top-[12vh] z-50 w-[calc(100vw-2rem)] max-w-xl -translate-x-1/2 shadow-float"
        >
          <Radix.Title className="sr-only">Find and do</Radix.Title>
          <Finder onDone={() => onOpenChange(false)} />
        </Radix.Content>
      </Radix.Portal>
    </Radix.Root>
  );
}

function Finder({ onDone }: { onDone: () => void }) {
  const [typed, setTyped] = useState("");
  const [at, setAt] = useState(0);
  const list = useRef<HTMLUListElement>(null);
  const id = useId();
  const found = searchActions(useAllActions(), typed).slice(0, 60);
  const current = Math.min(at, found.length - 1);

  const move = (to: number) => {
    const next = (to + found.length) % Math.max(1, found.length);
    setAt(next);
    list.current?.querySelectorAll("[role=option]")[next]?.scrollIntoView({ block: "nearest" });
  };
  const run = (action: Action | undefined) => {
    if (!action) return;
    onDone();
    // After the dialog has given the focus back, so that the action may move it.
    setTimeout(() => action.run(), 0);
  };

  return (
    <>
      <div className="flex items-center gap-2 border-b border-line px-4">
        <SearchIcon className="text-ink-3" />
        <input
          type="text"
          role="combobox"
          aria-label="Find an action or a place"
          aria-expanded={found.length > 0}
          aria-controls={id}
          aria-autocomplete="list"
          {...(found.length > 0 ? { "aria-activedescendant": `${id}-${current}` } : {})}
          placeholder="Find an action or a place"
          autoComplete="off"
          className="h-12 w-full bg-transparent text-tally outline-none placeholder:text-ink-3"
          style={{ boxShadow: "none" }}
          value={typed}
          onChange={(event) => {
            setTyped(event.target.value);
            setAt(0);
          }}
          onKeyDown={(event) => {
            if (event.key === "ArrowDown") move(current + 1);
            else if (event.key === "ArrowUp") move(current - 1);
            else if (event.key === "Enter") run(found[current]);
            else return;
            event.preventDefault();
          }}
        />
      </div>
      <ul ref={list} id={id} role="listbox" aria-label="Found" className="max-h-[50vh] overflow-auto py-1">
        {found.map((action, index) => (
          <li
            key={action.id}
            id={`${id}-${index}`}
            role="option"
            aria-selected={index === current}
            className={classNames(
              "flex min-h-9 cursor-pointer items-center gap-3 px-4",
              index === current && "bg-dye-tint",
            )}
            onPointerMove={() => setAt(index)}
            onClick={() => run(action)}
          >
            <span>{action.label}</span>
            <span className="ml-auto text-help text-ink-3">{action.group}</span>
            {action.keys && <KeyCap keys={action.keys} />}
          </li>
        ))}
      </ul>
      {found.length === 0 && (
        <p role="status" className="px-4 pb-3 text-ink-2">
          Nothing here is called “{typed}”.
        </p>
      )}
    </>
  );
}

import { createContext, useContext, type ReactNode } from "react";
import { NavLink } from "react-router-dom";
import { classNames } from "../lib/class-names.ts";

/** What stands at the right end of every top bar: search and the person. Given by the shell. */
export const TopBarTools = createContext<ReactNode>(null);

export interface SeamTab {
  readonly to: string;
  readonly label: string;
  /** The one fact about what is behind the tab. */
  readonly fact?: ReactNode;
  /** It is open only at exactly this address, not below it. */
  readonly end?: boolean;
}

/** The title of what is open, its tabs locked by seams, and the tools. */
export function TopBar({
  title,
  fact,
  tabs = [],
  label,
  heading = true,
}: {
  title: string;
  fact?: ReactNode;
  tabs?: readonly SeamTab[];
  /** Names the tabs for screen readers. */
  label?: string;
  /** False where the screen below has the page's heading. */
  heading?: boolean;
}) {
  const tools = useContext(TopBarTools);
  const Title = heading ? "h1" : "p";
  return (
    <header className="flex min-h-[52px] shrink-0 items-stretch border-b border-line-strong bg-sheet print:hidden max-md:flex-wrap">
      <div className="w-[260px] min-w-0 shrink-0 border-line px-4 pt-2 max-md:order-1 max-md:h-[52px] max-md:w-0 max-md:grow md:border-r">
        <Title className="truncate text-head font-[640]">{title}</Title>
        <p className="truncate text-label text-ink-3">{fact}</p>
      </div>
      {tabs.length > 0 ? (
        <nav
          aria-label={label ?? title}
          className="flex min-w-0 grow max-md:order-3 max-md:w-full max-md:overflow-x-auto max-md:border-t max-md:border-line"
        >
          {tabs.map((tab, index) => (
            <Tab key={tab.to} tab={tab} last={index === tabs.length - 1} />
          ))}
        </nav>
      ) : (
        <div className="grow max-md:hidden" />
      )}
      <div className="flex shrink-0 items-center gap-2 border-line px-4 max-md:order-2 md:border-l">{tools}</div>
    </header>
  );
}

function Tab({ tab, last }: { tab: SeamTab; last: boolean }) {
  return (
    <NavLink
      to={tab.to}
      end={tab.end ?? false}
      className={({ isActive }) =>
        classNames(
          "relative min-w-[88px] flex-1 bg-sheet pl-6 pr-2 pt-2 no-underline max-md:min-w-[104px] max-md:pl-4",
          isActive ? "tab-on bg-sheet-hi text-dye-ink" : "text-ink-2 hover:text-ink",
        )
      }
    >
      {({ isActive }) => (
        <>
          <span className={classNames("block truncate", isActive ? "font-[680]" : "font-[560]")}>{tab.label}</span>
          <span className="flex h-4 items-center gap-1 overflow-hidden whitespace-nowrap text-label text-ink-3">
            {tab.fact}
          </span>
          {!last && <Seam />}
        </>
      )}
    </NavLink>
  );
}

/** Two edges locked into each other, as between two lengths of duct. */
function Seam() {
  return (
    <svg
      width={17}
      height={51}
      viewBox="0 0 17 51"
      aria-hidden
      className="absolute -right-2 top-0 z-10 fill-none stroke-line-strong"
    >
      <path d="M8.5 0v19.5h3a3 3 0 0 1 3 3v6M8.5 51V31.5h-3a3 3 0 0 1-3-3v-6" />
    </svg>
  );
}

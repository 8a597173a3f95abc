import { NavLink, useLocation } from "react-router-dom";
import { useSession } from "../../features/session/index.ts";
import { classNames } from "../../lib/class-names.ts";
import { paths } from "../../lib/paths.ts";
import {
  ClientsIcon,
  CompanyIcon,
  FieldIcon,
  PricesIcon,
  ProjectsIcon,
  SpecsIcon,
  type Icon,
} from "../../ui/icons/icon.tsx";
import { Mark } from "../../ui/icons/mark.tsx";
import { KeyCap } from "../../ui/key-cap.tsx";

interface Place {
  readonly to: string;
  /** Where it leads is a page of the place; the place is all that begins with this. */
  readonly under: string;
  readonly label: string;
  readonly icon: Icon;
  readonly keys: string;
}

export function usePlaces(): readonly Place[] {
  const { slug, may } = useSession();
  const place = (label: string, to: string, icon: Icon, keys: string, under = to): Place => ({
    to,
    under,
    label,
    icon,
    keys,
  });
  return [
    ...(may("projects.read") ? [place("Projects", paths.projects(slug), ProjectsIcon, "g p")] : []),
    ...(may("clients.read") ? [place("Clients", paths.clients(slug), ClientsIcon, "g c")] : []),
    ...(may("prices.read") ? [place("Prices", paths.prices(slug), PricesIcon, "g r")] : []),
    ...(may("specs.read") ? [place("Specs", paths.specs(slug), SpecsIcon, "g s")] : []),
    place("Field", paths.field(slug), FieldIcon, "g f"),
    ...(may("people.read") ? [place("Company", paths.company(slug), CompanyIcon, "g o", `/c/${slug}/company`)] : []),
  ];
}

/** The slim rail at the left; on a phone the same places stand at the bottom, under the thumb. */
export function Rail({ onKeys }: { onKeys: () => void }) {
  const places = usePlaces();
  const { pathname } = useLocation();
  return (
    <nav
      aria-label="Main"
      className="rail-hem flex shrink-0 border-line-strong bg-sheet print:hidden max-md:h-14 max-md:border-t max-md:shadow-none md:w-14 md:flex-col md:border-r md:pr-[5px]"
    >
      <div className="grid h-[52px] place-items-center text-dye-ink max-md:hidden">
        <Mark />
      </div>
      {places.map(({ to, under, label, icon: PlaceIcon }) => {
        const here = pathname === under || pathname.startsWith(`${under}/`);
        return (
          <NavLink
            key={to}
            to={to}
            {...(here ? { "aria-current": "page" as const } : {})}
            className={classNames(
              "relative flex h-14 flex-col items-center justify-center gap-1 text-2xs font-medium no-underline max-md:min-w-0 max-md:flex-1",
              here ? "bg-dye-tint text-dye-ink" : "text-ink-2 hover:bg-dye-tint-2 hover:text-ink",
            )}
          >
            {here && (
              <span
                aria-hidden
                className="absolute bg-dye max-md:inset-x-0 max-md:top-0 max-md:h-[3px] md:inset-y-0 md:left-0 md:w-[3px]"
              />
            )}
            <PlaceIcon size={20} />
            <span className="label-width leading-3">{label}</span>
          </NavLink>
        );
      })}
      <button
        type="button"
        onClick={onKeys}
        className="mt-auto flex h-14 flex-col items-center justify-center gap-1 text-2xs font-medium text-ink-2 hover:bg-dye-tint-2 max-md:hidden"
      >
        <KeyCap keys="?" />
        <span className="label-width leading-3">Keys</span>
      </button>
    </nav>
  );
}

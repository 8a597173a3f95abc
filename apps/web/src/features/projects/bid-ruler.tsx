import type { CompanySlug, ProjectItem } from "@cleatwork/contracts";
import { Link } from "react-router-dom";
import { classNames } from "../../lib/class-names.ts";
import { moneyText } from "../../lib/format/money.ts";
import { paths } from "../../lib/paths.ts";
import { Panel, PanelHead } from "../../ui/panel.tsx";
import { bidDays, openBids } from "./due.ts";

/**
 * The next two working weeks, a column a day. Every bar starts at the left edge of its column and is as long as its value, so
 * that two bids can be compared wherever they stand; the ruler is as high as the fullest day.
 */
export function BidRuler({
  projects,
  company,
  zone,
  now,
  actions,
}: {
  projects: readonly ProjectItem[];
  company: CompanySlug;
  zone: string;
  now: number;
  actions?: React.ReactNode;
}) {
  const bids = openBids(projects);
  const days = bidDays(bids, zone, now);
  const largest = Math.max(1, ...bids.map((bid) => bid.price_minor ?? 0));
  const priced = bids.filter((bid) => bid.price_minor !== null);
  const total = priced.reduce((sum, bid) => sum + (bid.price_minor ?? 0), 0);
  const fact =
    bids.length === 0
      ? "none with a date"
      : `${bids.length} to bid${priced.length > 0 ? `, ${moneyText(total, priced[0]?.currency ?? "USD", { cents: false })} priced so far` : ""}`;

  return (
    <Panel live label="Bids due">
      <PanelHead title="Bids due" fact={fact}>
        {actions}
      </PanelHead>
      <ol className="flex overflow-x-auto" tabIndex={0} aria-label="Bids by day">
        {days.map((day) => (
          <li
            key={day.key}
            className={classNames(
              "min-w-[7.5rem] flex-1 border-r border-line-soft last:border-r-0",
              day.bids.length === 0 && "min-w-[4rem] flex-[0.5] max-md:hidden",
              day.weekend && "bg-recess",
            )}
          >
            <p
              className={classNames(
                "label-width border-b border-line-soft px-2 py-1 text-label",
                day.label === "Today"
                  ? "font-[660] text-ink"
                  : day.key === "overdue"
                    ? "font-[660] text-stop-ink"
                    : "text-ink-3",
              )}
            >
              {day.label}
            </p>
            <ul className="min-h-12 py-1">
              {day.bids.map((bid) => (
                <li key={bid.id}>
                  <Link
                    to={paths.project(company, bid.id)}
                    className="block px-2 py-1 text-ink no-underline hover:bg-dye-tint-2"
                  >
                    <span className="label-width block text-help leading-4 font-[600]">{bid.name}</span>
                    <span className="label-width block text-label text-ink-2">
                      {timeOf(bid.dueAt ?? "", bid.dueZone)}
                      {bid.price_minor !== null && `, ${moneyText(bid.price_minor, bid.currency, { cents: false })}`}
                    </span>
                    {bid.price_minor !== null && (
                      <svg aria-hidden width="100%" height={6} className="mt-0.5">
                        <rect
                          width={`${Math.max(2, (100 * bid.price_minor) / largest)}%`}
                          height={6}
                          className="fill-dye"
                        />
                      </svg>
                    )}
                  </Link>
                </li>
              ))}
            </ul>
          </li>
        ))}
      </ol>
    </Panel>
  );
}

const timeOf = (instant: string, zone: string) =>
  new Intl.DateTimeFormat("en-US", { hour: "numeric", minute: "2-digit", timeZone: zone }).format(new Date(instant));

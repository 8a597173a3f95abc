import { Outlet } from "react-router-dom";
import { useSession } from "../features/session/index.ts";
import { paths } from "../lib/paths.ts";
import { TopBar } from "../ui/top-bar.tsx";

/** The company's pages, each for those who may open it. */
export function Component() {
  const { slug, company, may } = useSession();
  const tabs = [
    { to: paths.company(slug, "people"), label: "People", fact: "roles, invitations", for: may("people.read") },
    { to: paths.company(slug, "settings"), label: "Settings", fact: "name, units, brand", for: may("company.read") },
    { to: paths.company(slug, "audit"), label: "Audit", fact: "who changed what", for: may("audit.read") },
    { to: paths.company(slug, "mail"), label: "Mail", fact: "waiting, sent, refused", for: may("mail.read") },
  ];
  return (
    <>
      <TopBar
        heading={false}
        title={company.name}
        fact={[company.address.city, company.address.region].filter(Boolean).join(", ") || company.timeZone}
        label="Company"
        tabs={tabs.filter((tab) => tab.for)}
      />
      <Outlet />
    </>
  );
}

import { useState } from "react";
import { Outlet, useNavigate, useNavigation } from "react-router-dom";
import { useSession } from "../../features/session/index.ts";
import { paths } from "../../lib/paths.ts";
import { setTheme } from "../../lib/theme.ts";
import { CommandPalette } from "../../ui/actions/command-palette.tsx";
import { useActions } from "../../ui/actions/registry.ts";
import { ShortcutSheet } from "../../ui/actions/shortcut-sheet.tsx";
import { useKeys } from "../../ui/actions/use-keys.ts";
import { TopBarTools } from "../../ui/top-bar.tsx";
import { OfflineLine } from "./offline-line.tsx";
import { Rail, usePlaces } from "./rail.tsx";
import { Tools } from "./tools.tsx";
import { UnverifiedLine } from "./unverified-line.tsx";

/** The frame around every screen of a company. A screen brings its own top bar and its own main. */
export function Shell() {
  const [finding, setFinding] = useState(false);
  const [keysShown, setKeysShown] = useState(false);
  useKeys();
  useShellActions({ onFind: () => setFinding(true), onKeys: () => setKeysShown(true) });
  return (
    <div className="flex h-dvh flex-col-reverse print:block print:h-auto md:flex-row">
      <a
        href="#content"
        className="sr-only z-50 bg-sheet-hi p-3 text-ink focus:not-sr-only focus:fixed focus:left-2 focus:top-2"
      >
        Skip to the content
      </a>
      <Rail onKeys={() => setKeysShown(true)} />
      <div id="content" tabIndex={-1} className="relative flex min-h-0 min-w-0 flex-1 flex-col">
        <ProgressLine />
        <OfflineLine />
        <UnverifiedLine />
        <TopBarTools value={<Tools onFind={() => setFinding(true)} onKeys={() => setKeysShown(true)} />}>
          <Outlet />
        </TopBarTools>
      </div>
      <CommandPalette open={finding} onOpenChange={setFinding} />
      <ShortcutSheet open={keysShown} onOpenChange={setKeysShown} />
    </div>
  );
}

function useShellActions({ onFind, onKeys }: { onFind: () => void; onKeys: () => void }) {
  const navigate = useNavigate();
  const places = usePlaces();
  const { slug, me, may } = useSession();
  useActions([
    { id: "find", label: "Find an action or a place", group: "Anywhere", keys: "mod k", run: onFind },
    { id: "keys", label: "Keys on this screen", group: "Anywhere", keys: "?", run: onKeys },
    ...places.map((place) => ({
      id: `go ${place.label}`,
      label: place.label,
      group: "Go to",
      keys: place.keys,
      run: () => void navigate(place.to),
    })),
    ...(may("projects.write")
      ? [
          {
            id: "new project",
            label: "New project",
            group: "Make",
            words: "bid start",
            run: () => void navigate(paths.newProject(slug)),
          },
        ]
      : []),
    ...(may("people.manage")
      ? [
          {
            id: "settings",
            label: "Company settings",
            group: "Go to",
            words: "brand units terms",
            run: () => void navigate(paths.company(slug, "settings")),
          },
        ]
      : []),
    ...(may("audit.read")
      ? [
          {
            id: "audit",
            label: "Audit",
            group: "Go to",
            words: "history who changed",
            run: () => void navigate(paths.company(slug, "audit")),
          },
        ]
      : []),
    ...(may("mail.read")
      ? [
          {
            id: "mail",
            label: "Mail that went out",
            group: "Go to",
            words: "outbox waiting refused",
            run: () => void navigate(paths.company(slug, "mail")),
          },
        ]
      : []),
    ...me.memberships
      .filter((one) => one.company.slug !== slug)
      .map((one) => ({
        id: `company ${one.company.slug}`,
        label: `Switch to ${one.company.name}`,
        group: "Company",
        run: () => void navigate(paths.home(one.company.slug)),
      })),
    { id: "light", label: "Light", group: "Theme", run: () => setTheme("light") },
    { id: "dark", label: "Dark", group: "Theme", run: () => setTheme("dark") },
    { id: "system", label: "Light or dark as the computer", group: "Theme", run: () => setTheme("system") },
  ]);
}

/** A page is on its way. */
function ProgressLine() {
  const { state } = useNavigation();
  if (state === "idle") return null;
  return (
    <div role="status" className="absolute inset-x-0 top-0 z-30 h-0.5 overflow-hidden">
      <span className="sr-only">Opening</span>
      <span aria-hidden className="progress-line block h-full w-1/4 bg-dye" />
    </div>
  );
}

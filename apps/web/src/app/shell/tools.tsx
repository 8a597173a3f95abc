import { useNavigate } from "react-router-dom";
import { signOut, useSession } from "../../features/session/index.ts";
import { paths } from "../../lib/paths.ts";
import { setTheme, useTheme, type Theme } from "../../lib/theme.ts";
import { Avatar } from "../../ui/avatar.tsx";
import { Button } from "../../ui/button.tsx";
import { DarkIcon, LightIcon, SearchIcon, SystemIcon } from "../../ui/icons/icon.tsx";
import { KeyCap } from "../../ui/key-cap.tsx";
import { Menu, MenuChoices, MenuItem, MenuSeparator } from "../../ui/menu.tsx";
import { notify } from "../../ui/toast.tsx";

const roleWord = { owner: "owner", estimator: "estimator", foreman: "foreman" } as const;

/** Search and the person, at the right end of every top bar. */
export function Tools({ onFind, onKeys }: { onFind: () => void; onKeys: () => void }) {
  return (
    <>
      <Button size="small" aria-label="Find an action or a place" onClick={onFind}>
        <SearchIcon />
        <span className="max-md:hidden">
          <KeyCap keys="mod K" />
        </span>
      </Button>
      <PersonMenu onKeys={onKeys} />
    </>
  );
}

function PersonMenu({ onKeys }: { onKeys: () => void }) {
  const { me, slug, role, company } = useSession();
  const navigate = useNavigate();
  const theme = useTheme();
  return (
    <Menu
      trigger={
        <button
          type="button"
          aria-label={`${me.person.name}, your menu`}
          title={me.person.name}
          className="rounded-edge"
        >
          <Avatar name={me.person.name} />
        </button>
      }
    >
      <div className="px-3 pb-2 pt-1">
        <p className="font-semibold">{me.person.name}</p>
        <p className="text-help text-ink-3">{me.person.email}</p>
        <p className="text-help text-ink-3">
          {roleWord[role]} at {company.name}
        </p>
      </div>
      <MenuSeparator />
      {me.memberships.length > 1 && (
        <>
          <MenuChoices
            label="Company"
            value={slug}
            onChange={(next) => {
              const chosen = me.memberships.find((one) => one.company.slug === next);
              if (chosen) void navigate(paths.home(chosen.company.slug));
            }}
            choices={me.memberships.map((one) => ({ value: one.company.slug, label: one.company.name }))}
          />
          <MenuSeparator />
        </>
      )}
      <MenuChoices
        label="Light and dark"
        value={theme}
        onChange={(next) => setTheme(next as Theme)}
        choices={[
          { value: "system", label: <Choice icon={<SystemIcon />} words="As the computer" /> },
          { value: "light", label: <Choice icon={<LightIcon />} words="Light" /> },
          { value: "dark", label: <Choice icon={<DarkIcon />} words="Dark" /> },
        ]}
      />
      <MenuSeparator />
      <MenuItem onSelect={onKeys}>Keys on this screen</MenuItem>
      <MenuItem
        onSelect={() => {
          signOut().catch(() => notify("You are still signed in: there is no connection.", { severity: "stop" }));
        }}
      >
        Sign out
      </MenuItem>
    </Menu>
  );
}

const Choice = ({ icon, words }: { icon: React.ReactNode; words: string }) => (
  <span className="flex items-center gap-2">
    {icon}
    {words}
  </span>
);

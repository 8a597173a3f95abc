import { Dialog } from "../dialog.tsx";
import { KeyCap } from "../key-cap.tsx";
import { useAllActions } from "./registry.ts";

/** The keys that work on the screen that is open. */
export function ShortcutSheet({ open, onOpenChange }: { open: boolean; onOpenChange: (open: boolean) => void }) {
  const withKeys = useAllActions().filter((action) => action.keys);
  const groups = [...new Set(withKeys.map((action) => action.group))];
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title="Keys on this screen" wide>
      <div className="columns-1 gap-8 sm:columns-2">
        {groups.map((group) => (
          <section key={group} className="mb-4 break-inside-avoid">
            <h3 className="label-width mb-1 text-label text-ink-3">{group}</h3>
            <dl>
              {withKeys
                .filter((action) => action.group === group)
                .map((action) => (
                  <div
                    key={action.id}
                    className="flex items-center justify-between gap-4 border-b border-line-soft py-1"
                  >
                    <dt>{action.label}</dt>
                    <dd>
                      <KeyCap keys={action.keys ?? ""} />
                    </dd>
                  </div>
                ))}
            </dl>
          </section>
        ))}
      </div>
    </Dialog>
  );
}

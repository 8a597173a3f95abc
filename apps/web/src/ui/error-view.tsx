import type { ReactNode } from "react";
import { SeverityText } from "./severity.tsx";
import { LockIcon } from "./icons/icon.tsx";

/** Something did not work: what, what is unharmed, what to do. */
export function ErrorView({
  title,
  children,
  actions,
  reference,
  screen,
}: {
  title: string;
  children?: ReactNode;
  actions?: ReactNode;
  /** The request's name, to read out to whoever helps. */
  reference?: string;
  /** It fills a screen, so its title is the page's heading. */
  screen?: boolean;
}) {
  const Heading = screen ? "h1" : "h3";
  return (
    <div role="alert" className="max-w-xl p-4">
      <Heading className="text-head">
        <SeverityText severity="stop">{title}</SeverityText>
      </Heading>
      {children && <div className="mt-2 text-ink-2">{children}</div>}
      {actions && <div className="mt-3 flex flex-wrap gap-2">{actions}</div>}
      {reference && <p className="mt-3 text-help text-ink-3">Request {reference}</p>}
    </div>
  );
}

export function NoPermission({ title, children, screen }: { title: string; children?: ReactNode; screen?: boolean }) {
  const Heading = screen ? "h1" : "h3";
  return (
    <div className="max-w-xl p-4">
      <Heading className="flex items-center gap-2 text-head">
        <LockIcon />
        {title}
      </Heading>
      {children && <div className="mt-1 text-ink-2">{children}</div>}
    </div>
  );
}

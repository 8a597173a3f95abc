import { useRef, useState, type FormEvent } from "react";
import { ownPath } from "../../../lib/paths.ts";
import { Button } from "../../../ui/button.tsx";
import { PasswordField, TextField } from "../../../ui/controls.tsx";
import { Notice } from "../../../ui/notice.tsx";
import { signIn, type SignInAnswer } from "./sign-in.api.ts";
import { DoorFrame } from "./door-frame.tsx";

/** Opens light: no router, no cache, no schemas. What follows is loaded while the person types. */
export function SignInPage() {
  const [answer, setAnswer] = useState<SignInAnswer | null>(null);
  const [missing, setMissing] = useState<{ email?: string; password?: string }>({});
  const [busy, setBusy] = useState(false);
  const form = useRef<HTMLFormElement>(null);
  const query = new URLSearchParams(window.location.search);

  const submit = async (event: FormEvent<HTMLFormElement>) => {
    event.preventDefault();
    if (busy) return;
    const given = new FormData(event.currentTarget);
    const email = text(given, "email").trim();
    const password = text(given, "password");
    const lacking = {
      ...(/^\S+@\S+$/.test(email)
        ? {}
        : {
            email: email ? `“${email}” is not an e-mail address, such as name@company.example.` : "Type your e-mail.",
          }),
      ...(password ? {} : { password: "Type your password." }),
    };
    setMissing(lacking);
    setAnswer(null);
    const first = Object.keys(lacking)[0];
    if (first) return focus(form.current, first);
    setBusy(true);
    const answered = await signIn(email, password);
    if (answered.kind === "in") return window.location.assign(ownPath(query.get("next")) ?? "/");
    setBusy(false);
    setAnswer(answered);
    focus(form.current, "password");
  };

  return (
    <DoorFrame>
      <title>Sign in, Cleatwork</title>
      <form ref={form} noValidate onSubmit={(event) => void submit(event)} onInput={() => void warm()}>
        <h1 className="text-[1.75rem] leading-9 font-[660] tracking-tight">Sign in</h1>
        {query.get("did") === "reset" && (
          <Notice severity="good" title="Your password is changed. Sign in with the new one." className="mt-4" />
        )}
        {answer && <Refusal answer={answer} />}
        <div className="mt-4 grid gap-4">
          <TextField
            tall
            label="E-mail"
            name="email"
            type="email"
            autoComplete="username"
            autoFocus
            defaultValue={query.get("email") ?? ""}
            error={missing.email}
          />
          <PasswordField
            tall
            label="Password"
            name="password"
            autoComplete="current-password"
            error={missing.password}
            aside={
              <a href="/reset-password" className="text-help text-dye-ink underline underline-offset-3">
                Forgot it
              </a>
            }
          />
        </div>
        <Button type="submit" rank="primary" busy={busy} className="mt-6 h-11! w-full text-[0.9375rem]">
          {busy ? "Signing in" : "Sign in"}
        </Button>
        <p className="mt-6 border-t border-line pt-4 leading-[1.375rem] text-ink-2">
          New here? <a href="/sign-up">Set up your company</a>.
          <br />
          Got a quote by e-mail? Open it with the link in that e-mail, no account needed.
        </p>
      </form>
    </DoorFrame>
  );
}

function Refusal({ answer }: { answer: SignInAnswer }) {
  if (answer.kind === "in") return null;
  if (answer.kind === "wrong") {
    return (
      <Notice severity="stop" title="This e-mail and password do not go together" className="mt-4">
        Check both, or set a new password with “Forgot it”.
      </Notice>
    );
  }
  if (answer.kind === "no-connection") {
    return (
      <Notice severity="stop" title="No connection to Cleatwork" className="mt-4">
        Nothing was sent. Try again when you are online.
      </Notice>
    );
  }
  return (
    <Notice severity="stop" title={answer.problem.title} className="mt-4">
      {answer.problem.detail}
    </Notice>
  );
}

/** What comes after, fetched while the password is being typed. */
const warm = () => import("../../../app/app.tsx");

function text(given: FormData, name: string): string {
  const value = given.get(name);
  return typeof value === "string" ? value : "";
}

function focus(form: HTMLFormElement | null, name: string) {
  const field = form?.elements.namedItem(name);
  if (field instanceof HTMLElement) field.focus();
}

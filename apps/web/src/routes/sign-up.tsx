import { Link } from "react-router-dom";
import { DoorFrame, SignUpForm } from "../features/people/index.ts";
import { paths } from "../lib/paths.ts";

export function Component() {
  return (
    <DoorFrame>
      <title>Set up your company, Cleatwork</title>
      <h1 className="mb-4 text-[1.75rem] leading-9 font-[660] tracking-tight">Set up your company</h1>
      <SignUpForm />
      <p className="mt-6 border-t border-line pt-4 text-ink-2">
        Have an account?{" "}
        <Link reloadDocument to={paths.signIn()} className="text-dye-ink underline underline-offset-3">
          Sign in
        </Link>
        . Invited by your company? Open the link in that e-mail instead.
      </p>
    </DoorFrame>
  );
}

import { AskForReset, DoorFrame, SetNewPassword } from "../features/people/index.ts";
import { linkToken } from "../lib/link-token.ts";

export function Component() {
  const token = linkToken(window.location);
  return (
    <DoorFrame>
      <title>Set a new password, Cleatwork</title>
      <h1 className="mb-4 text-[1.75rem] leading-9 font-[660] tracking-tight">
        {token ? "Set a new password" : "Forgot your password?"}
      </h1>
      {token ? <SetNewPassword token={token} /> : <AskForReset />}
      <p className="mt-6 border-t border-line pt-4">
        <a href="/sign-in">Back to sign in</a>
      </p>
    </DoorFrame>
  );
}

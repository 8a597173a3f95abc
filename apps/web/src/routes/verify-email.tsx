import { DoorFrame, VerifyEmail } from "../features/people/index.ts";
import { linkToken } from "../lib/link-token.ts";

export function Component() {
  return (
    <DoorFrame>
      <title>Confirm your e-mail, Cleatwork</title>
      <h1 className="mb-4 text-[1.75rem] leading-9 font-[660] tracking-tight">Confirm your e-mail</h1>
      <VerifyEmail token={linkToken(window.location)} />
    </DoorFrame>
  );
}

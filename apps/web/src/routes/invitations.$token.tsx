import type { QueryClient } from "@tanstack/react-query";
import { useParams, type LoaderFunctionArgs } from "react-router-dom";
import { AcceptInvitation, DoorFrame, isLinkToken, peopleQueries } from "../features/people/index.ts";
import { NotFoundProblem } from "../lib/problem.ts";

export const loader =
  (client: QueryClient) =>
  ({ params }: LoaderFunctionArgs) => {
    const token = params.token ?? "";
    if (!isLinkToken(token)) throw new NotFoundProblem();
    void client.prefetchQuery(peopleQueries.invitation(token));
    return null;
  };

export function Component() {
  const token = useParams().token ?? "";
  return (
    <DoorFrame>
      <title>Your invitation, Cleatwork</title>
      <h1 className="mb-4 text-[1.75rem] leading-9 font-[660] tracking-tight">Join your company</h1>
      <AcceptInvitation token={token} />
    </DoorFrame>
  );
}

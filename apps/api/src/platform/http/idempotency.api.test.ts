import { randomUUID } from "node:crypto";
import { expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";
import { onlyOnce } from "./idempotency.ts";

async function aRequest() {
  const { server, organizationId, owner } = await foundCompany();
  const once = {
    tenant: server.deps.db.tenant(organizationId),
    personId: owner.id,
    key: randomUUID(),
    endpoint: "createProject",
    request: { name: "Tern Lake" },
    status: 201,
  };
  return { once, clock: server.clock };
}

/** Work that has begun when `begun` resolves and ends when told. */
function slowWork() {
  let begin = () => {};
  let end = () => {};
  const begun = new Promise<void>((resolve) => (begin = resolve));
  const ended = new Promise<void>((resolve) => (end = resolve));
  const work = async () => {
    begin();
    await ended;
    return { by: "the first" };
  };
  return { begun, work, end: () => end() };
}

test("a request that is sent again while it runs is told so, and done once", async () => {
  const { once } = await aRequest();
  const { begun, work, end } = slowWork();
  const running = onlyOnce(once, work);
  await begun;
  await expect(onlyOnce(once, () => Promise.resolve({ by: "the second" }))).rejects.toMatchObject({
    code: "still-running",
  });
  end();
  expect(await running).toEqual({ by: "the first" });
  expect(await onlyOnce(once, () => Promise.resolve({ by: "the second" }))).toEqual({ by: "the first" });
});

test("the key of a request that died is free after a while, for one of those who ask again", async () => {
  const { once, clock } = await aRequest();
  const { begun, work } = slowWork();
  void onlyOnce(once, work);
  await begun;
  clock.advanceDays(1);
  let done = 0;
  const again = () => onlyOnce(once, () => Promise.resolve(++done));
  await Promise.allSettled([again(), again(), again()]);
  expect(done).toBe(1);
  expect(await again()).toBe(1);
});

test("a request that was refused frees its key", async () => {
  const { once } = await aRequest();
  await expect(onlyOnce(once, () => Promise.reject(new Error("refused")))).rejects.toThrow("refused");
  expect(await onlyOnce(once, () => Promise.resolve("done"))).toBe("done");
});

import { expect, test } from "vitest";
import { foundCompany } from "../../testing/found-company.ts";

test("the people page reads members and open invitations in two round trips", async () => {
  const { owner } = await foundCompany();
  await owner.ok("invitePerson", { body: { email: "newcomer@here.example", role: "foreman" } });
  const answer = await owner.send("listPeople");
  expect(answer.headers.get("x-db-queries")).toBe("2");
  const { people, invitations } = await owner.ok("listPeople");
  expect(people.map(({ role }) => role)).toEqual(expect.arrayContaining(["owner", "estimator", "foreman"]));
  expect([...people].sort((a, b) => a.name.localeCompare(b.name, "en"))).toEqual(people);
  expect(invitations).toMatchObject([{ email: "newcomer@here.example", role: "foreman" }]);
  expect(people.map(({ name }) => name)).toContain(invitations[0]?.invitedBy);
});

test("the people page says when someone signed in last", async () => {
  const { owner } = await foundCompany();
  const { people } = await owner.ok("listPeople");
  const seen = people.find(({ role }) => role === "owner")?.lastSeenAt ?? "";
  expect(Number.isNaN(Date.parse(seen))).toBe(false);
});

const asOwner = { body: { role: "owner" } } as const;
const asEstimator = { body: { role: "estimator" } } as const;

test("the last owner can be neither removed nor given another role", async () => {
  const { owner } = await foundCompany();
  const params = { personId: owner.id };
  expect((await owner.refused("changeRole", { params, ...asEstimator })).status).toBe(409);
  expect((await owner.refused("removePerson", { params })).status).toBe(409);
  await owner.ok("listPeople");
});

test("two owners who take the role from each other at once leave one of them", async () => {
  const { owner, estimator } = await foundCompany();
  await owner.ok("changeRole", { params: { personId: estimator.id }, ...asOwner });
  const answers = await Promise.all([
    owner.send("changeRole", { params: { personId: estimator.id }, ...asEstimator }),
    estimator.send("changeRole", { params: { personId: owner.id }, ...asEstimator }),
  ]);
  expect(answers.filter(({ status }) => status < 400)).toHaveLength(1);
  const { people } = await owner.ok("listPeople");
  expect(people.filter(({ role }) => role === "owner")).toHaveLength(1);
});

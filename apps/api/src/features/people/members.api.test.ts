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

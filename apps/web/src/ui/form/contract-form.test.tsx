import { fireEvent, render, screen, waitFor } from "@testing-library/react";
import { createMemoryRouter, RouterProvider } from "react-router-dom";
import { describe, expect, it, vi } from "vitest";
import { z } from "zod";
import { problemBody } from "../../testing/answers.ts";
import { HttpProblem, NetworkProblem } from "../../lib/problem.ts";
import { Button } from "../button.tsx";
import { ContractFormView } from "./contract-form-view.tsx";
import { fieldMessage } from "./field-message.ts";
import { formParts } from "./form-parts.tsx";
import { fieldOfPointer } from "./pointers.ts";
import { useContractForm, type SaveContext } from "./use-contract-form.ts";

const schema = z.strictObject({
  name: z.string().trim().min(1, "at least one letter"),
  contacts: z.array(z.strictObject({ email: z.email("an e-mail address such as name@company.example") })),
});
const { Text } = formParts<z.input<typeof schema>>();
type Saved = { version: number };
type Save = (values: z.output<typeof schema>, context: SaveContext) => Promise<Saved>;

function Form({ save, onSaved, stored }: { save: Save; onSaved?: (saved: Saved) => void; stored?: string }) {
  const contractForm = useContractForm({
    schema,
    initial: { name: "Oxbow", contacts: [{ email: "ann@oxbow.example" }] },
    version: 2,
    save,
    onSaved: onSaved ?? (() => undefined),
    reload: () =>
      Promise.resolve({ values: { name: stored ?? "Oxbow", contacts: [{ email: "ann@oxbow.example" }] }, version: 7 }),
    fieldOf: { "email-taken": "contacts.0.email" },
  });
  return (
    <ContractFormView contractForm={contractForm} actions={<Button type="submit">Save</Button>}>
      <Text name="name" label="Name" />
      <Text name="contacts.0.email" label="E-mail" />
    </ContractFormView>
  );
}

function open(save: Save, more: { onSaved?: (saved: Saved) => void; stored?: string } = {}) {
  const router = createMemoryRouter([{ path: "/", element: <Form save={save} {...more} /> }]);
  render(<RouterProvider router={router} />);
}
const type = (label: string, value: string) => fireEvent.change(screen.getByLabelText(label), { target: { value } });
const press = (name = "Save") => fireEvent.click(screen.getByRole("button", { name }));
const refusal = (code: string, status: number, errors?: { pointer: string; code: string; message: string }[]) =>
  new HttpProblem(problemBody(code, status, errors));

describe("a form over a contract", () => {
  it("says which field, what was typed and what is allowed, without asking the server", async () => {
    const save = vi.fn<Save>();
    open(save);
    type("E-mail", "ann");
    press();
    expect(
      await screen.findByText("“ann” cannot be used here. Allowed: an e-mail address such as name@company.example."),
    ).toBeInTheDocument();
    expect(screen.getByLabelText("E-mail")).toBeInvalid();
    expect(save).not.toHaveBeenCalled();
  });

  it("puts the server's problems on their fields and the focus on the first", async () => {
    open(() =>
      Promise.reject(
        refusal("not-valid", 422, [{ pointer: "/contacts/0/email", code: "x", message: "another address" }]),
      ),
    );
    press();
    expect(
      await screen.findByText("“ann@oxbow.example” cannot be used here. Allowed: another address."),
    ).toBeInTheDocument();
    expect(screen.getByLabelText("E-mail")).toHaveFocus();
  });

  it("puts a problem without a pointer on the field that it is about", async () => {
    open(() => Promise.reject(refusal("email-taken", 409)));
    press();
    expect(await screen.findByText("email-taken it is.")).toBeInTheDocument();
    expect(screen.getByLabelText("E-mail")).toBeInvalid();
  });

  it("keeps what was typed when there is no connection, and the second try has the same key", async () => {
    const keys: string[] = [];
    const save = vi.fn<Save>((_, { idempotencyKey }) => {
      keys.push(idempotencyKey);
      return keys.length === 1 ? Promise.reject(new NetworkProblem()) : Promise.resolve({ version: 3 });
    });
    open(save);
    type("Name", "Oxbow West");
    press();
    expect(await screen.findByText("Not saved: no connection")).toBeInTheDocument();
    expect(screen.getByLabelText("Name")).toHaveValue("Oxbow West");
    press();
    await waitFor(() => expect(keys).toHaveLength(2));
    expect(keys[1]).toBe(keys[0]);
  });

  it("starts a new request after a refusal, since its body will differ", async () => {
    const keys: string[] = [];
    open((_, { idempotencyKey }) => {
      keys.push(idempotencyKey);
      return Promise.reject(refusal("wrong-state", 409));
    });
    press();
    await screen.findByText("wrong-state it is.");
    press();
    await waitFor(() => expect(keys).toHaveLength(2));
    expect(keys[1]).not.toBe(keys[0]);
  });

  it("builds the next save on the version that the last one made", async () => {
    const versions: number[] = [];
    open((_, { version }) => {
      versions.push(version);
      return Promise.resolve({ version: version + 1 });
    });
    press();
    await waitFor(() => expect(versions).toEqual([2]));
    press();
    await waitFor(() => expect(versions).toEqual([2, 3]));
  });

  describe("when someone saved first", () => {
    const staleOnce = () => {
      const versions: number[] = [];
      const save: Save = (_, { version }) => {
        versions.push(version);
        return versions.length === 1 ? Promise.reject(refusal("stale", 412)) : Promise.resolve({ version: 8 });
      };
      return { versions, save };
    };

    it("can save over it, on the version that is stored now", async () => {
      const { versions, save } = staleOnce();
      const onSaved = vi.fn();
      open(save, { onSaved, stored: "Theirs" });
      type("Name", "Mine");
      press();
      await screen.findByText("Someone saved before you");
      press("Save mine over it");
      await waitFor(() => expect(onSaved).toHaveBeenCalled());
      expect(versions).toEqual([2, 7]);
      expect(screen.getByLabelText("Name")).toHaveValue("Mine");
    });

    it("can show what they saved instead", async () => {
      const { save } = staleOnce();
      open(save, { stored: "Theirs" });
      type("Name", "Mine");
      press();
      await screen.findByText("Someone saved before you");
      press("Show what they saved");
      await waitFor(() => expect(screen.getByLabelText("Name")).toHaveValue("Theirs"));
    });
  });
});

describe("words of a form error", () => {
  it.each([
    ["", "at least one letter", "Needed: at least one letter."],
    [undefined, "Invalid input: expected number, received undefined", "Needed: a value."],
    [0, "more than zero", "“0” cannot be used here. Allowed: more than zero."],
    ["", "Too small: expected string to have >=1 characters", "Needed: some words."],
    [12_000_000, "Too big: expected number to be <=9999", "“12000000” cannot be used here. Allowed: at most 9999."],
    ["", "an id that starts with cli_", "Needed: one of the list."],
  ])("%s: %s", (value, allowed, words) => expect(fieldMessage(value, allowed)).toBe(words));
  it("shortens what is long", () => expect(fieldMessage("x".repeat(90), "less")).toContain(`${"x".repeat(40)}…`));
  it("reads a JSON pointer as the name of a field", () => {
    expect(fieldOfPointer("/contacts/0/email")).toBe("contacts.0.email");
    expect(fieldOfPointer("")).toBe("");
    expect(fieldOfPointer("/a~1b/c~0d")).toBe("a/b.c~d");
  });
});

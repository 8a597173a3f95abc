import { fireEvent, render, screen } from "@testing-library/react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { answerWith, problemBody } from "../../../testing/answers.ts";
import { SignInPage } from "./sign-in-page.tsx";

vi.mock("../../../app/app.tsx", () => ({ App: () => null })); // Only warmed up here; the router wants a whole browser.
afterEach(() => vi.unstubAllGlobals());

const fill = (email: string, password: string) => {
  fireEvent.change(screen.getByLabelText("E-mail"), { target: { value: email } });
  fireEvent.change(screen.getByLabelText("Password"), { target: { value: password } });
  fireEvent.click(screen.getByRole("button", { name: "Sign in" }));
};

describe("signing in", () => {
  it("says what is missing and asks nobody", () => {
    const asked = answerWith({ status: 200, body: {} });
    render(<SignInPage />);
    fill("teo", "");
    expect(screen.getByText(/“teo” is not an e-mail address/)).toBeInTheDocument();
    expect(screen.getByText("Type your password.")).toBeInTheDocument();
    expect(screen.getByLabelText("E-mail")).toHaveFocus();
    expect(asked).toHaveLength(0);
  });

  it("does not tell which of the two is wrong, and keeps the e-mail", async () => {
    answerWith({ status: 401, body: problemBody("credentials-wrong", 401) });
    render(<SignInPage />);
    fill("teo@tallgrass.example", "not the one");
    expect(await screen.findByText("This e-mail and password do not go together")).toBeInTheDocument();
    expect(screen.getByLabelText("E-mail")).toHaveValue("teo@tallgrass.example");
  });

  it("tells a missing connection from a wrong password", async () => {
    answerWith("no connection");
    render(<SignInPage />);
    fill("teo@tallgrass.example", "some words here");
    expect(await screen.findByText("No connection to Cleatwork")).toBeInTheDocument();
  });

  it("says when there were too many tries", async () => {
    answerWith({ status: 429, body: problemBody("too-many-requests", 429) });
    render(<SignInPage />);
    fill("teo@tallgrass.example", "some words here");
    expect(await screen.findByText("too-many-requests it is.")).toBeInTheDocument();
  });
});

import { act, fireEvent, render, screen } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, it, vi } from "vitest";
import { ConfirmByName } from "./confirm-dialog.tsx";
import { PasswordField, TextField } from "./controls.tsx";
import { SeverityText } from "./severity.tsx";
import { Toasts, notify } from "./toast.tsx";

describe("a field", () => {
  it("is named by its label and read with its hint and its error", () => {
    render(<TextField label="Sheet number" hint="As on the title block." error="Needed: a sheet number." />);
    const field = screen.getByRole("textbox", { name: "Sheet number" });
    expect(field).toBeInvalid();
    expect(field).toHaveAccessibleDescription("As on the title block. Needed: a sheet number.");
  });

  it("can show a password, and says whether it does", () => {
    render(<PasswordField label="Password" defaultValue="secret words" />);
    const button = screen.getByRole("button", { name: "Show the password" });
    expect(screen.getByLabelText("Password")).toHaveAttribute("type", "password");
    fireEvent.click(button);
    expect(screen.getByLabelText("Password")).toHaveAttribute("type", "text");
    expect(button).toHaveAttribute("aria-pressed", "true");
  });
});

describe("a severity", () => {
  it("differs by shape, so that it can be told without color", () => {
    const shapes = (["stop", "warn", "note", "good"] as const).map((severity) => {
      const { container } = render(<SeverityText severity={severity}>x</SeverityText>);
      return container.querySelector("path")?.getAttribute("d");
    });
    expect(new Set(shapes).size).toBe(4);
  });
});

describe("what cannot be undone", () => {
  const ask = () => {
    const onConfirm = vi.fn();
    render(
      <ConfirmByName
        open
        onOpenChange={() => undefined}
        title="Remove Finn Plover"
        name="Finn Plover"
        consequence="It ends."
        action="Remove"
        onConfirm={onConfirm}
      />,
    );
    return onConfirm;
  };
  const type = (text: string) => fireEvent.change(screen.getByRole("textbox"), { target: { value: text } });

  it("is not done before its name is typed, and says so", () => {
    const onConfirm = ask();
    type("Finn");
    fireEvent.click(screen.getByRole("button", { name: "Remove" }));
    expect(onConfirm).not.toHaveBeenCalled();
    expect(screen.getByText("This does not say “Finn Plover”.")).toBeInTheDocument();
  });
  it("is done once it is", () => {
    const onConfirm = ask();
    type("finn plover ");
    fireEvent.click(screen.getByRole("button", { name: "Remove" }));
    expect(onConfirm).toHaveBeenCalledOnce();
  });
});

describe("a toast", () => {
  beforeEach(() => {
    vi.useFakeTimers();
  });
  afterEach(() => {
    act(() => {
      vi.runAllTimers();
    });
    vi.useRealTimers();
  });

  it("is announced, and its undo works once", () => {
    const undo = vi.fn();
    render(<Toasts />);
    act(() => notify("Wall cap is $2.00 now.", { undo }));
    expect(screen.getByRole("status")).toHaveTextContent("Wall cap is $2.00 now.");
    fireEvent.click(screen.getByRole("button", { name: "Undo" }));
    expect(undo).toHaveBeenCalledOnce();
    expect(screen.queryByText("Wall cap is $2.00 now.")).not.toBeInTheDocument();
  });

  it("goes by itself, later where it can be undone", () => {
    render(<Toasts />);
    act(() => notify("Saved."));
    act(() => notify("Changed.", { undo: () => undefined }));
    act(() => {
      vi.advanceTimersByTime(7_000);
    });
    expect(screen.queryByText("Saved.")).not.toBeInTheDocument();
    expect(screen.getByText("Changed.")).toBeInTheDocument();
  });
});

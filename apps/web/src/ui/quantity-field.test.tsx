import { fireEvent, render, screen } from "@testing-library/react";
import { useState } from "react";
import { describe, expect, it, vi } from "vitest";
import { QuantityField, type Understood } from "./quantity-field.tsx";

const parse = (text: string): Understood<number> => {
  const value = Number(text.replace(/ ?in\.?$/, ""));
  return Number.isFinite(value)
    ? { ok: true, value: value * 0.0254 }
    : { ok: false, problems: [{ message: `“${text}” is not a length.` }] };
};
const format = (value: number) => {
  const shown = (value / 0.0254).toFixed(1);
  return { text: `${shown} in.`, value: shown, unit: "in." };
};

function Width({
  unclear,
  onChange,
}: {
  unclear?: "keep-last" | "no-value";
  onChange: (value: number | null) => void;
}) {
  const [value, setValue] = useState<number | null>(0.254);
  return (
    <QuantityField<number>
      label="Width"
      value={value}
      parse={parse}
      format={format}
      {...(unclear ? { whileUnclear: unclear } : {})}
      onChange={(next) => {
        setValue(next);
        onChange(next);
      }}
    />
  );
}

function typed(text: string, unclear?: "keep-last" | "no-value") {
  const onChange = vi.fn();
  render(<Width onChange={onChange} {...(unclear ? { unclear } : {})} />);
  const field = screen.getByRole("textbox", { name: "Width" });
  fireEvent.change(field, { target: { value: text } });
  return { field, onChange };
}

describe("a field for a quantity", () => {
  it("hands over SI and shows back what it understood", () => {
    const { onChange } = typed("24 in");
    expect(onChange).toHaveBeenLastCalledWith(24 * 0.0254);
    expect(screen.getByText("= 24.0 in.")).toBeInTheDocument();
  });

  it("keeps the last good value in force while the text is not understood, and says so", () => {
    const { field, onChange } = typed("24x");
    expect(onChange).not.toHaveBeenCalled();
    expect(field).toBeInvalid();
    expect(field).toHaveAccessibleDescription("“24x” is not a length. 10.0 in. stays in force.");
  });

  it("has no value in a form while the text is not understood, so that it cannot be saved", () => {
    const { field, onChange } = typed("24x", "no-value");
    expect(onChange).toHaveBeenLastCalledWith(null);
    expect(field).toHaveAccessibleDescription("“24x” is not a length.");
  });

  it("puts back what stood there on Escape", () => {
    const { field, onChange } = typed("24x", "no-value");
    fireEvent.keyDown(field, { key: "Escape" });
    expect(onChange).toHaveBeenLastCalledWith(0.254);
    expect(field).toHaveValue("10.0");
  });

  it("shows the value in its own spelling once it is left", () => {
    const { field } = typed("24");
    fireEvent.blur(field);
    expect(field).toHaveValue("24.0");
  });
});

// @vitest-environment jsdom
import { cleanup, fireEvent, render, screen, waitFor } from "@testing-library/react";
import { createElement } from "react";
import { afterEach, describe, expect, it, vi } from "vitest";
import { QuantityField } from "@/components/ui/quantity-field";

afterEach(cleanup);

function field(value: number | null, more: { emptyMeaning?: string } = {}) {
  const onCommit = vi.fn();
  const props = {
    id: "bore",
    label: "Bore",
    kind: "length" as const,
    value,
    min: 0.005,
    max: 2,
    step: 0.0005,
    onCommit,
    ...more,
  };
  render(createElement(QuantityField, props));
  const input = screen.getByLabelText<HTMLInputElement>("Bore");
  const type = (text: string, key = "Enter") => {
    fireEvent.change(input, { target: { value: text } });
    fireEvent.keyDown(input, { key });
  };
  return { input, onCommit, type };
}

describe("QuantityField", () => {
  it("takes what is typed on Enter, in any unit", () => {
    const { type, onCommit } = field(0.101);
    type("3/4 in");
    expect(onCommit).toHaveBeenCalledExactlyOnceWith(0.01905);
  });

  it("takes it on leaving, and nothing where nothing was changed", () => {
    const { input, onCommit } = field(0.101);
    fireEvent.blur(input);
    expect(onCommit).not.toHaveBeenCalled();
    fireEvent.change(input, { target: { value: "102" } });
    fireEvent.blur(input);
    expect(onCommit).toHaveBeenCalledExactlyOnceWith(0.102);
  });

  it("refuses what is out of range, names field, value and range, and restores on Escape", () => {
    const { input, type, onCommit } = field(0.101);
    type("3");
    expect(onCommit).not.toHaveBeenCalled();
    expect(screen.getByRole("alert").textContent).toBe(
      "Bore: 3.0 mm is not allowed. It can be 5 to 2000 mm.",
    );
    expect(input.getAttribute("aria-invalid")).toBe("true");
    expect(input.getAttribute("aria-describedby")).toContain("bore-fault");
    fireEvent.keyDown(input, { key: "Escape" });
    expect(input.value).toBe("101.0");
    expect(screen.queryByRole("alert")).toBeNull();
  });

  it("works sums out", async () => {
    const { type, onCommit } = field(0.101);
    type("18 mm + 3/8 in");
    await waitFor(() => expect(onCommit).toHaveBeenCalledExactlyOnceWith(0.027525), {
      timeout: 5_000,
    });
  });

  it("steps by arrows, ten times with Shift", () => {
    const { input, onCommit } = field(0.101);
    fireEvent.keyDown(input, { key: "ArrowUp" });
    fireEvent.keyDown(input, { key: "ArrowDown", shiftKey: true });
    expect(onCommit.mock.calls).toEqual([[0.1015], [0.096]]);
  });

  it("may be left empty only where that means something", () => {
    const plain = field(0.101);
    plain.type("");
    expect(screen.getByRole("alert").textContent).toBe("Bore needs a number.");
    expect(plain.onCommit).not.toHaveBeenCalled();
    cleanup();
    const optional = field(0.101, { emptyMeaning: "the vent's" });
    optional.type("");
    expect(optional.onCommit).toHaveBeenCalledExactlyOnceWith(null);
  });
});

import { render, screen } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { describe, expect, test } from "vitest";
import type { Quantity } from "../../server/contracts/quantity.ts";
import { QuantityField } from "../../src/components/form/quantity-field.tsx";
import { measured, typical } from "./support/plan-fixture.ts";

function Ridge({ start, error, system = "si" }: { start: Quantity; error?: string; system?: "si" | "us" }) {
  const [value, setValue] = useState(start);
  return (
    <>
      <QuantityField
        label="Ridge height"
        value={value}
        onChange={setValue}
        system={system}
        error={error}
        typedOrigin="measured"
      />
      <output>{JSON.stringify(value)}</output>
    </>
  );
}

const stored = () => JSON.parse(screen.getByRole("status").textContent ?? "{}") as Quantity;

describe("a number field", () => {
  test("keeps the figure exactly as it is typed", async () => {
    const person = userEvent.setup();
    render(<Ridge start={measured("4.7", "m")} />);
    const input = screen.getByRole("textbox", { name: "Ridge height" });
    await person.clear(input);
    await person.type(input, "4.70");
    expect(stored()).toEqual({ typed: "4.70", unit: "m", origin: "measured" });
  });

  test("plus, minus and the arrow keys step by the unit's step", async () => {
    const person = userEvent.setup();
    render(<Ridge start={measured("4.7", "m")} />);
    await person.click(screen.getByRole("button", { name: "More: Ridge height" }));
    expect(stored().typed).toBe("4.8");
    await person.click(screen.getByRole("button", { name: "Less: Ridge height" }));
    await person.click(screen.getByRole("button", { name: "Less: Ridge height" }));
    expect(stored().typed).toBe("4.6");
    await person.click(screen.getByRole("textbox", { name: "Ridge height" }));
    await person.keyboard("{ArrowUp}");
    expect(stored().typed).toBe("4.7");
  });

  test("switching the unit keeps the measure", async () => {
    const person = userEvent.setup();
    render(<Ridge start={measured("3", "m")} />);
    await person.selectOptions(screen.getByRole("combobox", { name: "Unit of Ridge height" }), "ft");
    expect(stored()).toEqual({ typed: "9.843", unit: "ft", origin: "measured" });
  });

  test("typing over a typical value makes it the person's own, in the unit it was shown in", async () => {
    const person = userEvent.setup();
    render(<Ridge start={typical("3", "m")} system="us" />);
    const input = screen.getByRole("textbox", { name: "Ridge height" });
    expect(input).toHaveProperty("value", "9.843");
    await person.clear(input);
    await person.type(input, "10");
    expect(stored()).toEqual({ typed: "10", unit: "ft", origin: "measured" });
  });

  test("where it came from can be changed by itself", async () => {
    const person = userEvent.setup();
    render(<Ridge start={measured("4.7", "m")} />);
    await person.selectOptions(
      screen.getByRole("combobox", { name: "Where this came from: Ridge height" }),
      "guess",
    );
    expect(stored()).toEqual({ typed: "4.7", unit: "m", origin: "guess" });
  });

  test("an error is tied to the field and spoken", () => {
    render(
      <Ridge
        start={measured("40", "m")}
        error="Ridge height must lie between 0.8 m and 25 m. You typed 40 m."
      />,
    );
    const input = screen.getByRole("textbox", { name: "Ridge height" });
    expect(input.getAttribute("aria-invalid")).toBe("true");
    const error = screen.getByText(/must lie between/);
    expect(input.getAttribute("aria-describedby")?.split(" ")).toContain(error.id);
    expect(error.getAttribute("aria-live")).toBe("polite");
  });
});

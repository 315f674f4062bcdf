import { screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, test, vi } from "vitest";
import type { FarmView } from "../../server/contracts/farms.ts";
import { PinScreen } from "../../src/features/map/pin-screen.tsx";
import { ApiError } from "../../src/lib/api-client.ts";
import { meFixture, showScreen } from "./support/with-client.tsx";

const send = vi.hoisted(() => vi.fn());
vi.mock("../../src/lib/api-client.ts", async (original) => ({
  ...(await original<typeof import("../../src/lib/api-client.ts")>()),
  api: { get: vi.fn(() => new Promise(() => {})), post: send },
}));
// The map itself is tested in a real browser; here the form is, which does all the map does.
vi.mock("../../src/components/sheet-map/sheet-map.tsx", () => ({ SheetMap: () => null }));

const farm: FarmView = {
  id: "f1",
  cooperativeId: "c1",
  name: "Low Sallow",
  place: "Kelderness",
  latitudeDeg: 54.4,
  longitudeDeg: 2.4,
  sharedWithManager: false,
  people: [],
  buildingCount: 0,
  can: { update: true, addBuilding: true, assign: true, share: false, delete: true },
};

function show(farms: FarmView[] = [farm], units: "si" | "us" = "si") {
  return showScreen(<PinScreen />, {
    at: "/map/new",
    path: "/map/new",
    data: [
      [["me"], meFixture({ units })],
      [["farms"], farms],
      [["buildings"], []],
    ],
  });
}

beforeEach(() => {
  send.mockReset();
});

async function fill(person: ReturnType<typeof userEvent.setup>) {
  await person.type(screen.getByLabelText("Latitude"), "54.41");
  await person.type(screen.getByLabelText("Longitude"), "2.39 E");
  await person.type(screen.getByRole("textbox", { name: /^Name/ }), "Tunnel 3");
}

describe("pinning a building", () => {
  test("sends the place, the kind and the sizes as they were typed", async () => {
    const person = userEvent.setup();
    send.mockResolvedValue({ id: "b9" });
    const { router } = show();
    await fill(person);
    await person.click(screen.getByRole("radio", { name: "Stock barn" }));
    const length = screen.getByRole("textbox", { name: /^Length/ });
    await person.clear(length);
    await person.type(length, "48.5");
    await person.click(screen.getByRole("button", { name: "Keep it and survey" }));
    expect(send).toHaveBeenCalledWith("/api/farms/f1/buildings", {
      name: "Tunnel 3",
      kind: "barn",
      shapeType: "gothicArch",
      position: { latitudeDeg: 54.41, longitudeDeg: 2.39 },
      footprint: {
        length: { typed: "48.5", unit: "m", origin: "guess" },
        width: { typed: "9", unit: "m", origin: "default" },
        ridgeBearing: { typed: "0", unit: "deg", origin: "default" },
      },
      farFromFarmConfirmed: false,
    });
    expect(await screen.findByText("elsewhere")).toBeTruthy();
    expect(router.state.location.pathname).toBe("/buildings/b9/survey");
  });

  test("sends nothing while something is missing, and leads to it", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("button", { name: "Keep it and survey" }));
    expect(send).not.toHaveBeenCalled();
    expect(screen.getByText("Building name is missing.")).toBeTruthy();
    expect(screen.getByText(/^Say where it stands/)).toBeTruthy();
    await person.type(screen.getByRole("textbox", { name: /^Name/ }), "x");
    expect(screen.queryByText("Building name is missing.")).toBeNull();
  });

  test("a pair pasted into one field fills both", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByLabelText("Latitude"));
    await person.paste("41.2 S 172.6 E");
    expect(screen.getByLabelText("Latitude")).toHaveProperty("value", "-41.20000");
    expect(screen.getByLabelText("Longitude")).toHaveProperty("value", "172.60000");
  });

  test("a far pin is asked about once, and kept when it is meant", async () => {
    const person = userEvent.setup();
    const words = "This is 900 km from Low Sallow. Perhaps the sign of the longitude looks wrong.";
    send.mockRejectedValueOnce(
      new ApiError(422, {
        error: { code: "invalid_input", message: "The pin is far.", fields: { position: words } },
      }),
    );
    send.mockResolvedValue({ id: "b9" });
    show();
    await fill(person);
    await person.click(screen.getByRole("button", { name: "Keep it and survey" }));
    expect(await screen.findByText(words)).toBeTruthy();
    await person.click(screen.getByRole("button", { name: "The place is right, keep it" }));
    expect(send).toHaveBeenLastCalledWith(
      "/api/farms/f1/buildings",
      expect.objectContaining({ farFromFarmConfirmed: true }),
    );
  });

  test("a refusal stands under its field and goes once the answer is changed", async () => {
    const person = userEvent.setup();
    const words = "Length must lie between 2 m and 1000 m. You typed 36000 m.";
    send.mockRejectedValueOnce(
      new ApiError(422, {
        error: { code: "invalid_input", message: "No.", fields: { "footprint.length": words } },
      }),
    );
    show();
    await fill(person);
    await person.click(screen.getByRole("button", { name: "Keep it and survey" }));
    expect(await screen.findByText(words)).toBeTruthy();
    const length = screen.getByRole("textbox", { name: /^Length/ });
    expect(length.getAttribute("aria-invalid")).toBe("true");
    await person.type(length, "5");
    expect(screen.queryByText(words)).toBeNull();
  });

  test("begins in feet for whoever reads feet", () => {
    show([farm], "us");
    expect(screen.getByRole("textbox", { name: /^Length/ })).toHaveProperty("value", "96");
  });

  test("a co-operative without farms adds the first one on the way", () => {
    show([]);
    const form = screen.getByRole("form", { name: "New farm" });
    expect(within(form).getByLabelText("Farmer's e-mail")).toBeTruthy();
  });

  test("a barn is not offered the shapes of a glass range", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("radio", { name: /Venlo|Small spans/ }));
    await person.click(screen.getByRole("radio", { name: "Stock barn" }));
    expect(screen.queryByRole("radio", { name: /Venlo|Small spans/ })).toBeNull();
    expect(screen.getByRole("radio", { name: /attic/ })).toHaveProperty("checked", true);
  });
});

import { screen, waitFor, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { beforeEach, describe, expect, test, vi } from "vitest";
import type { FarmView } from "../../server/contracts/farms.ts";
import type { PersonView } from "../../server/contracts/people.ts";
import { FarmScreen } from "../../src/features/farms/farm-screen.tsx";
import { FarmsScreen } from "../../src/features/farms/farms-screen.tsx";
import { PeopleScreen } from "../../src/features/people/people-screen.tsx";
import { ApiError } from "../../src/lib/api-client.ts";
import { buildingFixture } from "./support/plan-fixture.ts";
import { meFixture, showScreen } from "./support/with-client.tsx";

const server = vi.hoisted(() => ({ get: vi.fn(), post: vi.fn(), patch: vi.fn(), delete: vi.fn() }));
vi.mock("../../src/lib/api-client.ts", async (original) => ({
  ...(await original<typeof import("../../src/lib/api-client.ts")>()),
  api: server,
}));

beforeEach(() => {
  for (const call of Object.values(server)) call.mockReset();
  server.get.mockReturnValue(new Promise(() => {}));
});

const refusal = (fields: Record<string, string>) =>
  new ApiError(422, { error: { code: "invalid_input", message: "No.", fields } });

const people: PersonView[] = [
  {
    id: "p1",
    name: "Ana",
    email: "ana@example.org",
    roles: ["advisor"],
    hasSignedIn: true,
    farmNames: ["Low Sallow"],
  },
  { id: "p2", name: "Ben", email: "ben@example.org", roles: ["manager"], hasSignedIn: false, farmNames: [] },
];

function showPeople() {
  showScreen(<PeopleScreen />, {
    data: [
      [["me"], meFixture({ activeRole: "manager" })],
      [["cooperatives", "c1", "people"], people],
    ],
  });
}

describe("people of the co-operative", () => {
  test("a role is taken away only after it was asked, naming the farms that go with it", async () => {
    const person = userEvent.setup();
    server.delete.mockResolvedValue(undefined);
    showPeople();
    await person.click(screen.getByRole("button", { name: "Adviser: take this role from Ana" }));
    const dialog = screen.getByRole("dialog");
    expect(dialog.textContent).toContain("no longer works on Low Sallow");
    expect(server.delete).not.toHaveBeenCalled();
    await person.click(within(dialog).getByRole("button", { name: "Take the role away" }));
    expect(server.delete).toHaveBeenCalledWith("/api/cooperatives/c1/people/p1/advisor");
  });

  test("the last manager stays, in the server's words", async () => {
    const person = userEvent.setup();
    server.delete.mockRejectedValue(refusal({ role: "The co-operative needs at least one manager." }));
    showPeople();
    await person.click(screen.getByRole("button", { name: "Manager: take this role from Ben" }));
    await person.click(screen.getByRole("button", { name: "Take the role away" }));
    expect(await screen.findByText("The co-operative needs at least one manager.")).toBeTruthy();
  });

  test("an invitation says under which field it was refused", async () => {
    const person = userEvent.setup();
    server.post.mockRejectedValue(
      refusal({ email: "Write a full e-mail address, such as name@example.org." }),
    );
    showPeople();
    await person.type(screen.getByLabelText("Name"), "Cyd");
    await person.type(screen.getByRole("textbox", { name: /^E-mail/ }), "cyd");
    await person.click(screen.getByRole("radio", { name: "Farmer" }));
    await person.click(screen.getByRole("button", { name: "Invite" }));
    expect(server.post).toHaveBeenCalledWith("/api/cooperatives/c1/people", {
      name: "Cyd",
      email: "cyd",
      role: "farmer",
    });
    expect(await screen.findByText(/^Write a full e-mail address/)).toBeTruthy();
    expect(screen.getByRole("textbox", { name: /^E-mail/ }).getAttribute("aria-invalid")).toBe("true");
  });
});

function farm(change: Partial<FarmView> = {}): FarmView {
  return {
    id: "f1",
    cooperativeId: "c1",
    name: "Low Sallow",
    place: "Kelderness",
    latitudeDeg: 54.4,
    longitudeDeg: -0.6,
    sharedWithManager: false,
    people: [{ id: "p3", name: "Tom", email: "tom@example.org", role: "farmer" }],
    buildingCount: 1,
    can: { update: true, addBuilding: true, assign: false, share: true, delete: false },
    ...change,
  };
}

function showFarm(view: FarmView, buildings = [buildingFixture()]) {
  return showScreen(<FarmScreen />, {
    at: "/farms/f1",
    path: "/farms/:farmId",
    data: [
      [["me"], meFixture({ activeRole: "farmer" })],
      [["farms", "f1"], view],
      [["buildings"], buildings],
    ],
  });
}

describe("a farm", () => {
  test("the farmer opens survey and plan to the manager", async () => {
    const person = userEvent.setup();
    server.patch.mockResolvedValue(farm({ sharedWithManager: true }));
    showFarm(farm());
    await person.click(screen.getByRole("checkbox", { name: "The manager may open survey and plan" }));
    expect(server.patch).toHaveBeenCalledWith("/api/farms/f1", { sharedWithManager: true });
    await waitFor(() => expect(screen.getByRole("checkbox")).toHaveProperty("checked", true));
  });

  test("an adviser reads the farmer's choice and cannot change it", () => {
    showFarm(farm({ can: { update: true, addBuilding: true, assign: true, share: false, delete: true } }));
    expect(screen.queryByRole("checkbox")).toBeNull();
    expect(screen.getByText("The farmer shares the result only.")).toBeTruthy();
  });

  test("the yard is told in words beside its drawing", () => {
    showFarm(farm());
    expect(screen.getByRole("img", { name: "Ground plan, north up: Tunnel 2, ridge at 10°" })).toBeTruthy();
  });

  test("houses far apart are no yard", () => {
    const far = { ...buildingFixture(), id: "b2", name: "Far", latitudeDeg: 55 };
    showFarm(farm({ buildingCount: 2 }), [buildingFixture(), far]);
    expect(screen.queryByRole("img", { name: /^Ground plan/ })).toBeNull();
  });

  test("a building is removed only after it was asked", async () => {
    const person = userEvent.setup();
    server.delete.mockResolvedValue(undefined);
    showFarm(farm());
    await person.click(screen.getByRole("button", { name: "Change or remove Tunnel 2" }));
    await person.click(screen.getByRole("button", { name: "Remove" }));
    expect(server.delete).not.toHaveBeenCalled();
    await person.click(screen.getByRole("button", { name: "Remove it for good" }));
    expect(server.delete).toHaveBeenCalledWith("/api/buildings/b1");
  });
});

describe("the list of farms", () => {
  test("a farmer with one farm goes straight to it", async () => {
    const { router } = showScreen(<FarmsScreen />, {
      at: "/farms",
      path: "/farms",
      data: [
        [["me"], meFixture({ activeRole: "farmer" })],
        [["farms"], [farm()]],
        [["buildings"], []],
      ],
    });
    await waitFor(() => expect(router.state.location.pathname).toBe("/farms/f1"));
  });

  test("an adviser starts from nothing with the one next step", async () => {
    const person = userEvent.setup();
    showScreen(<FarmsScreen />, {
      at: "/farms",
      path: "/farms",
      data: [
        [["me"], meFixture()],
        [["farms"], []],
        [["buildings"], []],
      ],
    });
    await person.click(screen.getByRole("button", { name: "Add a farm" }));
    await person.type(screen.getByLabelText("Name of the farm"), "Hill End");
    await person.click(screen.getByRole("button", { name: "Add the farm" }));
    expect(server.post).not.toHaveBeenCalled();
    expect(screen.getByText(/^Say where the farm is/)).toBeTruthy();
  });
});

import { screen, within } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { useState } from "react";
import { describe, expect, test, vi } from "vitest";
import { HouseList } from "../../src/features/map/list/house-list.tsx";
import { findHouses, type Standing } from "../../src/features/map/list/house-order.ts";
import { buildingFixture } from "./support/plan-fixture.ts";
import { meFixture, showScreen } from "./support/with-client.tsx";

const houses = [
  { ...buildingFixture(), id: "a", name: "Tunnel 2" },
  { ...buildingFixture(), id: "b", name: "Seedling house", farmName: "Peat Carr" },
];

function Beside({ onPlace }: { onPlace: () => void }) {
  const [text, setText] = useState("");
  const [standing, setStanding] = useState<Standing>("all");
  const [chosenId, setChosenId] = useState<string | null>(null);
  return (
    <HouseList
      all={houses}
      found={findHouses(houses, { text, standing })}
      text={text}
      standing={standing}
      chosenId={chosenId}
      onText={setText}
      onStanding={setStanding}
      onChoose={setChosenId}
      onPlace={onPlace}
    />
  );
}

function show(onPlace = vi.fn()) {
  showScreen(<Beside onPlace={onPlace} />, {
    data: [
      [["me"], meFixture()],
      [
        ["places", "search", "peat"],
        [{ name: "Peatown", country: "XX", population: 900, latitudeDeg: 54, longitudeDeg: 2 }],
      ],
      [["places", "search", "pea"], []],
    ],
  });
  return onPlace;
}

const shown = () => within(screen.getByRole("list", { name: "Buildings" })).getAllByRole("listitem");

describe("the list beside the map", () => {
  test("a chosen house opens with its figures and the way in", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("button", { name: /^Tunnel 2/ }));
    expect(screen.getByRole("button", { name: /^Tunnel 2/ }).getAttribute("aria-expanded")).toBe("true");
    expect(screen.getByRole("link", { name: "Go on with the survey" }).getAttribute("href")).toBe(
      "/buildings/a/survey",
    );
  });

  test("search finds houses by farm, and places beside them", async () => {
    const person = userEvent.setup();
    const onPlace = show();
    await person.type(screen.getByRole("searchbox", { name: "Find a farm, building or place" }), "peat");
    expect(shown()).toHaveLength(1);
    await person.click(await screen.findByRole("button", { name: /Peatown/ }));
    expect(onPlace).toHaveBeenCalledOnce();
  });

  test("arrow keys move the filter, and an empty answer says what to do", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("radio", { name: /^All 2/ }));
    await person.keyboard("{ArrowRight}");
    expect(screen.getByText("No building fits. Clear the search, or show all.")).toBeTruthy();
  });
});

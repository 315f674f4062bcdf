import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { cleanup, render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { MemoryRouter } from "react-router-dom";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import type { BuildingView } from "../../server/contracts/buildings.ts";
import type { LibraryView } from "../../server/contracts/library.ts";
import type { SurveyView } from "../../server/contracts/survey.ts";
import { readDraft } from "../../src/features/survey/draft-store.ts";
import { SurveyForm } from "../../src/features/survey/survey-form.tsx";
import { buildingFixture, surveyFixture } from "./support/plan-fixture.ts";

const server = vi.hoisted(() => ({ get: vi.fn(), put: vi.fn(), post: vi.fn() }));
const Refused = vi.hoisted(
  () =>
    class extends Error {
      code: string;
      fields: Record<string, string>;
      constructor(code: string, message: string, fields: Record<string, string> = {}) {
        super(message);
        this.code = code;
        this.fields = fields;
      }
    },
);
vi.mock("../../src/lib/api-client.ts", () => ({ ApiError: Refused, api: server }));

const library: LibraryView = {
  covers: [],
  screens: [],
  crops: [],
  animals: [],
  leakage: [],
  floorEdges: [],
  heaterTypes: [],
  fuels: [],
};
const building = {
  ...buildingFixture(),
  can: { update: true, delete: false, plan: true, readSurvey: true },
} as unknown as BuildingView;

const view = (change: Partial<SurveyView> = {}): SurveyView => ({
  buildingId: "b1",
  version: 4,
  survey: surveyFixture(),
  answered: 31,
  questions: 34,
  savedAt: "2026-11-24T16:08:00.000Z",
  savedBy: "Marit Oldroyd",
  can: { update: true },
  ...change,
});

function show(start: SurveyView = view()) {
  render(
    <QueryClientProvider client={new QueryClient()}>
      <MemoryRouter>
        <SurveyForm building={building} view={start} library={library} />
      </MemoryRouter>
    </QueryClientProvider>,
  );
}

const ridge = () => screen.getByRole("textbox", { name: "Ridge height" });
const goOn = () => screen.getByRole("button", { name: "Next: Cover" });

async function type(text: string) {
  const person = userEvent.setup();
  await person.clear(ridge());
  await person.type(ridge(), text);
  await person.click(goOn());
}

beforeEach(() => {
  localStorage.clear();
  for (const call of Object.values(server)) call.mockReset();
});
afterEach(cleanup);

describe("the survey saves itself", () => {
  test("sends the version it started from, and says when it was saved", async () => {
    server.put.mockImplementation((_path: string, body: { survey: SurveyView["survey"] }) =>
      Promise.resolve(view({ version: 5, survey: body.survey, savedAt: "2026-11-24T16:30:00.000Z" })),
    );
    show();
    await type("4.9");
    await waitFor(() => expect(server.put).toHaveBeenCalled());
    const [path, body] = server.put.mock.calls[0] ?? [];
    expect(path).toBe("/api/buildings/b1/survey");
    expect(body.version).toBe(4);
    expect(body.survey.shape.ridgeHeight.typed).toBe("4.9");
    await waitFor(() => expect(screen.getByRole("status").textContent).toMatch(/^Saved/));
    expect(readDraft("b1")).toBeNull();
  });

  test("keeps changes on the device when the server cannot be reached", async () => {
    server.put.mockRejectedValue(new TypeError("failed to fetch"));
    show();
    await type("4.9");
    await waitFor(() => expect(screen.getByRole("status").textContent).toBe("On this device only, 1 change"));
    expect(readDraft("b1")).toMatchObject({ version: 4, changes: 1 });
  });

  test("an answer that breaks the contract is not sent, is said in words, and is not lost", async () => {
    show();
    const person = userEvent.setup();
    await person.clear(ridge());
    await person.type(ridge(), "400");
    const problems = await screen.findAllByText(/Ridge height must lie between 0.8/);
    expect(problems[0]?.id).toBe(ridge().getAttribute("aria-describedby"));
    await person.click(goOn());
    await waitFor(() => expect(screen.getByRole("status").textContent).toContain("needs another look"));
    expect(server.put).not.toHaveBeenCalled();
    expect(readDraft("b1")?.survey.shape).toMatchObject({ ridgeHeight: { typed: "400" } });
  });

  test("the server's own sentence stands at the answer it refused", async () => {
    server.put.mockRejectedValue(
      new Refused("invalid_input", "One answer was refused.", {
        "survey.shape.width": "Width disagrees with the map.",
      }),
    );
    show();
    await type("4.9");
    await waitFor(() => expect(screen.getByRole("status").textContent).toContain("Could not save"));
    await userEvent.setup().click(screen.getByRole("button", { name: "Back" }));
    expect(screen.getByText("Width disagrees with the map.")).toBeDefined();
  });
});

describe("two people on one survey", () => {
  async function collide() {
    server.put.mockRejectedValueOnce(new Refused("stale", "Somebody saved a newer version."));
    const theirs = surveyFixture();
    theirs.elevation = { typed: "99", unit: "m", origin: "measured" };
    server.get.mockResolvedValue(view({ version: 7, survey: theirs, savedBy: "Tomas Wray" }));
    show();
    await type("4.9");
    expect(await screen.findByText(/Tomas Wray saved this survey/)).toBeDefined();
  }

  test("nothing is overwritten before a choice; keeping mine sends it on top of theirs", async () => {
    await collide();
    server.put.mockImplementation((_path: string, body: { survey: SurveyView["survey"] }) =>
      Promise.resolve(view({ version: 8, survey: body.survey })),
    );
    expect(server.put).toHaveBeenCalledTimes(1);
    await userEvent.setup().click(screen.getByRole("button", { name: "Keep mine" }));
    await waitFor(() => expect(server.put).toHaveBeenCalledTimes(2));
    expect(server.put.mock.calls[1]?.[1]).toMatchObject({
      version: 7,
      survey: { shape: { ridgeHeight: { typed: "4.9" } } },
    });
  });

  test("taking theirs puts their answers in the form and drops the draft", async () => {
    await collide();
    const person = userEvent.setup();
    await person.click(screen.getByRole("button", { name: "Take theirs" }));
    expect(screen.queryByText(/Tomas Wray saved/)).toBeNull();
    await person.click(screen.getByRole("button", { name: /Back/ }));
    expect(ridge()).toHaveProperty("value", "4.7");
    expect(readDraft("b1")).toBeNull();
  });
});

describe("a tab that was closed", () => {
  test("its answers come back with words and are sent", async () => {
    const survey = surveyFixture();
    survey.elevation = { typed: "77", unit: "m", origin: "measured" };
    localStorage.setItem(
      "glassbyre.survey.b1",
      JSON.stringify({ version: 4, survey, changes: 1, keptAt: "2026-11-24T15:00:00.000Z" }),
    );
    server.put.mockResolvedValue(view({ version: 5, survey }));
    show();
    expect(screen.getByText("1 change kept on this device is back.")).toBeDefined();
    await waitFor(() => expect(server.put).toHaveBeenCalled());
    expect(server.put.mock.calls[0]?.[1]?.survey.elevation.typed).toBe("77");
  });
});

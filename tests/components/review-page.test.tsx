import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { MemoryRouter } from "react-router-dom";
import { beforeEach, describe, expect, test, vi } from "vitest";
import type { PlanView } from "../../server/contracts/plans.ts";
import { ReviewPage } from "../../src/features/review/review-page.tsx";
import { planFixture } from "./support/plan-fixture.ts";

const post = vi.hoisted(() => vi.fn());
vi.mock("../../src/lib/api-client.ts", () => ({
  ApiError: class extends Error {},
  api: { get: vi.fn(() => new Promise(() => {})), post, put: vi.fn() },
}));

function show(plan: PlanView = planFixture()) {
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  client.setQueryData(["library"], { covers: [], crops: [], animals: [], leakage: [], fuels: [] });
  render(
    <QueryClientProvider client={client}>
      <MemoryRouter>
        <ReviewPage plan={plan} />
      </MemoryRouter>
    </QueryClientProvider>,
  );
}

beforeEach(() => {
  post.mockReset();
});

describe("the farmer's page", () => {
  test("approving takes two presses and sends the answer", async () => {
    const person = userEvent.setup();
    post.mockResolvedValue(planFixture({ status: "approved" }));
    show();
    await person.click(screen.getByRole("button", { name: /^Approve/ }));
    expect(post).not.toHaveBeenCalled();
    await person.click(screen.getByRole("button", { name: "Yes, approve" }));
    expect(post).toHaveBeenCalledWith("/api/plans/p1/answer", { answer: "approve", message: "" });
  });

  test("a question cannot be sent empty", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("button", { name: /^Ask Marit/ }));
    expect(screen.getByRole("button", { name: "Send the question" })).toHaveProperty("disabled", true);
    await person.type(screen.getByLabelText("Your question"), "Would one big heater do?");
    await person.click(screen.getByRole("button", { name: "Send the question" }));
    expect(post).toHaveBeenCalledWith("/api/plans/p1/answer", {
      answer: "ask",
      message: "Would one big heater do?",
    });
  });

  test("a sentence about the house can be contradicted, which begins a question about it", async () => {
    const person = userEvent.setup();
    show();
    await person.click(screen.getByRole("button", { name: /That is not so.*night temperatures/ }));
    expect(screen.getByLabelText("Your question")).toHaveProperty(
      "value",
      "About the night temperatures: that is not so. ",
    );
  });

  test("a reason can be given for declining with one press", async () => {
    const person = userEvent.setup();
    post.mockResolvedValue(planFixture({ status: "declined" }));
    show();
    await person.click(screen.getByRole("button", { name: /^Decline/ }));
    await person.click(screen.getByRole("button", { name: "Not this winter." }));
    await person.click(screen.getByRole("button", { name: "Yes, decline" }));
    expect(post).toHaveBeenCalledWith("/api/plans/p1/answer", {
      answer: "decline",
      message: "Not this winter.",
    });
  });

  test("a refused answer shows the server's sentence and keeps the words", async () => {
    const person = userEvent.setup();
    post.mockRejectedValue(new Error("The seven days to change this answer are over."));
    show();
    await person.click(screen.getByRole("button", { name: /^Decline/ }));
    await person.type(screen.getByLabelText(/Tell us why/), "Too late");
    await person.click(screen.getByRole("button", { name: "Yes, decline" }));
    await waitFor(() => expect(screen.getByRole("alert").textContent).toContain("seven days"));
    expect(screen.getByLabelText(/Tell us why/)).toHaveProperty("value", "Too late");
  });

  test("an answer given stands with its date and can be changed while there is time", async () => {
    const person = userEvent.setup();
    show(
      planFixture({
        status: "approved",
        answeredAt: "2026-11-26T10:00:00.000Z",
        answeredBy: "Tomas Wray",
        changeableUntil: "2026-12-03T10:00:00.000Z",
      }),
    );
    expect(screen.getByText(/It can be changed until 3 Dec/)).toBeDefined();
    await person.click(screen.getByRole("button", { name: "Change the answer" }));
    expect(screen.getByRole("button", { name: /^Decline/ })).toBeDefined();
  });

  test("says what is left out and that the survey has changed since", () => {
    show(planFixture({ outdated: true }));
    expect(screen.getByText(/The survey was changed after this plan was worked out/)).toBeDefined();
    expect(screen.getByText(/Nothing is ordered with your answer/)).toBeDefined();
  });
});

describe("the adviser's side of the same page", () => {
  test("offers no answers, but the talk", async () => {
    const person = userEvent.setup();
    post.mockResolvedValue(planFixture());
    show(planFixture({ can: { send: false, answer: false, write: true } }));
    expect(screen.queryByRole("button", { name: /^Approve/ })).toBeNull();
    expect(screen.queryByRole("button", { name: /That is not so/ })).toBeNull();
    await person.type(screen.getByLabelText("Write to the farmer"), "Two heaters cover each other.");
    await person.click(screen.getByRole("button", { name: "Send" }));
    expect(post).toHaveBeenCalledWith("/api/plans/p1/messages", { message: "Two heaters cover each other." });
  });
});

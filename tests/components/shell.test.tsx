import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { render, screen, waitFor } from "@testing-library/react";
import userEvent from "@testing-library/user-event";
import { createMemoryRouter, RouterProvider } from "react-router-dom";
import { beforeEach, describe, expect, test, vi } from "vitest";
import type { MeView } from "../../server/contracts/people.ts";
import { Shell } from "../../src/app/shell.tsx";
import { Start } from "../../src/app/start.tsx";
import { ApiError } from "../../src/lib/api-client.ts";
import { meFixture } from "./support/with-client.tsx";

const server = vi.hoisted(() => ({ get: vi.fn(), post: vi.fn(), patch: vi.fn() }));
vi.mock("../../src/lib/api-client.ts", async (original) => ({
  ...(await original<typeof import("../../src/lib/api-client.ts")>()),
  api: server,
}));

beforeEach(() => {
  for (const call of Object.values(server)) call.mockReset();
  window.scrollTo = () => {};
});

function show(at = "/", me: MeView | ApiError = meFixture()) {
  if (me instanceof ApiError) server.get.mockRejectedValue(me);
  else server.get.mockResolvedValue(me);
  const client = new QueryClient({ defaultOptions: { queries: { retry: false } } });
  const page = (words: string) => ({ element: <p>{words}</p> });
  const router = createMemoryRouter(
    [
      {
        path: "/",
        element: <Shell />,
        children: [
          { index: true, element: <Start /> },
          { path: "map", ...page("the map") },
          { path: "sites", ...page("the sites") },
          { path: "reviews", ...page("the reviews") },
        ],
      },
      { path: "/sign-in", ...page("sign in") },
      { path: "/no-access", ...page("on nobody's list") },
    ],
    { initialEntries: [at] },
  );
  render(
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return router;
}

describe("the frame of every page", () => {
  test.each([
    ["advisor" as const, "the map"],
    ["farmer" as const, "the reviews"],
    ["manager" as const, "the sites"],
  ])("an %s starts at %s", async (activeRole, words) => {
    show("/", meFixture({ activeRole }));
    expect(await screen.findByText(words)).toBeTruthy();
  });

  test("a stranger signs in first and then comes back to the same address", async () => {
    const signedOut = new ApiError(401, {
      error: { code: "not_signed_in", message: "Sign in.", fields: {} },
    });
    const router = show("/map?show=short", signedOut);
    expect(await screen.findByText("sign in")).toBeTruthy();
    expect(router.state.location.search).toBe("?to=%2Fmap%3Fshow%3Dshort");
  });

  test("somebody in no co-operative is told so", async () => {
    show("/map", meFixture({ activeRole: null, activeCooperativeId: null, memberships: [] }));
    expect(await screen.findByText("on nobody's list")).toBeTruthy();
  });

  test("the head shows the pages of the role and how many reviews wait", async () => {
    show("/map");
    await screen.findByText("the map");
    const links = screen.getAllByRole("link", { name: /^Reviews 2/ });
    expect(links.length).toBeGreaterThan(0);
    expect(screen.queryByRole("link", { name: "People" })).toBeNull();
    expect(screen.getByRole("link", { name: "To the content" }).getAttribute("href")).toBe("#sheet");
  });

  test("units change at once and are taken back when the server refuses", async () => {
    const person = userEvent.setup();
    let refuse: (reason: Error) => void = () => {};
    server.patch.mockReturnValue(
      new Promise((_resolve, reject) => {
        refuse = reject;
      }),
    );
    show("/map");
    await screen.findByText("the map");
    const [us] = screen.getAllByRole("radio", { name: "US units" });
    await person.click(us as HTMLElement);
    expect(server.patch).toHaveBeenCalledWith("/api/me/preferences", { units: "us" });
    await waitFor(() => expect(us).toHaveProperty("checked", true));
    refuse(new Error("no"));
    await waitFor(() => expect(us).toHaveProperty("checked", false));
  });

  test("the evening theme is put on the page", async () => {
    show("/map", meFixture({ theme: "evening" }));
    await screen.findByText("the map");
    await waitFor(() => expect(document.documentElement.dataset.theme).toBe("evening"));
  });
});

import { QueryClient, QueryClientProvider } from "@tanstack/react-query";
import { render } from "@testing-library/react";
import type { ReactElement } from "react";
import { createMemoryRouter, RouterProvider } from "react-router-dom";
import type { MeView } from "../../../server/contracts/people.ts";

export function meFixture(change: Partial<MeView> = {}): MeView {
  return {
    id: "me",
    name: "Ana Adviser",
    email: "ana@example.org",
    units: "si",
    theme: "day",
    memberships: [{ cooperativeId: "c1", cooperativeName: "Hill and Shore", role: "advisor" }],
    activeRole: "advisor",
    activeCooperativeId: "c1",
    csrfToken: "token",
    openReviews: 2,
    ...change,
  };
}

interface ShowOptions {
  /** What the server has already answered, by query key. */
  data?: [key: readonly unknown[], answer: unknown][];
  at?: string;
  path?: string;
}

/** Shows a screen as the router would, with answers already there. Any other page it leads to shows its address. */
export function showScreen(screen: ReactElement, { data = [], at = "/", path = "/" }: ShowOptions = {}) {
  const client = new QueryClient({
    defaultOptions: { queries: { retry: false, staleTime: Number.POSITIVE_INFINITY } },
  });
  for (const [key, answer] of data) client.setQueryData(key, answer);
  const router = createMemoryRouter(
    [
      { path, element: screen },
      { path: "*", element: <p>elsewhere</p> },
    ],
    { initialEntries: [at] },
  );
  const view = render(
    <QueryClientProvider client={client}>
      <RouterProvider router={router} />
    </QueryClientProvider>,
  );
  return { ...view, client, router };
}

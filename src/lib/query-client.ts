import { QueryClient } from "@tanstack/react-query";
import { ApiError } from "./api-client.ts";

/** Refusals are final; only a lost connection is tried again. */
function shouldRetry(failures: number, error: Error): boolean {
  return !(error instanceof ApiError) && failures < 2;
}

export function createQueryClient(): QueryClient {
  return new QueryClient({
    defaultOptions: {
      queries: { staleTime: 20_000, retry: shouldRetry, refetchOnWindowFocus: true },
      mutations: { retry: false },
    },
  });
}

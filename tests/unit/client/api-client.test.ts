import { afterEach, describe, expect, test, vi } from "vitest";
import { ApiError, api, ConnectionError, setCsrfToken } from "../../../src/lib/api-client.ts";

function answer(status: number, body: unknown): Response {
  return new Response(body === undefined ? null : JSON.stringify(body), { status });
}

function serve(reply: () => Promise<Response>) {
  const fetching = vi.fn((_path: string, _init: RequestInit) => reply());
  vi.stubGlobal("fetch", fetching);
  return fetching;
}

afterEach(() => vi.unstubAllGlobals());

describe("talking to the server", () => {
  test("a change carries the token, a read does not", async () => {
    const fetching = serve(async () => answer(200, { ok: true }));
    setCsrfToken("secret");
    await api.post("/api/farms", { name: "x" });
    await api.get("/api/farms");
    const headers = (call: number) => fetching.mock.calls[call]?.[1].headers;
    expect(headers(0)).toMatchObject({ "x-csrf-token": "secret", "content-type": "application/json" });
    expect(headers(1)).not.toHaveProperty("x-csrf-token");
  });

  test("a refusal keeps its code, its words and the fields they belong to", async () => {
    serve(async () =>
      answer(422, { error: { code: "invalid_input", message: "No.", fields: { name: "Missing." } } }),
    );
    const error = await api.post("/api/farms", {}).catch((reason: unknown) => reason);
    expect(error).toBeInstanceOf(ApiError);
    expect(error).toMatchObject({
      status: 422,
      code: "invalid_input",
      message: "No.",
      fields: { name: "Missing." },
    });
  });

  test("an answer that is no JSON is still an error with words", async () => {
    serve(async () => new Response("<h1>Bad gateway</h1>", { status: 502 }));
    await expect(api.get("/api/me")).rejects.toMatchObject({ status: 502, code: "internal_error" });
  });

  test("no connection is told apart from a refusal and from a stopped request", async () => {
    serve(async () => {
      throw new TypeError("failed to fetch");
    });
    await expect(api.get("/api/me")).rejects.toBeInstanceOf(ConnectionError);
    serve(async () => {
      throw new DOMException("stopped", "AbortError");
    });
    await expect(api.get("/api/me")).rejects.toMatchObject({ name: "AbortError" });
  });

  test("an empty answer is no error", async () => {
    serve(async () => answer(204, undefined));
    await expect(api.delete("/api/farms/1")).resolves.toBeUndefined();
  });
});

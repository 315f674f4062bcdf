import type { ErrorBody, ErrorCode } from "../../server/contracts/common.ts";

/** What the server refused, in its own words. `fields` maps a contract path to a sentence for the form. */
export class ApiError extends Error {
  readonly status: number;
  readonly code: ErrorCode;
  readonly fields: Record<string, string>;

  constructor(status: number, { error }: ErrorBody) {
    super(error.message);
    this.name = "ApiError";
    this.status = status;
    this.code = error.code;
    this.fields = error.fields;
  }
}

/** The server could not be reached at all. */
export class ConnectionError extends Error {
  constructor() {
    super("The office cannot be reached from here just now.");
    this.name = "ConnectionError";
  }
}

interface RequestOptions {
  signal?: AbortSignal;
}

let csrfToken = "";

/** Told by whoever loads /api/me; sent back with every change. */
export function setCsrfToken(token: string): void {
  csrfToken = token;
}

function isErrorBody(body: unknown): body is ErrorBody {
  return typeof body === "object" && body !== null && "error" in body;
}

const unknownError: ErrorBody = {
  error: { code: "internal_error", message: "The server gave an answer that cannot be read.", fields: {} },
};

async function request<T>(method: string, path: string, body: unknown, options: RequestOptions): Promise<T> {
  const response = await fetch(path, {
    method,
    signal: options.signal ?? null,
    credentials: "same-origin",
    headers: {
      accept: "application/json",
      ...(method === "GET" ? {} : { "content-type": "application/json", "x-csrf-token": csrfToken }),
    },
    body: body === undefined ? null : JSON.stringify(body),
  }).catch((error: unknown) => {
    if (error instanceof DOMException && error.name === "AbortError") throw error;
    throw new ConnectionError();
  });
  if (response.status === 204) return undefined as T;
  const answer: unknown = await response.json().catch(() => unknownError);
  if (!response.ok) throw new ApiError(response.status, isErrorBody(answer) ? answer : unknownError);
  return answer as T;
}

/** The only way the browser talks to the server. Throws {@link ApiError} or {@link ConnectionError}. */
export const api = {
  get: <T>(path: string, options: RequestOptions = {}) => request<T>("GET", path, undefined, options),
  post: <T>(path: string, body: unknown, options: RequestOptions = {}) =>
    request<T>("POST", path, body, options),
  put: <T>(path: string, body: unknown, options: RequestOptions = {}) =>
    request<T>("PUT", path, body, options),
  patch: <T>(path: string, body: unknown, options: RequestOptions = {}) =>
    request<T>("PATCH", path, body, options),
  delete: <T>(path: string, options: RequestOptions = {}) => request<T>("DELETE", path, undefined, options),
};

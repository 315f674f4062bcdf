import { cleanup } from "@testing-library/react";
import { afterEach, beforeEach, expect, vi } from "vitest";

/** A component that complains on the console is a failed test. */
const complaints: unknown[][] = [];

beforeEach(() => {
  complaints.length = 0;
  vi.spyOn(console, "error").mockImplementation((...words) => complaints.push(words));
  vi.spyOn(console, "warn").mockImplementation((...words) => complaints.push(words));
});

afterEach(() => {
  cleanup();
  vi.restoreAllMocks();
  expect(complaints).toEqual([]);
});

import { z } from "zod";
import { ENGINE_VERSION } from "../engine/version.ts";
import type { Route } from "./route.ts";

interface JsonSchema {
  properties?: Record<string, JsonSchema>;
  required?: string[];
  [key: string]: unknown;
}

function parameters(schema: JsonSchema | undefined, place: "path" | "query") {
  return Object.entries(schema?.properties ?? {}).map(([name, shape]) => ({
    name,
    in: place,
    required: place === "path" || (schema?.required ?? []).includes(name),
    schema: shape,
  }));
}

const errorAnswer = {
  description: "What went wrong, in words",
  content: { "application/json": { schema: { $ref: "#/components/schemas/Error" } } },
};

function operation(route: Route) {
  const input = z.toJSONSchema(route.schema, {
    target: "openapi-3.0",
    io: "input",
    unrepresentable: "any",
  }) as JsonSchema;
  const body = input.properties?.body;
  return {
    summary: route.summary,
    parameters: [
      ...parameters(input.properties?.params, "path"),
      ...parameters(input.properties?.query, "query"),
    ],
    ...(body === undefined
      ? {}
      : { requestBody: { required: true, content: { "application/json": { schema: body } } } }),
    responses: {
      [route.status]: { description: "Done" },
      401: errorAnswer,
      403: errorAnswer,
      404: errorAnswer,
      422: errorAnswer,
    },
  };
}

/** The description of the interface, made from the same contracts that check the requests. */
export function describeApi(routes: Route[]) {
  const paths: Record<string, Record<string, unknown>> = {};
  for (const route of routes) {
    const path = route.path.replace(/:(\w+)/g, "{$1}");
    paths[path] = { ...paths[path], [route.method]: operation(route) };
  }
  return {
    openapi: "3.0.3",
    info: { title: "Glassbyre", version: ENGINE_VERSION },
    paths,
    components: {
      schemas: {
        Error: {
          type: "object",
          required: ["error"],
          properties: {
            error: {
              type: "object",
              required: ["code", "message", "fields"],
              properties: {
                code: { type: "string" },
                message: { type: "string" },
                fields: { type: "object", additionalProperties: { type: "string" } },
              },
            },
          },
        },
      },
    },
  };
}

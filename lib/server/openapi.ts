import "server-only";
import * as z from "zod/mini";
import { TOKEN } from "@/lib/domain/invitation";
import { problems, problemShape, type ProblemCode } from "@/lib/domain/problem";
import { digestShape } from "@/lib/domain/shapes";
import { problemCodes, type AnswerKind, type Contract } from "./contract";
import { settings } from "./settings";

type Json = Record<string, unknown>;

const SESSION = "session";

/** The OpenAPI 3.1 document of these routes, from the same shapes that check what comes and goes. */
export function openApiDocument(routes: readonly Contract[]): Json {
  const paths: Record<string, Json> = {};
  for (const route of routes) {
    paths[route.path] = { ...paths[route.path], [route.method.toLowerCase()]: operation(route) };
  }
  return {
    openapi: "3.1.0",
    info: {
      title: "Hookfast",
      version: "1",
      description:
        "Walk-arounds of flat-towing rigs. A request that changes something needs `Origin` equal to the " +
        "product's own or `Sec-Fetch-Site: same-origin`; either one foreign, or neither present, is 403.",
    },
    servers: [{ url: "/" }],
    security: [{ [SESSION]: [] }],
    paths,
    components: {
      schemas: { Problem: jsonSchema(problemShape, "output") },
      securitySchemes: { [SESSION]: { type: "apiKey", in: "cookie", name: settings.cookie.name } },
    },
  };
}

function operation(route: Contract): Json {
  const parameters = [...pathParameters(route), ...queryParameters(route)];
  return {
    summary: route.summary,
    ...(route.public && { security: [] }),
    ...(parameters.length > 0 && { parameters }),
    ...(route.body && {
      requestBody: {
        required: true,
        description: `At most ${route.body.limit} bytes.`,
        content: { "application/json": { schema: jsonSchema(route.body.shape, "input") } },
      },
    }),
    ...(route.upload && {
      requestBody: {
        required: true,
        description: `At most ${route.upload.limit} bytes.`,
        content: Object.fromEntries(route.upload.media.map((media) => [media, {}])),
      },
    }),
    responses: { ...answers(route), ...problemAnswers(problemCodes(route)) },
  };
}

const placeSchemas = {
  id: { type: "string", format: "uuid" },
  sha256: jsonSchema(digestShape, "input"),
  token: { type: "string", pattern: TOKEN.source },
};

function pathParameters({ path }: Contract): Json[] {
  return [...path.matchAll(/\{(\w+)\}/g)].map(([, name]) => ({
    name,
    in: "path",
    required: true,
    schema: placeSchemas[name as keyof typeof placeSchemas],
  }));
}

function queryParameters({ query }: Contract): Json[] {
  if (!query) return [];
  const { properties = {}, required = [] } = jsonSchema(query, "input") as {
    properties?: Record<string, Json>;
    required?: string[];
  };
  return Object.entries(properties).map(([name, schema]) => ({
    name,
    in: "query",
    required: required.includes(name),
    schema,
  }));
}

function answers(route: Contract): Json {
  return Object.fromEntries(
    Object.entries(route.answers).map(([status, kind]) => [
      status,
      { description: route.summary, ...(kind && { content: content(kind) }) },
    ]),
  );
}

function content(kind: NonNullable<AnswerKind>): Json {
  return "json" in kind
    ? { "application/json": { schema: jsonSchema(kind.json, "output") } }
    : "media" in kind
      ? { [kind.media]: { schema: { type: "string" } } }
      : // OpenAPI 3.1 leaves the schema of plain bytes out.
        { [kind.bytes]: {} };
}

function problemAnswers(codes: ProblemCode[]): Json {
  const statuses = new Set(codes.map((code) => problems[code].status));
  return Object.fromEntries(
    [...statuses].map((status) => [
      status,
      {
        description: codes
          .filter((code) => problems[code].status === status)
          .map((code) => `\`${code}\`: ${problems[code].title}`)
          .join(" "),
        content: { "application/problem+json": { schema: { $ref: "#/components/schemas/Problem" } } },
      },
    ]),
  );
}

function jsonSchema(shape: z.ZodMiniType, io: "input" | "output"): Json {
  const schema: Json = { ...z.toJSONSchema(shape, { io, unrepresentable: "any" }) };
  // OpenAPI 3.1 speaks this dialect anyway.
  delete schema.$schema;
  return schema;
}

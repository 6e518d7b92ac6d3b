import * as z from "zod/mini";
import { serverKeyShape } from "@/lib/domain/receipt";
import { contract } from "../contract";

export const readKeys = contract({
  method: "GET",
  path: "/api/keys",
  summary: "Every public key that ever signed a receipt, newest first.",
  public: true,
  answers: { 200: { json: z.object({ keys: z.array(serverKeyShape) }) } },
  cacheS: 300,
});

export const readHealth = contract({
  method: "GET",
  path: "/api/health",
  summary: "Whether the database answers.",
  public: true,
  answers: { 200: { json: z.object({ ok: z.literal(true) }) } },
});

export const readOpenApi = contract({
  method: "GET",
  path: "/api/openapi.json",
  summary: "This document.",
  public: true,
  answers: { 200: { json: z.record(z.string(), z.unknown()) } },
  cacheS: 300,
});

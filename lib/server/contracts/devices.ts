import * as z from "zod/mini";
import { deviceShape } from "@/lib/domain/field";
import { uuidShape } from "@/lib/domain/shapes";
import { algorithms } from "@/lib/domain/signature";
import { contract } from "../contract";

/** A registered device; `kid` is the RFC 7638 thumbprint of its key. */
const registered = z.object({
  id: uuidShape,
  alg: z.enum(algorithms),
  kid: z.string(),
  label: z.string(),
});

export const registerDevice = contract({
  method: "POST",
  path: "/api/devices",
  summary: "Register this device's public key: 201, or 200 when the same id, key and member come again.",
  action: "devices.register",
  body: { shape: deviceShape, limit: 16 * 1024 },
  answers: { 200: { json: registered }, 201: { json: registered } },
  problems: ["device-taken"],
});

import "server-only";
import * as z from "zod/mini";
import { pointerStep } from "@/lib/domain/json";
import type { FieldError } from "@/lib/domain/problem";

// zod/mini brings no sentences of its own, and an answer has to say what was expected.
z.config(z.locales.en());

/** What is wrong with a body, each at its RFC 6901 pointer; a member that nobody knows is pointed at itself. */
export function bodyErrors(error: z.core.$ZodError): FieldError[] {
  return errors(error, (path) => path.map((step) => pointerStep(String(step))).join(""));
}

/** What is wrong with a query, each at its member's name. */
export function queryErrors(error: z.core.$ZodError): FieldError[] {
  return errors(error, (path) => path.join("."));
}

function errors(error: z.core.$ZodError, pointerTo: (path: PropertyKey[]) => string): FieldError[] {
  return error.issues.flatMap((issue) =>
    issue.code === "unrecognized_keys"
      ? issue.keys.map((key) => ({ pointer: pointerTo([...issue.path, key]), detail: "unknown member" }))
      : [{ pointer: pointerTo(issue.path), detail: issue.message }],
  );
}

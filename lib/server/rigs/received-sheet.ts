import type { FieldError } from "@/lib/domain/problem";
import { Problem } from "@/lib/domain/problem";
import { sheetReadingWords as say } from "@/lib/domain/messages/sheet-reading";
import { impossible } from "@/lib/domain/sheet/faults";
import { readSheet, SHEET_VERSION, type Sheet } from "@/lib/domain/sheet/sheet";

/**
 * A sheet as it was sent, or why it is not taken: `newer-schema`, `wrong-shape`, `impossible-sheet`. What is only unusual
 * is taken; whoever filled it in has been told.
 * @param raw the request's `sheet`, untouched by any schema
 */
export function receivedSheet(raw: unknown): Sheet | Problem {
  const read = readSheet(raw);
  if (read.kind === "newer") {
    return new Problem("newer-schema", { detail: say.newer(read.version, SHEET_VERSION) });
  }
  if (read.kind === "wrong") return new Problem("wrong-shape", { errors: inBody(read.errors) });
  const faults = impossible(read.sheet);
  return faults.length > 0 ? new Problem("impossible-sheet", { errors: inBody(faults) }) : read.sheet;
}

/** Pointers into a sheet as pointers into the request that holds it. */
export function inBody(errors: readonly FieldError[]): FieldError[] {
  return errors.map(({ pointer, detail }) => ({ pointer: `/sheet${pointer}`, detail }));
}

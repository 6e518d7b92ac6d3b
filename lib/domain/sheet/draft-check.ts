import { sheetFormWords as say } from "../messages/sheet-form";
import type { FieldError } from "../problem";
import { sheetOf, type Draft } from "./draft";
import { placeOf } from "./draft-places";
import { impossible, unusual } from "./faults";
import { readSheet } from "./sheet";

/** What keeps a draft from being saved, each at the field it is about, once a field. */
export function draftErrors(draft: Draft): FieldError[] {
  const sheet = sheetOf(draft);
  const read = readSheet(sheet);
  const wrong = read.kind === "wrong" ? read.errors : [];
  return oncePerField([...wrong.map(atField), ...impossible(sheet)]);
}

/** What is taken but hardly ever so. */
export function draftWarnings(draft: Draft): FieldError[] {
  return unusual(sheetOf(draft));
}

/** An error of a shape as the form tells it: at the field rather than within its value, and in words. */
export function atField({ pointer, detail }: FieldError): FieldError {
  const { pointer: at, field } = placeOf(pointer);
  const unreadable = detail.startsWith("Invalid") || detail === "not a finite number";
  if (unreadable) return { pointer: at, detail: say.unreadable[field?.kind ?? "text"] };
  return { pointer: at, detail: say.faults[detail] ?? detail };
}

function oncePerField(errors: readonly FieldError[]): FieldError[] {
  const byPointer = new Map<string, FieldError>();
  for (const error of errors) if (!byPointer.has(error.pointer)) byPointer.set(error.pointer, error);
  return [...byPointer.values()];
}

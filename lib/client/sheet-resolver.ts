import { set, type FieldErrors, type FieldValues, type Resolver } from "react-hook-form";
import { draftErrors } from "../domain/sheet/draft-check";

/** Checks the whole draft by the one shape of a sheet, and by what cannot be so on any vehicle. */
export const sheetResolver: Resolver<FieldValues> = (draft) => {
  const errors: FieldErrors = {};
  for (const { pointer, detail } of draftErrors(draft)) {
    set(errors, pointer.slice(1).replaceAll("/", "."), { type: "sheet", message: detail });
  }
  return Object.keys(errors).length > 0 ? { values: {}, errors } : { values: draft, errors: {} };
};

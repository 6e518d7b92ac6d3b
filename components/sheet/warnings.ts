import { createContext, useContext } from "react";
import type { FieldError } from "@/lib/domain/problem";
import { pointerOf } from "./places";

/** What is unusual on the draft, for the fields that it is about. */
export const Warnings = createContext<readonly FieldError[]>([]);

/** What is unusual about a field, in words; null where nothing is. */
export function useWarning(name: string): string | null {
  const pointer = pointerOf(name);
  return useContext(Warnings).find((warning) => warning.pointer === pointer)?.detail ?? null;
}

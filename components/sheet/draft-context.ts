import { createContext, useContext } from "react";
import type { Draft } from "@/lib/domain/sheet/draft";
import type { Sheet } from "@/lib/domain/sheet/sheet";

/** What the parts of the form share beside its fields. */
export interface DraftDesk {
  rig: string;
  /** Whether the rig does not exist yet. */
  isNew: boolean;
  /** The draft as a sheet, as it is now. */
  sheet: Sheet;
  /** Counts the drafts that took another's place: none of their inputs may keep what it showed. */
  generation: number;
  /** Puts another draft in the place of this one, on the screen too. */
  replace: (draft: Draft) => void;
}

export const DraftDeskContext = createContext<DraftDesk | null>(null);

/** The draft that this part of the form belongs to. */
export function useDraftDesk(): DraftDesk {
  return useContext(DraftDeskContext)!;
}

import { createContext } from "react";
import type { CalloutLetter } from "@/lib/domain/messages/drawings";
import type { Effect } from "@/lib/domain/revision";

/** What a check adds to its part's drawing. */
export type Shown = {
  /** The callouts that are not as drawn, as someone said. */
  marked?: readonly CalloutLetter[];
  /** What a marked callout does to the walk: red is for a hold alone. */
  effect?: Effect;
  /** This rig's own number beside a callout, "5,000 lb". */
  figures?: Partial<Record<CalloutLetter, string>>;
  /** Nothing is called out where the drawing only says where to look. */
  bare?: boolean;
};

/** So that a drawing need not hand on what it does not draw itself. */
export const ShownContext = createContext<Shown>({});

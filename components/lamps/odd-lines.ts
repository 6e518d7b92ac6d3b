import { signals } from "@/lib/domain/entry";
import { isAsDrawn, type Seen } from "@/lib/domain/lamp-board";
import { lampBoardWords } from "@/lib/domain/messages/lamps";
import type { Check } from "@/lib/domain/revision";

/** What the lamps did where that was not as drawn, a line a signal. */
export function oddLines(check: Check, seen: Seen): string[] {
  return signals.flatMap((signal) => {
    const pair = seen[signal];
    if (!pair || isAsDrawn(check, signal, pair)) return [];
    return [lampBoardWords.seen(signal, pair.left, pair.right)];
  });
}

import { useEffect, useState } from "react";
import { fieldWords } from "@/lib/domain/messages/field";
import { clockText } from "@/lib/client/time-words";

/** The walk's running time; each tick is set for the moment at which the next second begins. */
export function WalkTimer({ elapsedMs }: { elapsedMs: () => number }) {
  const [shownMs, setShownMs] = useState(elapsedMs);
  useEffect(() => {
    let timer: ReturnType<typeof setTimeout>;
    const tick = () => {
      const nowMs = elapsedMs();
      setShownMs(nowMs);
      timer = setTimeout(tick, 1000 - (nowMs % 1000));
    };
    tick();
    return () => clearTimeout(timer);
  }, [elapsedMs]);
  return (
    <span role="timer" aria-label={fieldWords.walk.timer}>
      {clockText(shownMs)}
    </span>
  );
}

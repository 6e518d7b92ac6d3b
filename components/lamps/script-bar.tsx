import { Button } from "@/components/ui/button";
import { secondsTimeText } from "@/lib/client/time-words";
import type { HoldMs } from "@/lib/domain/lamp-script";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";
import { CountdownBar } from "./countdown-bar";
import { HoldChoice } from "./hold-choice";
import type { ScriptState } from "./use-script";

const words = lampScriptWords.bar;

type ScriptBarProps = {
  state: ScriptState;
  onStart: () => void;
  onStop: () => void;
  hold: number;
  onHold: (hold: HoldMs) => void;
};

/** Starts, shows and stops a script; the signal itself stands in the screen around it. */
export function ScriptBar({ state, onStart, onStop, hold, onHold }: ScriptBarProps) {
  if (state.phase === "idle" || state.phase === "done") {
    return (
      <div className="flex flex-col gap-3">
        <HoldChoice hold={hold} onHold={onHold} />
        <Button variant="good" onClick={onStart}>
          {words.start}
        </Button>
      </div>
    );
  }
  const stop = (
    <Button variant="quiet" className="px-5" onClick={onStop}>
      {words.stop}
    </Button>
  );
  return (
    <div className="flex flex-col gap-3">
      {state.phase === "waiting" ? (
        <Waiting startMs={state.startMs} startsInMs={state.startsInMs} />
      ) : (
        <>
          <CountdownBar leftMs={state.leftMs} holdMs={state.holdMs} />
          <div className="flex flex-wrap items-center justify-between gap-x-4">
            <p className="text-xl text-soft">
              {state.next ? words.next(lampScriptWords.signal[state.next].name) : words.last}
            </p>
            {stop}
          </div>
        </>
      )}
      {state.phase === "waiting" && stop}
    </div>
  );
}

/** The clock that both people compare, and when it starts. */
function Waiting({ startMs, startsInMs }: { startMs: number; startsInMs: number }) {
  return (
    <>
      <p role="status" className="text-xl leading-snug font-extrabold">
        {words.startsAt(secondsTimeText(startMs))}
      </p>
      <p
        role="timer"
        aria-label={words.clock}
        aria-live="off"
        className="tabular text-[min(4rem,16vw)] leading-none whitespace-nowrap font-semibold"
      >
        {secondsTimeText(startMs - startsInMs)}
      </p>
      <p className="tabular text-[1.0625rem]">{words.startsIn(Math.ceil(startsInMs / 1000))}</p>
      <p className="text-base text-soft">{words.compare}</p>
    </>
  );
}

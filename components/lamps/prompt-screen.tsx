import { useEffect, useState } from "react";
import { FieldFrame } from "@/components/field/field-frame";
import { useScreenTitle } from "@/components/field/screen-title";
import { WingLink } from "@/components/field/wing-link";
import { signals } from "@/lib/domain/entry";
import { usualHoldMs, type HoldMs, type Signal } from "@/lib/domain/lamp-script";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";
import { ArmSignals } from "./arm-signals";
import { ScriptBar } from "./script-bar";
import { useAwake } from "./use-awake";
import { useScript } from "./use-script";

const words = lampScriptWords.prompt;

/** For the driver's phone: what to press now, in step with the phone behind the car. It needs and keeps nothing. */
export function PromptScreen() {
  const [hold, setHold] = useState<HoldMs>(usualHoldMs);
  const { state, start, stop } = useScript(signals, hold);
  const running = state.phase === "waiting" || state.phase === "signal";
  useScreenTitle(words.title);
  useAwake(running);
  // The word is at the top, the button that was tapped at the bottom.
  useEffect(() => {
    window.scrollTo(0, 0);
  }, [running]);
  return (
    <FieldFrame>
      {running ? <h1 className="sr-only">{words.title}</h1> : <Top />}
      {state.phase === "idle" && <Beforehand />}
      {state.phase === "done" && <Done />}
      <div role="status" className={`flex flex-1 flex-col justify-center ${running ? "pt-4" : ""}`}>
        {state.phase === "waiting" && <First signal={signals[0]} />}
        {state.phase === "signal" && (
          <HugeSignal signal={state.signal} place={state.place} total={state.total} />
        )}
      </div>
      <div className="px-4 pt-4 md:w-full md:max-w-3xl">
        <ScriptBar state={state} onStart={start} onStop={stop} hold={hold} onHold={setHold} />
      </div>
      {!running && (
        <div className="pt-8">
          <ArmSignals />
        </div>
      )}
    </FieldFrame>
  );
}

function Top() {
  return (
    <header className="flex flex-wrap items-center justify-between gap-x-4 pt-2 pr-1 pl-4">
      <h1 className="text-[1.375rem] leading-[1.1] font-extrabold">{words.title}</h1>
      <WingLink className="flex min-h-field items-center px-3 underline">{words.back}</WingLink>
    </header>
  );
}

function Beforehand() {
  return (
    <div className="flex max-w-prose flex-col gap-3 px-4 pt-2">
      <p className="text-xl leading-snug font-extrabold">{words.agree}</p>
      <p>{words.lead}</p>
      <p className="text-soft">{words.secured}</p>
    </div>
  );
}

function Done() {
  return (
    <div role="status" className="px-4 pt-6">
      <p className="text-[2.25rem] leading-[1.05] font-extrabold">{words.done}</p>
      <p className="pt-2 text-soft">{words.doneHint}</p>
    </div>
  );
}

function First({ signal }: { signal: Signal }) {
  const { name, press } = lampScriptWords.signal[signal];
  return (
    <div className="px-4">
      <p className="text-2xl leading-tight font-extrabold">{words.first(name)}</p>
      <p className="pt-1">{press}</p>
    </div>
  );
}

// As wide as its longest line allows, in the font's own widths, and as high as the rest of the screen leaves: text size
// does not come into it, so the margin is no matter of text size either.
const sizes = {
  short: "text-[min(42vw,42vh)]",
  right: "text-[min(35.5vw,36vh)]",
  hazards: "text-[min(23vw,36vh)]",
  two: "text-[min(40vw,23vh)]",
};

function sizeOf([first, second]: readonly [string, string?]): keyof typeof sizes {
  if (second) return "two";
  if (first.length > 5) return "hazards";
  return first.length > 4 ? "right" : "short";
}

function HugeSignal({ signal, place, total }: { signal: Signal; place: number; total: number }) {
  const { huge, press } = lampScriptWords.signal[signal];
  return (
    <div className="px-[min(4vw,1rem)]">
      <p className="tabular text-[1.0625rem] text-soft">{lampScriptWords.bar.place(place, total)}</p>
      <p className={`${sizes[sizeOf(huge)]} leading-[0.95] font-extrabold whitespace-nowrap`}>
        {huge.map((line) => (
          <span key={line} className="block">
            {line}
          </span>
        ))}
      </p>
      <p className="pt-3 text-[1.75rem] leading-tight font-semibold">{press}</p>
    </div>
  );
}

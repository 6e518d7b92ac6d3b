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
      <p className="text-[2.25rem] leading-[1.05] font-extrabold">{words.first(name)}</p>
      <p className="pt-3 text-[1.75rem] leading-tight">{press}</p>
    </div>
  );
}

// As wide as the longest line allows and as high as the rest of the screen leaves: no text size makes it larger.
const sizes = { 4: "text-[min(43vw,42vh)]", 5: "text-[min(37vw,36vh)]", 7: "text-[min(23.5vw,36vh)]" };

function HugeSignal({ signal, place, total }: { signal: Signal; place: number; total: number }) {
  const { huge, press } = lampScriptWords.signal[signal];
  const longest = Math.max(...huge.map((line) => line.length));
  const size = longest <= 4 ? 4 : longest <= 5 ? 5 : 7;
  return (
    <div className="px-4">
      <p className="tabular text-[1.0625rem] text-soft">{lampScriptWords.bar.place(place, total)}</p>
      <p
        className={`${huge.length > 1 ? "text-[min(37vw,23vh)]" : sizes[size]} leading-[0.95] font-extrabold`}
      >
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

import { ArmSignalDrawing } from "@/components/drawings/arm-signals";
import { signals } from "@/lib/domain/entry";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";

const words = lampScriptWords.arms;

/** All the arm signals, to be agreed on before the test; opened by whoever wants them. */
export function ArmSignals() {
  return (
    <details className="border-y-hair border-rule">
      <summary className="min-h-field content-center px-4 text-[1.0625rem] font-semibold">
        {words.summary}
      </summary>
      <p className="max-w-prose px-4 pb-4">{words.agreed}</p>
      <ul className="grid grid-cols-[repeat(auto-fill,minmax(min(100%,16rem),1fr))] gap-x-4 gap-y-6 px-4 pb-6">
        {signals.map((signal) => (
          <li key={signal}>
            <ArmSignalDrawing signal={signal} />
            <p className="pt-1 font-semibold">{lampScriptWords.signal[signal].name}</p>
          </li>
        ))}
      </ul>
    </details>
  );
}

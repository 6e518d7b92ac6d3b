import { lampScriptWords } from "@/lib/domain/messages/lamp-script";

const words = lampScriptWords.bar;

/** What is left of a hold, as a bar that empties and in seconds. */
export function CountdownBar({ leftMs, holdMs }: { leftMs: number; holdMs: number }) {
  const seconds = Math.ceil(leftMs / 1000);
  const left = Math.min(100, (seconds * 100_000) / holdMs);
  return (
    <div className="flex items-center gap-3">
      <svg
        viewBox="0 0 100 5"
        preserveAspectRatio="none"
        aria-hidden="true"
        className="h-6 min-w-0 flex-1 border-[3px] border-ink"
      >
        <rect width={left} height="5" className="fill-now" />
      </svg>
      <p role="timer" aria-live="off" className="tabular shrink-0 text-[1.75rem] leading-none whitespace-pre">
        <span aria-hidden="true">{words.seconds(seconds).padStart(4)}</span>
        <span className="sr-only">{words.left(seconds)}</span>
      </p>
    </div>
  );
}

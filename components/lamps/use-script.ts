import { useEffect, useState } from "react";
import {
  nextChangeMs,
  scriptAt,
  startMomentMs,
  type ScriptMoment,
  type Signal,
} from "@/lib/domain/lamp-script";

export type ScriptState = { phase: "idle" } | (ScriptMoment & { startMs: number; holdMs: number });

type Run = { startMs: number; open: readonly Signal[]; holdMs: number };

const wallClock = () => Date.now();

/**
 * A script that runs by the wall clock. What it goes through is taken when it starts: a signal that is marked meanwhile
 * stays in it, or this phone would be out of step with the other one.
 */
export function useScript(open: readonly Signal[], holdMs: number, now: () => number = wallClock) {
  const [run, setRun] = useState<Run | null>(null);
  const [nowMs, setNowMs] = useState(0);

  useEffect(() => {
    if (!run) return;
    let timer: ReturnType<typeof setTimeout>;
    const tick = () => {
      clearTimeout(timer);
      const momentMs = now();
      setNowMs(momentMs);
      const waitMs = nextChangeMs(scriptAt(run.startMs, momentMs, run.open, run.holdMs));
      if (waitMs !== null) timer = setTimeout(tick, waitMs);
    };
    tick();
    // Timers are held back while a page is out of sight.
    document.addEventListener("visibilitychange", tick);
    return () => {
      clearTimeout(timer);
      document.removeEventListener("visibilitychange", tick);
    };
  }, [run, now]);

  const state: ScriptState = run
    ? { ...scriptAt(run.startMs, nowMs, run.open, run.holdMs), startMs: run.startMs, holdMs: run.holdMs }
    : { phase: "idle" };
  const start = () => {
    const tappedMs = now();
    setNowMs(tappedMs);
    setRun({ startMs: startMomentMs(tappedMs), open, holdMs });
  };
  return { state, start, stop: () => setRun(null) };
}

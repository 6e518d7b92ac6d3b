import { useEffect, useState } from "react";
import { signals, type Signal } from "@/lib/domain/entry";
import { usualHoldMs, type HoldMs } from "@/lib/domain/lamp-script";
import type { Clip } from "./clip-marker";
import { useScript } from "./use-script";

/** How the signals of a lamp test are given: called out, by the clock with a second phone, by arms, or from a clip. */
export type Way = "plain" | "clock" | "arms" | "clip";

/** The way in use, with the script's or the clip's state. */
export function useWay() {
  const [way, setWay] = useState<Way>("plain");
  const [hold, setHold] = useState<HoldMs>(usualHoldMs);
  const [clip, setClip] = useState<Clip | null>(null);
  // The prompter gives all seven, so this phone goes through all seven too.
  const script = useScript(signals, hold);
  useEffect(() => {
    const url = clip?.url;
    return () => {
      if (url) URL.revokeObjectURL(url);
    };
  }, [clip]);
  const following: Signal | null =
    way === "clock" && script.state.phase === "signal" ? script.state.signal : null;
  return {
    way,
    choose(next: Way) {
      script.stop();
      setClip(null);
      setWay(next);
    },
    hold,
    setHold,
    script,
    following,
    clip,
    setClip,
  };
}

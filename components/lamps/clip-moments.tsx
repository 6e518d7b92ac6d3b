import { useRef, useState } from "react";
import { isSecondTap } from "@/components/field/settling";
import { Button } from "@/components/ui/button";
import { signals } from "@/lib/domain/entry";
import { clipTime, lampScriptWords } from "@/lib/domain/messages/lamp-script";
import type { Clip } from "./clip-marker";

const words = lampScriptWords.clip;
const BACK_SECONDS = 5;

type ClipMomentsProps = {
  url: string;
  onUnreadable: () => void;
  onOther: () => void;
  onDone: (moments: Clip["moments"]) => void;
};

/** Plays a clip and asks for one signal after the other when it begins. */
export function ClipMoments({ url, onUnreadable, onOther, onDone }: ClipMomentsProps) {
  const video = useRef<HTMLVideoElement>(null);
  const [found, setFound] = useState<(number | null)[]>([]);
  const [playing, setPlaying] = useState(false);
  const [slow, setSlow] = useState(false);
  const [seconds, setSeconds] = useState(0);
  const signal = signals[found.length];

  const go = (next: (number | null)[]) => {
    setFound(next);
    if (next.length < signals.length || next.every((each) => each === null)) return;
    onDone(Object.fromEntries(signals.flatMap((each, at) => (next[at] === null ? [] : [[each, next[at]]]))));
  };
  const mark = () => {
    if (video.current && !isSecondTap()) go([...found, video.current.currentTime]);
  };
  const skip = () => {
    if (!isSecondTap()) go([...found, null]);
  };
  const undo = () => {
    const before = found.at(-1);
    if (video.current && typeof before === "number") video.current.currentTime = Math.max(0, before - 2);
    setFound(found.slice(0, -1));
  };
  const rewind = () => {
    if (video.current) video.current.currentTime = Math.max(0, video.current.currentTime - BACK_SECONDS);
  };
  const turn = () => {
    if (!video.current) return;
    if (video.current.paused) void video.current.play().catch(() => setPlaying(false));
    else video.current.pause();
  };
  const changeSpeed = () => {
    if (video.current) video.current.playbackRate = slow ? 1 : 0.5;
    setSlow(!slow);
  };
  return (
    <section className="flex flex-col md:grid md:grid-cols-[minmax(0,7fr)_minmax(21rem,5fr)] md:items-start">
      <video
        ref={video}
        src={url}
        muted
        playsInline
        autoPlay
        preload="auto"
        aria-label={words.video}
        className="sticky top-0 z-10 max-h-[40vh] w-full bg-asphalt object-contain md:max-h-[70vh]"
        onError={onUnreadable}
        onPlay={() => setPlaying(true)}
        onPause={() => setPlaying(false)}
        onTimeUpdate={({ currentTarget }) => setSeconds(currentTarget.currentTime)}
      />
      <div className="flex flex-col gap-2.5 px-3 py-3">
        {signal ? (
          <>
            <h2 role="status" className="px-1 text-2xl leading-tight font-extrabold">
              {words.ask(lampScriptWords.signal[signal].seen)}
            </h2>
            <p className="tabular flex flex-wrap justify-between gap-x-4 px-1 text-[1.0625rem] text-soft">
              <span>{words.at(clipTime(seconds))}</span>
              <span>{words.place(found.length + 1, signals.length)}</span>
            </p>
            <Button variant="good" onClick={mark}>
              {words.here}
            </Button>
            <div className="acts-two">
              <Button onClick={skip}>{words.missing}</Button>
              <Button disabled={found.length === 0} onClick={undo}>
                {words.undo}
              </Button>
            </div>
            <div className="grid grid-cols-[repeat(auto-fit,minmax(min(100%,6rem),1fr))] gap-2.5">
              <Button variant="quiet" onClick={rewind}>
                {words.rewind}
              </Button>
              <Button variant="quiet" onClick={turn}>
                {playing ? words.pause : words.play}
              </Button>
              <Button
                variant="quiet"
                aria-pressed={slow}
                className="aria-pressed:border-ink aria-pressed:bg-ink aria-pressed:text-paper"
                onClick={changeSpeed}
              >
                {words.slow}
              </Button>
            </div>
          </>
        ) : (
          <>
            <h2 role="status" className="px-1 text-2xl leading-tight font-extrabold">
              {words.nothing}
            </h2>
            <Button onClick={() => setFound([])}>{words.again}</Button>
          </>
        )}
        <Button variant="quiet" onClick={onOther}>
          {words.other}
        </Button>
      </div>
    </section>
  );
}

import { useEffect, useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import type { Signal } from "@/lib/domain/lamp-script";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";
import type { Clip } from "./clip-marker";

const words = lampScriptWords.clip;
const AROUND_SECONDS = 2;

/** A signal's moment in the clip, played over and over. */
export function ClipPicture({ clip, signal }: { clip: Clip; signal: Signal }) {
  const { name } = lampScriptWords.signal[signal];
  const moment = clip.moments[signal];
  if (moment === undefined) return <p className="px-4 py-6 text-xl font-semibold">{words.notFilmed(name)}</p>;
  return <Loop key={signal} url={clip.url} moment={moment} label={words.picture(name)} />;
}

function Loop({ url, moment, label }: { url: string; moment: number; label: string }) {
  const video = useRef<HTMLVideoElement>(null);
  const [playing, setPlaying] = useState(false);
  const from = Math.max(0, moment - AROUND_SECONDS);

  const play = () => void video.current?.play().catch(() => setPlaying(false));
  const again = () => {
    if (video.current) video.current.currentTime = from;
  };
  useEffect(() => {
    if (video.current && !window.matchMedia("(prefers-reduced-motion: reduce)").matches) play();
  }, []);
  return (
    <div className="flex flex-col gap-2.5">
      <video
        ref={video}
        src={url}
        muted
        playsInline
        preload="auto"
        aria-label={label}
        className="max-h-[45vh] w-full bg-asphalt object-contain"
        onLoadedMetadata={again}
        onPlay={() => setPlaying(true)}
        onPause={() => setPlaying(false)}
        onTimeUpdate={({ currentTarget }) => {
          if (currentTarget.currentTime >= moment + AROUND_SECONDS) again();
        }}
        onEnded={() => {
          again();
          play();
        }}
      />
      <div className="px-3">
        <Button
          variant="quiet"
          className="w-full"
          onClick={() => (playing ? video.current?.pause() : play())}
        >
          {playing ? words.pause : words.play}
        </Button>
      </div>
    </div>
  );
}

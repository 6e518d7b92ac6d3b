import { useEffect, useRef, useState } from "react";
import type { Signal } from "@/lib/domain/lamp-script";
import { ClipChooser } from "./clip-chooser";
import { ClipMoments } from "./clip-moments";

/** A clip that plays from this phone's memory, and where in it, in seconds, each signal begins. */
export type Clip = { url: string; moments: Partial<Record<Signal, number>> };

type ClipMarkerProps = {
  /** Gets the clip, and with it the duty to revoke its address once it is no longer shown. */
  onDone: (clip: Clip) => void;
  onBack: () => void;
};

/** One person's lamp test: a clip of the car's tail, in which the moment of each signal is marked. */
export function ClipMarker({ onDone, onBack }: ClipMarkerProps) {
  const [url, setUrl] = useState<string | null>(null);
  const [unreadable, setUnreadable] = useState(false);
  const handed = useRef<string | null>(null);

  useEffect(() => {
    if (!url) return;
    return () => {
      if (handed.current !== url) URL.revokeObjectURL(url);
    };
  }, [url]);

  const choose = (file: File) => {
    setUnreadable(false);
    setUrl(URL.createObjectURL(file));
  };
  const refuse = () => {
    setUnreadable(true);
    setUrl(null);
  };
  return url ? (
    <ClipMoments
      key={url}
      url={url}
      onUnreadable={refuse}
      onOther={() => setUrl(null)}
      onDone={(moments) => {
        handed.current = url;
        onDone({ url, moments });
      }}
    />
  ) : (
    <ClipChooser unreadable={unreadable} onFile={choose} onBack={onBack} />
  );
}

"use client";

import { useEffect, useState } from "react";
import type { KeptPhoto } from "@/lib/client/photo-shelf";
import { photoWords as words } from "@/lib/domain/messages/photo";
import { Picture } from "./picture";

type PhotoStripProps = {
  /** Those to show, oldest first. */
  photos: readonly KeptPhoto[];
  /** Reads a photograph's bytes out of the phone's store. */
  read: (sha256: string) => Promise<ArrayBuffer | null>;
  /** Read aloud: what they are photographs of. */
  label?: string;
};

/** The photographs kept for a check, each with where it is in words. */
export function PhotoStrip({ photos, read, label = words.strip }: PhotoStripProps) {
  if (photos.length === 0) return null;
  return (
    <ul aria-label={label} className="flex flex-wrap gap-3">
      {photos.map((photo, at) => (
        <li key={`${photo.walk} ${photo.seq}`} className="w-24 text-base leading-tight">
          <Thumbnail photo={photo} read={read} alt={words.each(at + 1, photos.length, photo.state)} />
          <p aria-hidden="true" className="mt-1 text-soft">
            {words.states[photo.state]}
          </p>
        </li>
      ))}
    </ul>
  );
}

type ThumbnailProps = { photo: KeptPhoto; read: PhotoStripProps["read"]; alt: string };

function Thumbnail({ photo: { sha256, mime, state }, read, alt }: ThumbnailProps) {
  const [bytes, setBytes] = useState<ArrayBuffer | null>(null);
  useEffect(() => {
    let shown = true;
    // A store that does not answer leaves the place of the picture empty; its words stand all the same.
    read(sha256).then(
      (found) => shown && setBytes(found),
      () => {},
    );
    return () => void (shown = false);
  }, [read, sha256]);
  const box = "h-24 w-24 border-2";
  if (!bytes || state === "lost") {
    return <div role="img" aria-label={alt} className={`${box} unlit border-soft`} />;
  }
  return <Picture photo={{ bytes, mime }} alt={alt} className={`${box} border-ink object-cover`} />;
}

"use client";

import { useCallback } from "react";
import type { PhotoBytes } from "@/lib/client/photo-shelf";

type PictureProps = { photo: PhotoBytes; alt: string; className?: string };

/** A photograph out of the phone's own store. Its address lives as long as the picture does. */
export function Picture({ photo: { bytes, mime }, alt, className }: PictureProps) {
  const show = useCallback(
    (picture: HTMLImageElement) => {
      const address = URL.createObjectURL(new Blob([bytes], { type: mime }));
      picture.src = address;
      return () => URL.revokeObjectURL(address);
    },
    [bytes, mime],
  );
  // The bytes are on this phone already, so there is nothing for an image service to make better.
  // eslint-disable-next-line @next/next/no-img-element
  return <img ref={show} alt={alt} className={className} />;
}

"use client";

import { useState } from "react";
import { photoReadingWords as words } from "@/lib/domain/messages/photo";
import type { WalkPhoto } from "@/lib/domain/photo";
import { Button } from "../ui/button";

type DeskPhotoProps = { photo: WalkPhoto; alt: string };

/** One photograph read back, as the server has it; it opens whole in a tab of its own. */
export function DeskPhoto({ photo: { sha256, arrived }, alt }: DeskPhotoProps) {
  const [state, setState] = useState<"fetching" | "shown" | "failed">("fetching");
  const [tries, setTries] = useState(0);
  const again = () => {
    setState("fetching");
    setTries(tries + 1);
  };
  if (!arrived) return <Blank alt={alt}>{words.missing}</Blank>;
  if (state === "failed") {
    return (
      <Blank alt={alt} live>
        {words.failed}
        <Button size="desk" className="mt-2 w-full" onClick={again}>
          {words.again}
        </Button>
      </Blank>
    );
  }
  const address = `/api/photos/${sha256}`;
  return (
    <a href={address} target="_blank" rel="noreferrer" className="relative block border-2 border-ink">
      {state === "fetching" && (
        <span role="status" className="unlit absolute inset-0 flex items-end text-sm">
          <span className="bg-paper px-2 py-1">{words.fetching}</span>
        </span>
      )}
      {/* The bytes recorded are what is shown, not what an image service makes of them. */}
      {/* eslint-disable-next-line @next/next/no-img-element */}
      <img
        key={tries}
        src={address}
        alt={alt}
        ref={(picture) => {
          // One that was there before the page came alive has told nobody.
          if (picture?.complete && picture.naturalWidth > 0) setState("shown");
        }}
        onLoad={() => setState("shown")}
        onError={() => setState("failed")}
        className="aspect-4/3 w-full bg-shade object-cover"
      />
    </a>
  );
}

function Blank({ alt, live, children }: { alt: string; live?: boolean; children: React.ReactNode }) {
  return (
    <div role={live ? "status" : undefined} className="border-2 border-dashed border-edge text-sm">
      <div role="img" aria-label={alt} className="unlit h-10 border-b border-rule" />
      <div className="p-2">{children}</div>
    </div>
  );
}

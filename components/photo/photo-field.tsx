"use client";

import { useRef, useState } from "react";
import { PhotoFault, takePhoto, type PhotoFaultCode, type TakenPhoto } from "@/lib/client/photo-taking";
import { photoWords as words } from "@/lib/domain/messages/photo";
import { FileButton } from "./file-button";
import { Picture } from "./picture";

type Stage =
  | { is: "idle" | "working" }
  | { is: "saved"; photo: TakenPhoto }
  | { is: "failed"; why: PhotoFaultCode | "unsaved" };

type PhotoFieldProps = {
  /** Keeps the photograph; resolves when it is saved on this phone. */
  onPhoto: (taken: TakenPhoto) => Promise<void>;
};

/** Takes a photograph or has one chosen, makes it small, hands it on, and says what came of it. */
export function PhotoField({ onPhoto }: PhotoFieldProps) {
  const [stage, setStage] = useState<Stage>({ is: "idle" });
  const busy = useRef(false);
  const keep = async (file: File) => {
    if (busy.current) return;
    busy.current = true;
    setStage({ is: "working" });
    setStage(await kept(file, onPhoto));
    busy.current = false;
  };
  const working = stage.is === "working";
  const onFile = (file: File) => void keep(file);
  return (
    <div role="group" aria-label={words.group} className="flex flex-col gap-2">
      <div className="flex flex-wrap gap-2">
        <FileButton label={words.take} camera busy={working} onFile={onFile} />
        <FileButton label={words.choose} busy={working} onFile={onFile} />
      </div>
      <div role="status" className="flex flex-wrap items-center gap-3 text-base">
        {stage.is === "saved" && (
          <Picture
            photo={stage.photo}
            alt={words.taken}
            className="h-18 w-18 shrink-0 border-2 border-ink object-cover"
          />
        )}
        {stage.is !== "idle" && (
          <p className={`min-w-0 flex-[1_1_12rem] ${stage.is === "failed" ? "font-semibold" : "text-soft"}`}>
            {stage.is === "failed" ? words.faults[stage.why] : words[stage.is]}
          </p>
        )}
      </div>
    </div>
  );
}

async function kept(file: File, onPhoto: PhotoFieldProps["onPhoto"]): Promise<Stage> {
  try {
    const photo = await takePhoto(file);
    await onPhoto(photo);
    return { is: "saved", photo };
  } catch (error) {
    return { is: "failed", why: error instanceof PhotoFault ? error.code : "unsaved" };
  }
}

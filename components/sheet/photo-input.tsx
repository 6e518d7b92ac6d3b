import { useEffect, useState } from "react";
import { PhotoField } from "@/components/photo/photo-field";
import { Picture } from "@/components/photo/picture";
import { Button } from "@/components/ui/button";
import { keepSheetPhoto, sheetPhotoBytes } from "@/lib/client/sheet-photo";
import { sheetFormWords as words } from "@/lib/domain/messages/sheet-form";
import type { PhotoMime } from "@/lib/domain/photo";
import type { SheetPhoto } from "@/lib/domain/sheet/field";
import { sheetStore } from "./browser-sheet";
import type { InputProps } from "./field-line";
import { NotKnown } from "./not-known";

/** A photograph: taken or chosen here, made small, kept on this phone until the sheet is saved. */
export function PhotoInput({ id, label, value, onChange }: InputProps) {
  const photo = isPhoto(value) ? value : null;
  const [fresh, setFresh] = useState(false);
  return (
    <div id={id} tabIndex={-1} role="group" aria-labelledby={`${id}-label`} className="outline-none">
      <NotKnown label={label} value={value} onChange={onChange}>
        {value !== null && (
          <div className="flex min-w-0 flex-1 flex-col items-start gap-2">
            {photo && <Shown photo={photo} />}
            <p role="status" className="text-base text-soft">
              {photo && fresh && words.photoKept}
            </p>
            {photo ? (
              <Button size="desk" onClick={() => onChange("")} className="min-h-13">
                {words.photoGone}
              </Button>
            ) : (
              <PhotoField
                onPhoto={async (taken) => {
                  onChange(await keepSheetPhoto(sheetStore(), taken));
                  setFresh(true);
                }}
              />
            )}
          </div>
        )}
      </NotKnown>
    </div>
  );
}

function Shown({ photo: { sha256, mime } }: { photo: SheetPhoto }) {
  const [bytes, setBytes] = useState<ArrayBuffer | null>(null);
  useEffect(() => {
    let current = true;
    sheetPhotoBytes(sheetStore(), sha256).then(
      (found) => current && setBytes(found),
      () => {},
    );
    return () => void (current = false);
  }, [sha256]);
  const look = "max-h-64 max-w-full border-2 border-ink object-contain";
  if (bytes)
    return <Picture photo={{ bytes, mime: mime as PhotoMime }} alt={words.photoAlt} className={look} />;
  // The bytes recorded are what is shown, not what an image service makes of them.
  // eslint-disable-next-line @next/next/no-img-element
  return <img src={`/api/photos/${sha256}`} alt={words.photoAlt} className={look} />;
}

function isPhoto(value: unknown): value is SheetPhoto {
  return typeof value === "object" && value !== null && "sha256" in value;
}

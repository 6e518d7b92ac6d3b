import { photoReadingWords as words } from "@/lib/domain/messages/photo";
import type { WalkPhoto } from "@/lib/domain/photo";
import { DeskPhoto } from "./desk-photo";

type PhotoGalleryProps = { photos: readonly WalkPhoto[]; of: string };

/** Photographs of one thing, in the order in which they were taken. */
export function PhotoGallery({ photos, of }: PhotoGalleryProps) {
  return (
    <ul className="mt-2 flex flex-wrap gap-3">
      {photos.map((photo, at) => (
        <li key={photo.seq} className="w-40 max-w-full">
          <DeskPhoto photo={photo} alt={words.alt(of, at + 1, photos.length)} />
        </li>
      ))}
    </ul>
  );
}

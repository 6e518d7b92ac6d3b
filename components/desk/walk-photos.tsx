import { photoReadingWords as words } from "@/lib/domain/messages/photo";
import type { WalkPhoto } from "@/lib/domain/photo";
import { PhotoGallery } from "./photo-gallery";

/** Photographs that belong to the walk and not to one check. */
export function WalkPhotos({ photos }: { photos: readonly WalkPhoto[] }) {
  if (photos.length === 0) return null;
  return (
    <section className="mt-6">
      <h2 className="text-xl leading-tight font-extrabold">{words.title}</h2>
      <p className="text-base text-soft">{words.sub}</p>
      <PhotoGallery photos={photos} of={words.ofWalk} />
    </section>
  );
}

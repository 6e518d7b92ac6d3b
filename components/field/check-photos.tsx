import { PhotoField } from "@/components/photo/photo-field";
import { PhotoStrip } from "@/components/photo/photo-strip";
import type { Recorder } from "@/lib/client/recorder";
import { theField, useSyncView } from "./browser-field";

const readBytes = (sha256: string) => theField().sync.photos.bytes(sha256);

/** The photographs of one check of a walk, as this phone has them. */
export function KeptPhotos({ walk, check }: { walk: string; check: string }) {
  const photos = useSyncView().photos.filter((photo) => photo.walk === walk && photo.check === check);
  return <PhotoStrip photos={photos} read={readBytes} />;
}

/** The photographs of a check, and the way to take one more. */
export function CheckPhotos({ recorder, check }: { recorder: Recorder; check: string }) {
  return (
    <div className="flex flex-col gap-2.5">
      <PhotoField onPhoto={(taken) => recorder.photo(check, taken)} />
      <KeptPhotos walk={recorder.view().walk.id} check={check} />
    </div>
  );
}

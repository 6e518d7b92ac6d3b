import { fitted, PHOTO } from "../domain/photo";
import type { PhotoBytes } from "./photo-shelf";

/** A photograph that was taken or chosen, as it is kept. */
export interface TakenPhoto extends PhotoBytes {
  widthPx: number;
  heightPx: number;
}

/** `unreadable`: this browser cannot make a picture of the file. `too-large`: not even coarsely does it fit. */
export type PhotoFaultCode = "unreadable" | "too-large";

/** Why a file did not become a photograph. */
export class PhotoFault extends Error {
  override name = "PhotoFault";
  constructor(readonly code: PhotoFaultCode) {
    super(code);
  }
}

/** From fine to coarse; the first at which the photograph fits is the one. */
const QUALITIES = [0.8, 0.7, 0.6, 0.5, 0.4] as const;

/**
 * Makes the photograph that is kept of a file: upright, scaled down, a JPEG of its pixels alone. Nothing else of the
 * file is carried over, so neither where nor with what it was taken.
 * @throws PhotoFault
 */
export async function takePhoto(file: Blob): Promise<TakenPhoto> {
  const picture = await createImageBitmap(file, { imageOrientation: "from-image" }).catch(() => {
    throw new PhotoFault("unreadable");
  });
  const canvas = document.createElement("canvas");
  try {
    const { widthPx, heightPx } = fitted(picture.width, picture.height);
    canvas.width = widthPx;
    canvas.height = heightPx;
    draw(picture, canvas);
    for (const quality of QUALITIES) {
      const blob = await new Promise<Blob | null>((done) => canvas.toBlob(done, "image/jpeg", quality));
      if (!blob) throw new PhotoFault("unreadable");
      if (blob.size > PHOTO.bytes) continue;
      return { bytes: await blob.arrayBuffer(), mime: "image/jpeg", widthPx, heightPx };
    }
    throw new PhotoFault("too-large");
  } finally {
    picture.close();
    // Some phones have little memory for canvases, and give it back late.
    canvas.width = 0;
    canvas.height = 0;
  }
}

function draw(picture: ImageBitmap, canvas: HTMLCanvasElement): void {
  const context = canvas.getContext("2d", { alpha: false });
  if (!context) throw new PhotoFault("unreadable");
  // A JPEG has no see-through pixels; what shows through is paper.
  context.fillStyle = "#ffffff";
  context.fillRect(0, 0, canvas.width, canvas.height);
  context.imageSmoothingQuality = "high";
  context.drawImage(picture, 0, 0, canvas.width, canvas.height);
}

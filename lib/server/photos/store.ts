import type { PhotoMime, PhotoPut } from "@/lib/domain/photo";
import { settings } from "../settings";
import { PhotoFolder } from "./folder";

/**
 * A photograph as a store knows it. The digest alone would not do: it stands in records that are handed around, and
 * whoever can write it into an entry of their own must not be given the bytes for it. So each organisation sends its own.
 */
export interface StoredPhoto {
  organisation: string;
  sha256: string;
  bytes: number;
  mime: PhotoMime;
}

/** Where the bytes of photographs are kept. They are sent to it directly, by a link that it signs. */
export interface PhotoStore {
  has(photo: StoredPhoto): Promise<boolean>;
  /** A request by which exactly this photograph can be sent until the link runs out. */
  presignPut(photo: StoredPhoto, now: Date): PhotoPut;
  /** The bytes, or null where they are not there. */
  read(photo: StoredPhoto): Promise<Uint8Array<ArrayBuffer> | null>;
}

/** This product's store: a folder of our own, whose links lead to `PUT /api/photos/{sha256}`. */
export function photoStore(): PhotoFolder {
  return new PhotoFolder(settings.PHOTOS_DIR);
}

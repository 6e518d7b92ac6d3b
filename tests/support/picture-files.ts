import { Buffer } from "node:buffer";
import type { Page } from "@playwright/test";

/** A place that nobody's photograph may carry: 39° 44′ 21″ N, written into the GPS block below. */
export const GPS_MARK = "HOOKFAST-GPS-MARK";

/**
 * A picture that this browser makes, a JPEG unless `type` says otherwise: the left half red, the right half blue; or
 * noise, which compresses badly, or nothing that covers.
 */
export async function picture(
  page: Page,
  widthPx: number,
  heightPx: number,
  wanted: { noise?: boolean; clear?: boolean; type?: string } = {},
): Promise<Buffer> {
  const base64 = await page.evaluate(
    async ({ widthPx, heightPx, noise, clear, type }) => {
      const canvas = document.createElement("canvas");
      [canvas.width, canvas.height] = [widthPx, heightPx];
      const context = canvas.getContext("2d")!;
      context.fillStyle = "#c00000";
      context.fillRect(0, 0, widthPx / 2, heightPx);
      context.fillStyle = "#0000c0";
      context.fillRect(widthPx / 2, 0, widthPx / 2, heightPx);
      if (clear) context.clearRect(0, 0, widthPx, heightPx);
      if (noise) {
        const pixels = context.getImageData(0, 0, widthPx, heightPx);
        let seed = 1;
        for (let at = 0; at < pixels.data.length; at += 1) {
          seed ^= seed << 13;
          seed ^= seed >>> 17;
          seed ^= seed << 5;
          if (at % 4 < 3) pixels.data[at] = seed & 255;
        }
        context.putImageData(pixels, 0, 0);
      }
      return canvas.toDataURL(type ?? "image/jpeg", 0.95).split(",")[1]!;
    },
    { widthPx, heightPx, ...wanted },
  );
  return Buffer.from(base64, "base64");
}

/**
 * The same JPEG with an Exif block as a phone writes it: an orientation, and a GPS block with a latitude and a place
 * in words. Layout by the Exif standard (TIFF 6.0, little endian; tags 0x0112, 0x8825, 0x0001, 0x0002, 0x001c).
 */
export function withGps(plain: Buffer, orientation: 1 | 6): Buffer {
  const area = Buffer.from(`ASCII\0\0\0${GPS_MARK}`, "latin1");
  const [gpsAt, latitudeAt] = [8 + 2 + 2 * 12 + 4, 8 + 2 + 2 * 12 + 4 + 2 + 3 * 12 + 4];
  const areaAt = latitudeAt + 24;
  const tiff = Buffer.concat([
    Buffer.from("II*\0", "latin1"),
    u32(8),
    u16(2),
    field(0x0112, 3, 1, Buffer.concat([u16(orientation), u16(0)])),
    field(0x8825, 4, 1, u32(gpsAt)),
    u32(0),
    u16(3),
    field(0x0001, 2, 2, Buffer.from("N\0\0\0", "latin1")),
    field(0x0002, 5, 3, u32(latitudeAt)),
    field(0x001c, 7, area.length, u32(areaAt)),
    u32(0),
    ...[39, 1, 44, 1, 21, 1].map(u32),
    area,
  ]);
  const body = Buffer.concat([Buffer.from("Exif\0\0", "latin1"), tiff]);
  const length = Buffer.alloc(2);
  length.writeUInt16BE(body.length + 2);
  const app1 = Buffer.concat([Buffer.from([0xff, 0xe1]), length, body]);
  return Buffer.concat([plain.subarray(0, 2), app1, plain.subarray(2)]);
}

/** The segments of a JPEG up to its picture data: the marker, as “ffe0” and so on, and the first 16 bytes as text. */
export function segments(bytes: Buffer): { marker: string; begins: string }[] {
  const found = [];
  for (let at = 2; bytes.readUInt16BE(at) !== 0xffda; at += 2 + bytes.readUInt16BE(at + 2)) {
    const begins = bytes.subarray(at + 4, at + 20).toString("latin1");
    found.push({ marker: bytes.readUInt16BE(at).toString(16), begins });
  }
  return found;
}

function field(tag: number, type: number, count: number, value: Buffer): Buffer {
  return Buffer.concat([u16(tag), u16(type), u32(count), value]);
}

function u16(value: number): Buffer {
  const bytes = Buffer.alloc(2);
  bytes.writeUInt16LE(value);
  return bytes;
}

function u32(value: number): Buffer {
  const bytes = Buffer.alloc(4);
  bytes.writeUInt32LE(value);
  return bytes;
}

import { expect, test } from "vitest";
import { UUID, uuidV7 } from "@/lib/domain/uuid";

const bytes = (hex: string) => Uint8Array.from(hex.match(/../g)!, (byte) => parseInt(byte, 16));

test("UUIDv7, RFC 9562 A.6: rand_a CC3, rand_b 18C4DC0C0C07398F", () => {
  // The version and variant bits are there to be overwritten: 0xFCC3 and 0xD8C4.
  for (const random of ["0cc318c4dc0c0c07398f", "fcc3d8c4dc0c0c07398f"]) {
    expect(uuidV7(1645557742000, bytes(random))).toBe("017f22e2-79b0-7cc3-98c4-dc0c0c07398f");
  }
});

test("later ones sort later as text", () => {
  const none = new Uint8Array(10);
  const all = new Uint8Array(10).fill(255);
  expect(uuidV7(1000, all) < uuidV7(1001, none)).toBe(true);
});

test("the random bytes are left alone, and must be ten", () => {
  const random = new Uint8Array(10);
  uuidV7(0, random);
  expect([...random]).toEqual(Array(10).fill(0));
  expect(() => uuidV7(0, new Uint8Array(9))).toThrow(RangeError);
});

test.each([
  ["017f22e2-79b0-7cc3-98c4-dc0c0c07398f", true],
  ["00000000-0000-0000-0000-000000000000", true],
  ["017F22E2-79B0-7CC3-98C4-DC0C0C07398F", false],
  ["017f22e279b07cc398c4dc0c0c07398f", false],
  ["017f22e2-79b0-7cc3-98c4-dc0c0c07398f\n", false],
])("%o as an id: %s", (text, is) => {
  expect(UUID.test(text)).toBe(is);
});

import "fake-indexeddb/auto";
import { expect, test, vi } from "vitest";
import { deviceFor, registrationOf, setRegistered, signSeal } from "@/lib/client/device";
import { openStore } from "@/lib/client/store";
import { deviceShape } from "@/lib/domain/field";
import { sealMessage, verifies } from "@/lib/domain/signature";

const seal = "ab".repeat(32);

async function oldBrowser<T>(work: () => Promise<T>): Promise<T> {
  const generate = crypto.subtle.generateKey.bind(crypto.subtle) as (
    ...args: unknown[]
  ) => Promise<CryptoKeyPair>;
  const spy = vi.spyOn(crypto.subtle, "generateKey").mockImplementation((async (...args: unknown[]) => {
    if ((args[0] as { name: string }).name === "Ed25519") throw new DOMException("", "NotSupportedError");
    return generate(...args);
  }) as never);
  return work().finally(() => spy.mockRestore());
}

test.each([
  ["Ed25519", <T>(work: () => Promise<T>) => work()],
  ["ES256", oldBrowser],
] as const)("a device makes a key of its own that signs and cannot leave: %s", async (alg, browser) => {
  const store = openStore(`device-${alg}`);
  const made = await browser(() => deviceFor(store, "member"));
  const device = await deviceFor(store, "member");
  expect(device).toMatchObject({ id: made.id, alg, publicKey: made.publicKey, registered: false });
  expect(device.privateKey.extractable).toBe(false);
  const signature = await signSeal(device, seal);
  expect(verifies(device.publicKey, alg, sealMessage(seal), signature)).toBe(true);
  expect(verifies(device.publicKey, alg, sealMessage("cd".repeat(32)), signature)).toBe(false);
  expect(deviceShape.safeParse(registrationOf(device, "a phone")).success).toBe(true);
});

test("each member has a device of their own on a shared phone, made once", async () => {
  const store = openStore("device-shared");
  const [one, same] = await Promise.all([deviceFor(store, "one"), deviceFor(store, "one")]);
  const two = await deviceFor(store, "two");
  expect(same.id).toBe(one.id);
  expect(two.id).not.toBe(one.id);
  await setRegistered(store, "one", true);
  expect([(await deviceFor(store, "one")).registered, (await deviceFor(store, "two")).registered]).toEqual([
    true,
    false,
  ]);
});

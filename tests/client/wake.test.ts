import { expect, test } from "vitest";
import { keepAwake } from "@/lib/client/wake";

const settled = () => new Promise((done) => setTimeout(done));

function phone(refuses = false) {
  const handlers = new Set<() => void>();
  const page = {
    visibilityState: "visible" as DocumentVisibilityState,
    addEventListener: (_: string, handler: () => void) => handlers.add(handler),
    removeEventListener: (_: string, handler: () => void) => handlers.delete(handler),
  };
  const locks: { released: boolean; release: () => Promise<void> }[] = [];
  const lock = {
    async request() {
      if (refuses) throw new DOMException("", "NotAllowedError");
      const sentinel = { released: false, release: async () => void (sentinel.released = true) };
      locks.push(sentinel);
      return sentinel as unknown as WakeLockSentinel;
    },
  };
  const show = async (state: DocumentVisibilityState) => {
    page.visibilityState = state;
    // As the browser does: what is out of sight loses its lock.
    if (state === "hidden") for (const each of locks) each.released = true;
    handlers.forEach((handler) => handler());
    await settled();
  };
  return {
    ground: { page, lock } as unknown as Parameters<typeof keepAwake>[0] & object,
    locks,
    show,
    handlers,
  };
}

test("one lock while in sight, another after each return, none after the end", async () => {
  const { ground, locks, show, handlers } = phone();
  const end = keepAwake(ground);
  await settled();
  await show("visible");
  expect(locks.length).toBe(1);
  await show("hidden");
  await show("visible");
  expect(locks.map((each) => each.released)).toEqual([true, false]);
  end();
  await show("visible");
  expect(locks.map((each) => each.released)).toEqual([true, true]);
  expect(handlers.size).toBe(0);
});

test("a lock that comes after the end is let go", async () => {
  const { ground, locks } = phone();
  keepAwake(ground)();
  await settled();
  expect(locks.map((each) => each.released)).toEqual([true]);
});

test("nothing is asked for while out of sight", async () => {
  const { ground, locks, show } = phone();
  await show("hidden");
  keepAwake(ground);
  await settled();
  expect(locks).toEqual([]);
});

test.each([
  ["refuses", phone(true).ground],
  ["knows no such thing", { ...phone().ground, lock: undefined }],
])("a browser that %s is no trouble", async (_, ground) => {
  const end = keepAwake(ground);
  await settled();
  end();
});

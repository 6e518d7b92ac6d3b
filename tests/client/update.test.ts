import { describe, expect, test, vi } from "vitest";
import type { Workbox } from "workbox-window";
import { mayOffer, offerFacts } from "@/lib/client/update-offer";
import { Updates } from "@/lib/client/update-worker";
import type { KeptWalk } from "@/lib/client/walk-shelf";

test.each([
  [true, false, false, true],
  [false, false, false, false],
  [true, true, false, false],
  [true, false, true, false],
  [true, true, true, false],
])("waiting %s, a walk open here %s, one held %s: %s", (waiting, openWalkHere, heldElsewhere, offered) => {
  expect(mayOffer({ waiting, openWalkHere, heldElsewhere })).toBe(offered);
});

describe("the facts", () => {
  const walk = (id: string, closed: boolean) => ({ id, seal: (closed ? {} : null) as KeptWalk["seal"] });
  const locks = (...names: (string | undefined)[]) => ({
    query: async () => ({ held: names.map((name) => ({ ...(name && { name }) })), pending: [] }),
  });

  test.each<[string, ReturnType<typeof walk>[], (string | undefined)[], boolean, boolean]>([
    ["nothing", [], [], false, false],
    ["closed walks and other locks", [walk("a", true)], ["hookfast-drain", undefined], false, false],
    ["an open walk", [walk("a", true), walk("b", false)], [], true, false],
    ["a closed walk whose verdict shows in a tab", [walk("a", true)], ["hookfast-walk-a"], false, false],
    ["a walk of another member in a tab", [walk("a", true)], ["hookfast-walk-z"], false, true],
    ["an open walk in a tab", [walk("b", false)], ["hookfast-walk-b"], true, true],
  ])("%s", async (_, walks, held, openWalkHere, heldElsewhere) => {
    expect(await offerFacts(true, walks, locks(...held))).toEqual({
      waiting: true,
      openWalkHere,
      heldElsewhere,
    });
  });
});

describe("a new version", () => {
  function tab(covered: boolean, inWalk: { now: boolean }) {
    const heard = new Map<string, () => void>();
    const worker = {
      addEventListener: (type: string, handler: () => void) => void heard.set(type, handler),
      messageSkipWaiting: vi.fn(),
      update: vi.fn(async () => {}),
    };
    const reload = vi.fn();
    const updates = new Updates(worker as unknown as Workbox, covered, () => !inWalk.now, reload);
    return { updates, worker, reload, emit: (type: string) => heard.get(type)!() };
  }

  test("waits until it is taken; then the page is loaded anew", () => {
    const { updates, worker, reload, emit } = tab(true, { now: false });
    expect(updates.waiting()).toBe(false);
    emit("waiting");
    expect([updates.waiting(), worker.messageSkipWaiting.mock.calls.length]).toEqual([true, 0]);
    updates.take();
    expect([worker.messageSkipWaiting.mock.calls.length, reload.mock.calls.length]).toEqual([1, 0]);
    emit("controlling");
    expect(reload).toHaveBeenCalledTimes(1);
  });

  test("the very first worker reloads nothing, the next one does", () => {
    const { reload, emit } = tab(false, { now: false });
    emit("controlling");
    expect(reload).not.toHaveBeenCalled();
    emit("controlling");
    expect(reload).toHaveBeenCalledTimes(1);
  });

  test("a tab in a walk keeps its page, and may follow after", () => {
    const inWalk = { now: true };
    const { updates, worker, reload, emit } = tab(true, inWalk);
    emit("controlling");
    expect([reload.mock.calls.length, updates.waiting()]).toEqual([0, true]);
    inWalk.now = false;
    updates.take();
    expect([reload.mock.calls.length, worker.messageSkipWaiting.mock.calls.length]).toEqual([1, 0]);
  });

  test("is looked for when the page is seen again, once an hour at most; offline it is no trouble", () => {
    const { updates, worker } = tab(true, { now: false });
    worker.update.mockRejectedValue(new TypeError("offline"));
    let nowMs = 0;
    let shown = () => {};
    const page = { visibilityState: "visible" as DocumentVisibilityState, addEventListener: vi.fn() };
    page.addEventListener.mockImplementation((_: string, handler: () => void) => void (shown = handler));
    updates.followPage(page as never, () => nowMs);
    const after = (ms: number, state: DocumentVisibilityState = "visible") => {
      nowMs += ms;
      page.visibilityState = state;
      shown();
      return worker.update.mock.calls.length;
    };
    const hour = 3_600_000;
    expect([after(hour - 1), after(1), after(hour, "hidden"), after(1), after(10)]).toEqual([0, 1, 1, 2, 2]);
  });
});

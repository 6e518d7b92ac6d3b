import { describe, expect, test } from "vitest";
import { chainFault, nextLink, stamp, type ChainFault, type Head } from "@/lib/domain/chain";
import { sha256Hex } from "@/lib/domain/digest";
import { bodyOf, readEntry, type Link } from "@/lib/domain/entry";
import { revision } from "../support/rig";

const walk = "017f22e2-79b0-7cc3-98c4-dc0c0c07398f";
const when = { at: "2026-05-01T12:00:00.000Z", elapsedMs: 0, monoMs: 0, monoEpoch: "test" };
const body = {
  rig: "r",
  revision,
  purpose: "hook-up",
  depth: "full",
  device: "d",
  member: "m",
  app: "test",
};
const open = nextLink(walk, { revision }, "open", body, when);
const mark = nextLink(walk, open, "mark", { check: "pin", outcome: "good" }, when);
const close = nextLink(walk, mark, "close", { verdict: "unfinished", marks: 1, faults: 0 }, when);

describe("links", () => {
  test("follow the revision, then each other", () => {
    expect([open, mark, close].map(({ entry }) => [entry.seq, entry.prev])).toEqual([
      [0, revision],
      [1, open.digest],
      [2, mark.digest],
    ]);
    for (const { text, digest } of [open, mark, close]) expect(sha256Hex(text)).toBe(digest);
  });

  test("read back as what they are", () => {
    for (const link of [open, mark, close]) expect(readEntry(JSON.parse(link.text))).toEqual(link);
    expect(bodyOf(open.entry, "open")).toEqual(body);
    expect(bodyOf(open.entry, "mark")).toBeNull();
  });

  test("are read whatever their type is called", () => {
    const strange = nextLink(walk, mark, "constructor", { any: "thing" }, when);
    expect(readEntry(JSON.parse(strange.text))).toEqual(strange);
  });
});

describe("what may follow what", () => {
  const head = (over: Partial<Head> = {}): Head => ({
    stored: 0,
    digest: null,
    closed: false,
    sealed: false,
    ...over,
  });
  const afterOpen = head({ stored: 1, digest: open.digest });
  const afterMark = head({ stored: 2, digest: mark.digest });
  const closed = head({ stored: 3, digest: close.digest, closed: true });
  const sealed = { ...closed, sealed: true };
  const seqOf = (link: Link, seq: number): Link => ({ ...link, entry: { ...link.entry, seq } });
  const prevOf = (link: Link, prev: string): Link => ({ ...link, entry: { ...link.entry, prev } });

  test.each<[string, Head, Link, ChainFault | null]>([
    ["`open` first", head(), open, null],
    ["a mark first", head(), seqOf(mark, 0), "invalid"],
    ["a mark before `open`", head(), mark, "gap"],
    ["a second `open`", afterOpen, seqOf(open, 1), "invalid"],
    ["the next", afterOpen, mark, null],
    ["one left out", afterOpen, close, "gap"],
    ["one stored already", afterMark, mark, "gap"],
    ["`close`", afterMark, close, null],
    ["another's digest", afterMark, prevOf(close, open.digest), "broken-chain"],
    ["`open` on another revision", head(), prevOf(open, open.digest), "broken-chain"],
    ["after `close`", closed, seqOf(mark, 3), "invalid"],
    ["a gap after `close`", closed, seqOf(mark, 9), "invalid"],
    ["after the seal", sealed, seqOf(mark, 3), "sealed"],
    ["a second `open` after the seal", sealed, seqOf(open, 3), "invalid"],
  ])("%s", (_, at, link, fault) => {
    expect(chainFault(at, link)).toBe(fault);
  });
});

describe("time stamps", () => {
  const last = { at: "2026-05-01T12:00:10.000Z", elapsedMs: 10_000, monoMs: 15_000, monoEpoch: "one" };
  const now = (over: object) => ({
    wallMs: Date.UTC(2026, 4, 1, 12, 1),
    monoMs: 21_000.4,
    monoEpoch: "one",
    ...over,
  });

  test.each([
    ["the first entry, since the page opened", now({}), null, 20_000, 1_000],
    ["in the same epoch, since the last entry", now({}), last, 0, 16_000],
    ["in another epoch, since the walk was taken up", now({ monoEpoch: "two" }), last, 20_000, 11_000],
    ["a clock that runs back adds nothing", now({ monoMs: 14_000 }), last, 0, 10_000],
  ])("%s", (_, reading, before, takenUp, elapsedMs) => {
    expect(stamp(reading, before, takenUp)).toEqual({
      at: "2026-05-01T12:01:00.000Z",
      elapsedMs,
      monoMs: Math.round(reading.monoMs),
      monoEpoch: reading.monoEpoch,
    });
  });
});

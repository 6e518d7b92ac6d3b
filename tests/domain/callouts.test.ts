import { describe, expect, test } from "vitest";
import { calloutsOf, type Drawn, drawingKeyOf } from "@/lib/domain/callouts";

describe("what a check's drawing calls out", () => {
  test.each<[string, Drawn, string, string[]]>([
    [
      "a part",
      { part: "receiver" },
      "receiver",
      ["A hitch pin through, clip on its end", "B bar: its own pin and clip", "C shank seated, welds whole"],
    ],
    [
      "an arm without a side is the left one",
      { part: "arm" },
      "arm-left",
      ["A pin down full depth", "B ring over its end", "C through both tabs"],
    ],
    [
      "an arm of a side",
      { part: "arm", side: "right" },
      "arm-right",
      ["A pin down full depth", "B ring over its end", "C through both tabs"],
    ],
    [
      "a side that its part does not know",
      { part: "chocks", side: "left" },
      "chocks",
      ["A tight to the tread, both sides", "B parking brake on"],
    ],
    ["a state", { part: "cord", drawn: "off" }, "cord-off", ["A caps closed", "B lanyard off, cables off"]],
    ["one callout alone is A", { part: "last-look", drawn: "tires" }, "last-look-tires", ["A every tire"]],
    [
      "one callout alone is A, standing too",
      { part: "wheels", drawn: "standing" },
      "wheels-standing",
      ["A left against right"],
    ],
    ["nothing where it only says where to look", { part: "wheels", drawn: "place" }, "wheels", []],
    ["nothing on the lamps", { part: "lamps" }, "lamps", []],
  ])("%s", (_, drawn, key, callouts) => {
    expect(drawingKeyOf(drawn)).toBe(key);
    expect(calloutsOf(drawn).map(({ letter, text }) => `${letter} ${text}`)).toEqual(callouts);
  });
});

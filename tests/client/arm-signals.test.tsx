import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { ArmSignalDrawing } from "@/components/drawings/arm-signals";
import { signals } from "@/lib/domain/entry";
import { lampScriptWords } from "@/lib/domain/messages/lamp-script";

const drawn = signals.map(
  (signal) => [signal, renderToStaticMarkup(<ArmSignalDrawing signal={signal} />)] as const,
);

/** How many lamps of one are lit: a turn signal lights its own side. */
const litLamps = { tail: 2, left: 1, right: 1, stop: 2, hazard: 2, "stop-left": 2, "stop-right": 2 };

describe.each(drawn)("the arms for %s", (signal, markup) => {
  it("are named, and described in the words that the prompter has", () => {
    const { name, arms } = lampScriptWords.signal[signal];
    expect(markup).toContain(`>${lampScriptWords.arms.title(name)}</title>`);
    expect(markup).toContain(arms);
  });

  it("light as many lamps as the signal does", () => {
    expect(markup.split("dr-lit").length - 1).toBe(litLamps[signal]);
  });

  it("say which side is which", () => {
    expect(markup).toContain(">LEFT<");
    expect(markup).toContain(">RIGHT<");
  });
});

it("differ for every signal, in more than their words", () => {
  const shapes = drawn.map(([, markup]) => markup.replace(/<title.*<\/desc>/, "").replace(/_[^"]*?_/g, ""));
  expect(new Set(shapes).size).toBe(signals.length);
});

import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, test } from "vitest";
import { DrawingSheet } from "@/components/drawings/drawing-sheet";
import { nearestOf } from "@/components/drawings/nearest";
import { PartDrawing } from "@/components/drawings/part-drawing";
import { calloutsOf, type Drawn, drawingKeyOf } from "@/lib/domain/callouts";
import { drawingWords } from "@/lib/domain/messages/drawings";
import { drawnStates, partKeys } from "@/lib/domain/revision";

const every: Drawn[] = partKeys.flatMap((part) =>
  (["left", "right"] as const).flatMap((side) =>
    [undefined, ...drawnStates].map((drawn) => ({ part, side, drawn })),
  ),
);
const named = every.map((drawn) => [`${drawn.part} ${drawn.side} ${drawn.drawn ?? ""}`, drawn] as const);

/** The letter of each callout on a drawing with the text beside it. */
function shownOn(markup: string): string[] {
  return markup.split("data-callout=").flatMap((callout, index) => {
    if (index === 0) return [];
    const texts = [...callout.matchAll(/<text[^>]*>([^<]*)<\/text>/g)].map(([, text]) => text);
    return [texts.join(" ").replaceAll("&#x27;", "'")];
  });
}

describe("each part in each state", () => {
  test.each(named)("%s is named, described and calls out what its words say", (_, drawn) => {
    const { title, description } = drawingWords[drawingKeyOf(drawn)];
    const full = renderToStaticMarkup(<PartDrawing {...drawn} />);
    const small = renderToStaticMarkup(<PartDrawing {...drawn} size="small" />);
    for (const markup of [full, small]) {
      expect(markup).toContain(`>${title}</title>`);
      expect(markup).toContain(`>${description}`);
      expect(markup).toMatch(/^<svg[^>]* role="img" aria-labelledby="(.+)-title" aria-describedby="\1-desc"/);
    }
    const letters = calloutsOf(drawn).map(({ letter, text }) => `${letter} ${text}`);
    expect(shownOn(full).sort()).toEqual(letters);
    expect(shownOn(small)).toEqual([]);
    expect(letters.map(([letter]) => letter).join("")).toBe("ABCD".slice(0, letters.length));
  });
});

describe("what a check adds to its drawing", () => {
  const sheet = renderToStaticMarkup(
    <DrawingSheet part="ball" marked={["B"]} effect="hold" figures={{ C: "5,000 lb" }} />,
  );
  const [, drawing = "", beside = "", below = ""] = sheet.split(/<svg|<ul/);

  test("a marked callout is struck out, the others are not", () => {
    const [, ...callouts] = drawing.split("data-callout=");
    expect(callouts.map((callout) => callout.includes("dr-cross-halo"))).toEqual([false, true, false]);
    expect(drawing.match(/dr-marked-hold/g)).toHaveLength(1);
    expect(drawing).not.toContain("dr-marked-fix");
  });

  test("both legends say it in words", () => {
    for (const legend of [beside, below]) {
      expect(legend.match(/not as drawn/g)).toHaveLength(1);
      expect(legend).toMatch(/pin through latch, clip on its end<span[^>]*>, not as drawn/);
    }
  });

  test("the rig's own figure stands with its callout everywhere", () => {
    expect(shownOn(drawing)).toContain("C ball all the way in 5,000 lb");
    for (const legend of [beside, below]) expect(legend).toMatch(/ball all the way in<span[^>]*>5,000 lb/);
  });

  test("nothing takes a touch unless someone listens", () => {
    const listening = renderToStaticMarkup(<PartDrawing part="ball" onCallout={() => undefined} />);
    expect(drawing).not.toContain("dr-reach");
    expect(listening.match(/dr-reach/g)).toHaveLength(6);
  });
});

describe("the callout nearest to a touch", () => {
  const callouts = [
    { key: "A", stretches: [[0, 0, 100, 0]] },
    {
      key: "B",
      stretches: [
        [0, 50, 40, 50],
        [0, 50, 0, 90],
      ],
    },
  ] as const;
  test.each([
    ["on a letter", 0, 50, "B"],
    ["along a leader", 60, 20, "A"],
    ["past its end", 140, 5, "A"],
    ["nearer to the second stretch", 5, 85, "B"],
    ["just on this side of the middle", 20, 24, "A"],
    ["just on the other side of it", 20, 26, "B"],
  ])("%s", (_, x, y, key) => {
    expect(nearestOf(x, y, callouts)).toBe(key);
  });
  test("none where nothing is called out", () => {
    expect(nearestOf(1, 1, [])).toBeUndefined();
  });
});

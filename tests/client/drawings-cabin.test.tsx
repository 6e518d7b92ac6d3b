import { renderToStaticMarkup } from "react-dom/server";
import { describe, expect, it } from "vitest";
import { PartDrawing } from "@/components/drawings/part-drawing";
import { cabinDrawingWords } from "@/lib/domain/messages/drawings-cabin";
import type { DrawnState, PartKey } from "@/lib/domain/revision";

const drawings: [words: keyof typeof cabinDrawingWords, part: PartKey, drawn?: DrawnState][] = [
  ["coach-held", "coach-held"],
  ["steering", "steering"],
  ["parking-brake", "parking-brake"],
  ["fuse", "fuse"],
  ["fuse-off", "fuse", "off"],
  ["pedal", "pedal"],
  ["brake-air", "brake-air"],
  ["brake-hydraulic", "brake-hydraulic"],
  ["brake-surge", "brake-surge"],
  ["monitor", "monitor"],
  ["manual-apply", "manual-apply"],
  ["jacks", "jacks"],
  ["light-bar", "light-bar"],
];

/** Every text of an element of that name, its markup taken off. */
const textsOf = (markup: string, element: string) =>
  [...markup.matchAll(new RegExp(`<${element}\\b[^>]*>([^<]*)</${element}>`, "g"))].map(([, text]) => text);

it("draws every entry of the words", () => {
  expect(drawings.map(([key]) => key)).toEqual(Object.keys(cabinDrawingWords));
});

describe.each(drawings)("the drawing %s", (key, part, drawn) => {
  const words = cabinDrawingWords[key];
  const full = renderToStaticMarkup(<PartDrawing part={part} drawn={drawn} />);
  const small = renderToStaticMarkup(<PartDrawing part={part} drawn={drawn} size="small" />);

  it("is named and described in both sizes", () => {
    for (const markup of [full, small]) {
      expect(textsOf(markup, "title")).toEqual([words.title]);
      expect(textsOf(markup, "desc")).toEqual([words.description]);
    }
    expect(full).toContain('viewBox="0 0 390 ');
    expect(small).toContain('viewBox="0 0 88 74"');
  });

  it("shows each letter once, from A on, beside its words; the small one shows none", () => {
    const letters = Object.keys(words.callouts);
    expect(letters).toEqual(["A", "B", "C", "D"].slice(0, letters.length));
    const lines: readonly string[] = Object.values(words.callouts).flat();
    expect(textsOf(full, "text").toSorted()).toEqual([...letters, ...lines].toSorted());
    expect(textsOf(small, "text")).toEqual([]);
  });

  it("has labels of two short lines at most", () => {
    for (const lines of Object.values(words.callouts)) {
      expect(lines.length).toBeLessThanOrEqual(2);
      for (const line of lines) expect(line.length).toBeLessThanOrEqual(24);
    }
  });

  it("is amber only where its description has a lamp lit", () => {
    const told = /\blit\b/.test(words.description);
    expect(full.includes("dr-lit")).toBe(told);
    if (!told) expect(small).not.toContain("dr-lit");
  });
});

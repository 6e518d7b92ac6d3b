import { useSearchParams } from "next/navigation";
import { useEffect, useRef, type RefObject } from "react";
import { sectionKeys, type SectionKey } from "@/lib/domain/sheet/draft-sections";

/** Which section is open, by the address, so that the way back of the phone goes through them. */
export function useSection(): {
  section: SectionKey;
  go: (section: SectionKey, focus?: string) => void;
  heading: RefObject<HTMLHeadingElement | null>;
} {
  const params = useSearchParams();
  const wanted = params.get("section");
  const section = sectionKeys.find((key) => key === wanted) ?? "rig";
  const heading = useRef<HTMLHeadingElement>(null);
  const arrived = useRef<SectionKey | null>(null);
  // Where to go within a section, kept until that section is the one that shows.
  const wish = useRef<{ section: SectionKey; field: string } | null>(null);
  useEffect(() => {
    // The first section of a page load leaves the focus where the browser put it.
    const moved = arrived.current !== null && arrived.current !== section;
    arrived.current = section;
    const due = wish.current?.section === section ? wish.current : null;
    if (!moved && !due) return;
    wish.current = null;
    const target = due && document.getElementById(due.field);
    openFolds(target);
    if (target) target.scrollIntoView({ block: "center" });
    else heading.current?.closest("form")?.scrollIntoView();
    (target ?? heading.current)?.focus({ preventScroll: true });
  });
  const go = (next: SectionKey, field?: string) => {
    wish.current = field === undefined ? null : { section: next, field };
    const query = new URLSearchParams(params);
    query.set("section", next);
    // The router follows the address without asking the server for anything.
    window.history.pushState(null, "", `?${query.toString()}`);
  };
  return { section, go, heading };
}

function openFolds(target: Element | null): void {
  for (let fold = target?.closest("details"); fold; fold = fold.parentElement?.closest("details"))
    fold.open = true;
}

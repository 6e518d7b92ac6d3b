import type { ReactNode } from "react";

// Stuck to the bottom while it takes a small part of the screen's height; with large text, or a screen on its side,
// it would cover what it belongs to, and the factor pushes it back into the flow of the page.
const heights = {
  low: "max-md:bottom-[min(0px,calc((28vh-8rem)*40))]",
  tall: "max-md:bottom-[min(0px,calc((40vh-13rem)*40))]",
};

type BottomBarProps = { height: keyof typeof heights; className: string; children: ReactNode };

/** What a screen offers to do, in thumb reach on a phone. */
export function BottomBar({ height, className, children }: BottomBarProps) {
  return (
    <div
      className={`mt-auto border-t-hair border-rule bg-paper pt-3 pb-[max(1rem,env(safe-area-inset-bottom))] max-md:sticky ${heights[height]} ${className}`}
    >
      {children}
    </div>
  );
}

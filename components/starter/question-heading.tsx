import type { ReactNode, RefObject } from "react";

export type HeadingRef = RefObject<HTMLHeadingElement | null>;

/** What is asked now; the focus comes here. */
export function QuestionHeading({ heading, children }: { heading: HeadingRef; children: ReactNode }) {
  return (
    <h2
      ref={heading}
      tabIndex={-1}
      className="px-4 text-[1.5625rem] leading-[1.18] font-extrabold tracking-[-0.01em] outline-none"
    >
      {children}
    </h2>
  );
}

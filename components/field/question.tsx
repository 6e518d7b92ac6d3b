import { useEffect, useRef, type ReactNode } from "react";

type QuestionProps = { title: string; id: string; appearance?: string; children: ReactNode };

/** A question in place of the buttons under a check; the focus goes to it when it appears. */
export function Question({ title, id, appearance = "", children }: QuestionProps) {
  const heading = useRef<HTMLParagraphElement>(null);
  useEffect(() => heading.current?.focus(), [appearance]);
  return (
    <section aria-labelledby={id} className="flex flex-col gap-2.5">
      <p
        id={id}
        ref={heading}
        tabIndex={-1}
        className="px-1 text-xl leading-snug font-extrabold outline-none"
      >
        {title}
      </p>
      {children}
    </section>
  );
}

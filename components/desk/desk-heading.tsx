import type { ReactNode } from "react";

type DeskHeadingProps = { over?: ReactNode; title: ReactNode; sub?: ReactNode };

/** The top of a desk page. */
export function DeskHeading({ over, title, sub }: DeskHeadingProps) {
  return (
    <header className="mb-4">
      {over}
      <h1 className="text-[1.875rem] leading-[1.1] font-extrabold">{title}</h1>
      {sub && <p className="mt-1 text-base text-soft">{sub}</p>}
    </header>
  );
}

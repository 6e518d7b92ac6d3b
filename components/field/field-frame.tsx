import type { ReactNode } from "react";

/** The heading of a screen that has only a message. */
export function LargeTitle({ children }: { children: string }) {
  return <h1 className="px-4 pt-10 pb-6 text-[2.25rem] leading-[1.05] font-extrabold">{children}</h1>;
}

/** The page under a list or a text of the field wing: one column on a phone, wide at a desk. */
export function FieldFrame({ children }: { children: ReactNode }) {
  return <main className="mx-auto flex min-h-dvh w-full max-w-[76rem] flex-col pb-10">{children}</main>;
}

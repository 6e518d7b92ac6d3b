import Link from "next/link";
import type { ReactNode } from "react";
import { frontWords } from "@/lib/domain/messages/session";
import { TapeCourse } from "./tape-course";

/** A page of one column with our name at the top: where there is one thing to do, or nothing. */
export function PlainPage({ children }: { children: ReactNode }) {
  return (
    <div className="flex min-h-dvh flex-col">
      <TapeCourse />
      <main className="mx-auto w-full max-w-[28rem] px-4 pt-6 pb-10 sm:pt-12">
        <Link
          href="/"
          prefetch={false}
          className="-ml-1 mb-6 inline-flex min-h-11 items-center px-1 text-2xl leading-none font-extrabold hover:underline"
        >
          {frontWords.title}
        </Link>
        {children}
      </main>
    </div>
  );
}

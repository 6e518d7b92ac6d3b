import Link from "next/link";
import { walkWords } from "@/lib/domain/messages/desk";

/** The way back, above a walk's title. */
export function ToHistory() {
  return (
    <Link
      href="/desk"
      prefetch={false}
      className="-mt-2 -ml-1 inline-flex min-h-11 items-center gap-2 px-1 text-base font-semibold underline decoration-1 underline-offset-4"
    >
      <svg aria-hidden="true" viewBox="0 0 16 14" className="w-4 fill-current">
        <path d="M8 0H4L0 7l4 7h4L4.9 8.6H16V5.4H4.9Z" />
      </svg>
      {walkWords.back}
    </Link>
  );
}

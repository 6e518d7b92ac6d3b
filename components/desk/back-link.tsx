import Link from "next/link";

/** The way back, above a page's title. */
export function BackLink({ href, label }: { href: string; label: string }) {
  return (
    <Link
      href={href}
      prefetch={false}
      className="-mt-2 -ml-1 inline-flex min-h-11 items-center gap-2 px-1 text-base font-semibold underline decoration-1 underline-offset-4 print:hidden"
    >
      <svg aria-hidden="true" viewBox="0 0 16 14" className="w-4 fill-current">
        <path d="M8 0H4L0 7l4 7h4L4.9 8.6H16V5.4H4.9Z" />
      </svg>
      {label}
    </Link>
  );
}

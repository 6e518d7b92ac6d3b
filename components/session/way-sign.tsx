import Link from "next/link";
import { frontWords } from "@/lib/domain/messages/session";

const ways = [
  { href: "/field", label: frontWords.field, hint: frontWords.fieldHint, main: true },
  { href: "/desk", label: frontWords.desk, hint: frontWords.deskHint, main: true },
  { href: "/sign-in", label: frontWords.signIn, hint: frontWords.signInHint, main: false },
];

/** The ways in, set as a road sign sets destinations: one a line, largest first, each with its arrow. */
export function WaySign() {
  return (
    <nav aria-label={frontWords.ways} className="rounded-[14px] bg-asphalt p-1.5 text-white">
      <ul className="overflow-hidden rounded-[9px] border-[3px] border-white">
        {ways.map(({ href, label, hint, main }) => (
          <li key={href} className="not-first:border-t-[3px] not-first:border-white">
            <Link
              href={href}
              prefetch={false}
              className={`group flex items-center justify-between gap-4 px-[min(1.25rem,5%)] focus-visible:-outline-offset-6 focus-visible:shadow-none ${main ? "min-h-24 py-3.5" : "min-h-18 py-2.5"}`}
            >
              <span className="min-w-0">
                <span
                  className={`block leading-[1.05] font-extrabold group-hover:underline group-hover:decoration-[3px] group-hover:underline-offset-4 ${main ? "text-[2.125rem]" : "text-2xl"}`}
                >
                  {label}
                </span>
                <span className="mt-1 block text-base leading-tight">{hint}</span>
              </span>
              <Arrow />
            </Link>
          </li>
        ))}
      </ul>
    </nav>
  );
}

function Arrow() {
  return (
    <svg aria-hidden="true" viewBox="0 0 44 36" className="w-[min(2.75rem,16%)] shrink-0 fill-current">
      <path d="M22 2h10l12 16-12 16H22l8-11H0V13h30Z" />
    </svg>
  );
}

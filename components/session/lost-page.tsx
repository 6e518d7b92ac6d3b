import Link from "next/link";
import { lostWords } from "@/lib/domain/messages/session";
import { buttonClass } from "../ui/button";
import { PlainPage } from "./plain-page";

const ways = [
  { href: "/", label: lostWords.front },
  { href: "/field", label: lostWords.field },
  { href: "/desk", label: lostWords.desk },
];

/** Where an address leads nowhere. */
export function LostPage() {
  return (
    <PlainPage>
      <h1 className="text-[1.875rem] leading-[1.1] font-extrabold">{lostWords.title}</h1>
      <p className="mt-2 text-soft">{lostWords.text}</p>
      <ul className="mt-6 flex flex-wrap gap-2.5">
        {ways.map(({ href, label }) => (
          <li key={href}>
            <Link href={href} prefetch={false} className={buttonClass("plain", "desk")}>
              {label}
            </Link>
          </li>
        ))}
      </ul>
    </PlainPage>
  );
}

import Link from "next/link";
import { deskWords } from "@/lib/domain/messages/desk";
import { buttonClass } from "../ui/button";
import { EmptyState } from "../ui/empty-state";
import { DeskHeading } from "./desk-heading";

type GoneProps = { page: string; title: string; text: string; href: string; to: string };

/** An id behind which there is nothing, or nothing for this member: the two look alike on purpose. */
export function Gone({ page, title, text, href, to }: GoneProps) {
  return (
    <>
      <title>{`${title} · ${deskWords.brand}`}</title>
      <DeskHeading title={page} />
      <EmptyState
        title={title}
        action={
          <Link href={href} prefetch={false} className={buttonClass("plain", "desk")}>
            {to}
          </Link>
        }
      >
        <p>{text}</p>
      </EmptyState>
    </>
  );
}

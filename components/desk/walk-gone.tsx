import Link from "next/link";
import { deskWords, walkWords } from "@/lib/domain/messages/desk";
import { buttonClass } from "../ui/button";
import { EmptyState } from "../ui/empty-state";
import { DeskHeading } from "./desk-heading";

/** An id behind which there is no walk, or none for this member: the two look alike on purpose. */
export function WalkGone() {
  return (
    <>
      <title>{`${walkWords.goneTitle} · ${deskWords.brand}`}</title>
      <DeskHeading title={walkWords.plainTitle} />
      <EmptyState
        title={walkWords.goneTitle}
        action={
          <Link href="/desk" prefetch={false} className={buttonClass("plain", "desk")}>
            {walkWords.toHistory}
          </Link>
        }
      >
        <p>{walkWords.gone}</p>
      </EmptyState>
    </>
  );
}

"use client";

import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { whoQuery } from "@/lib/client/desk-queries";
import { historyWords } from "@/lib/domain/messages/desk";
import { may } from "@/lib/domain/permissions";
import { buttonClass } from "../ui/button";
import { EmptyState } from "../ui/empty-state";

/** A history with nothing in it yet. */
export function HistoryEmpty() {
  const { data: member } = useQuery(whoQuery);
  const walks = member ? may(member.role, "walks.record") : false;
  const action = walks && (
    <Link href="/field" prefetch={false} className={buttonClass("plain", "desk")}>
      {historyWords.toField}
    </Link>
  );
  return (
    <EmptyState title={historyWords.emptyTitle} action={action}>
      <p>{walks ? historyWords.emptyWalker : historyWords.emptyReader}</p>
    </EmptyState>
  );
}

"use client";

import { useMutation, useQuery, useQueryClient } from "@tanstack/react-query";
import { useState } from "react";
import { Refused } from "@/lib/client/desk-queries";
import { invitationsQuery, withdraw } from "@/lib/client/invitations";
import { momentText } from "@/lib/client/time-words";
import { peopleWords as words } from "@/lib/domain/messages/people";
import { Instant } from "../desk/instant";
import { Trouble } from "../desk/trouble";
import { Button } from "../ui/button";
import { Skeleton } from "../ui/skeleton";

/** Invitations that nobody has used yet, each with the way to take it back. */
export function OpenInvitations() {
  const { data, error, isFetching, refetch } = useQuery(invitationsQuery);
  const [now] = useState(() => new Date());
  const queries = useQueryClient();
  const taking = useMutation({
    mutationFn: withdraw,
    networkMode: "always",
    onSuccess: () => queries.invalidateQueries({ queryKey: invitationsQuery.queryKey }),
  });
  if (!data && error) return <Trouble error={error} retry={() => void refetch()} busy={isFetching} />;
  if (!data) return <Skeleton label={words.fetching} rows={1} />;
  return (
    <section>
      <h2 className="text-xl leading-tight font-extrabold">{words.open}</h2>
      {data.length === 0 && <p className="mt-2 text-soft">{words.none}</p>}
      <ul className="mt-2">
        {data.map(({ id, role, by, expiresAt }) => (
          <li
            key={id}
            className="flex flex-wrap items-center justify-between gap-x-6 gap-y-2 border-t-hair border-rule py-2.5"
          >
            <span className="min-w-0 [overflow-wrap:anywhere]">
              <span className="block font-semibold">{words.row(role, by)}</span>
              <span className="text-soft">
                {words.until} <Instant at={expiresAt} />
              </span>
            </span>
            <Button
              size="desk"
              aria-label={words.withdrawThis(role, momentText(expiresAt, now))}
              aria-disabled={taking.isPending || undefined}
              onClick={() => !taking.isPending && taking.mutate(id)}
            >
              {words.withdraw}
            </Button>
          </li>
        ))}
      </ul>
      {taking.error && (
        <p role="alert" className="mt-2 font-semibold">
          {taking.error instanceof Refused ? taking.error.problem.title : words.failed}
        </p>
      )}
    </section>
  );
}

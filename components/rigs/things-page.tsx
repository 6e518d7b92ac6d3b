"use client";

import { useQuery } from "@tanstack/react-query";
import { thingsQuery } from "@/lib/client/rig-queries";
import { thingsWords as words } from "@/lib/domain/messages/things";
import { DeskHeading } from "../desk/desk-heading";
import { EmptyState } from "../ui/empty-state";
import { Fetched } from "./fetched";
import { ThingTable } from "./thing-table";

/** The coaches, cars and pieces of gear that this member's organization has on its sheets. */
export function ThingsPage() {
  const things = useQuery(thingsQuery);
  return (
    <>
      <DeskHeading title={words.title} sub={words.sub} />
      <Fetched query={things} label={words.fetching} rows={6}>
        {({ things: rows }) =>
          rows.length > 0 ? (
            <ThingTable rows={rows} />
          ) : (
            <EmptyState title={words.emptyTitle}>
              <p>{words.empty}</p>
            </EmptyState>
          )
        }
      </Fetched>
    </>
  );
}

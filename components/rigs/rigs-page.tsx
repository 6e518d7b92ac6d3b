"use client";

import { useQuery } from "@tanstack/react-query";
import { useState } from "react";
import Link from "next/link";
import { whoQuery } from "@/lib/client/desk-queries";
import { rigsQuery, thingsQuery } from "@/lib/client/rig-queries";
import { rigsWords as words } from "@/lib/domain/messages/rigs";
import { may } from "@/lib/domain/permissions";
import { DeskHeading } from "../desk/desk-heading";
import { buttonClass } from "../ui/button";
import { EmptyState } from "../ui/empty-state";
import { Fetched } from "./fetched";
import { RigTable } from "./rig-table";

/** The rigs that this member's organization keeps or built. */
export function RigsPage() {
  const { data: member } = useQuery(whoQuery);
  const writes = member ? may(member.role, "rigs.write") : false;
  const rigs = useQuery(rigsQuery);
  // What is on a rig is in the book of things; without it the rows say less, and nothing is missing.
  const { data: book } = useQuery(thingsQuery);
  return (
    <>
      <DeskHeading title={words.title} sub={words.sub} />
      {writes && (
        <div className="mb-4 flex flex-wrap items-center gap-x-6 gap-y-2">
          {rigs.data && rigs.data.rigs.length > 0 && <NewRig />}
          <Link
            href="/desk/sheet"
            prefetch={false}
            className="inline-flex min-h-11 items-center font-semibold underline decoration-2 underline-offset-4"
          >
            {words.drafts}
          </Link>
        </div>
      )}
      <Fetched query={rigs} label={words.fetching} rows={4}>
        {({ rigs: rows }) =>
          rows.length > 0 ? (
            <RigTable rows={rows} things={book?.things ?? []} />
          ) : (
            <EmptyState title={words.emptyTitle} action={writes && <NewRig />}>
              <p>{writes ? words.emptyWriter : words.emptyReader}</p>
            </EmptyState>
          )
        }
      </Fetched>
    </>
  );
}

/** The way to an empty sheet, under an id that is made here so that saving it twice makes one rig. */
function NewRig() {
  const [id] = useState(() => crypto.randomUUID());
  return (
    <Link
      href={`/desk/sheet?new=${id}`}
      prefetch={false}
      className={`${buttonClass("good", "desk")} max-w-full px-6`}
    >
      {words.newRig}
    </Link>
  );
}

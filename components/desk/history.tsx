"use client";

import { useInfiniteQuery, useQuery } from "@tanstack/react-query";
import { historyQuery, whoQuery } from "@/lib/client/desk-queries";
import { historyWords } from "@/lib/domain/messages/desk";
import { may } from "@/lib/domain/permissions";
import { Skeleton } from "../ui/skeleton";
import { DeskHeading } from "./desk-heading";
import { HistoryEmpty } from "./history-empty";
import { HistoryTable } from "./history-table";
import { OlderWalks } from "./older-walks";
import { Stale } from "./stale";
import { Trouble } from "./trouble";

/** Every walk that this member may read, newest first, a page at a time. */
export function History() {
  const { data: member } = useQuery(whoQuery);
  const all = member && may(member.role, "walks.read-all");
  const sub = all
    ? historyWords.all(member.organisation.name)
    : member
      ? historyWords.own
      : historyWords.caption;
  return (
    <>
      <DeskHeading title={historyWords.title} sub={sub} />
      <Walks />
    </>
  );
}

function Walks() {
  const query = useInfiniteQuery(historyQuery);
  const { data, error, isRefetchError, dataUpdatedAt, isFetching, refetch } = query;
  const again = () => void refetch();
  if (!data) {
    if (error) return <Trouble error={error} retry={again} busy={isFetching} />;
    return <Skeleton label={historyWords.fetching} rows={6} />;
  }
  const rows = data.pages.flatMap((page) => page.walks);
  const names = Object.assign({}, ...data.pages.map((page) => page.names)) as Record<string, string>;
  return (
    <>
      {isRefetchError && <Stale since={dataUpdatedAt} retry={again} />}
      {rows.length === 0 ? (
        <HistoryEmpty />
      ) : (
        <>
          <HistoryTable rows={rows} names={names} />
          <OlderWalks
            shown={rows.length}
            more={query.hasNextPage}
            busy={query.isFetchingNextPage}
            failed={query.isFetchNextPageError}
            fetch={() => void query.fetchNextPage()}
          />
        </>
      )}
    </>
  );
}

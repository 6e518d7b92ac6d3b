"use client";

import { useQuery } from "@tanstack/react-query";
import { useSearchParams } from "next/navigation";
import { isRefusal, walkQuery } from "@/lib/client/desk-queries";
import { walkWords } from "@/lib/domain/messages/desk";
import { UUID } from "@/lib/domain/uuid";
import { DeskHeading } from "./desk-heading";
import { Stale } from "./stale";
import { ToHistory } from "./to-history";
import { Trouble } from "./trouble";
import { WalkFetching } from "./walk-fetching";
import { WalkGone } from "./walk-gone";
import { WalkView } from "./walk-view";

/** One walk read back, by the id in the query string. */
export function WalkPage() {
  const id = useSearchParams().get("id") ?? "";
  const { data, error, isFetching, isRefetchError, dataUpdatedAt, refetch } = useQuery(walkQuery(id));
  const again = () => void refetch();
  if (!UUID.test(id) || isRefusal(error, "not-found")) return <WalkGone />;
  if (data) {
    return (
      <>
        {isRefetchError && <Stale since={dataUpdatedAt} retry={again} />}
        <WalkView reading={data} />
      </>
    );
  }
  if (!error) return <WalkFetching />;
  return (
    <>
      <DeskHeading over={<ToHistory />} title={walkWords.plainTitle} />
      <Trouble error={error} retry={again} busy={isFetching} />
    </>
  );
}

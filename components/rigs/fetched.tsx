"use client";

import type { UseQueryResult } from "@tanstack/react-query";
import type { ReactNode } from "react";
import { isRefusal } from "@/lib/client/desk-queries";
import { Stale } from "../desk/stale";
import { Trouble } from "../desk/trouble";
import { Skeleton } from "../ui/skeleton";

type FetchedProps<T> = {
  query: UseQueryResult<T>;
  /** What is being fetched, in words. */
  label: string;
  rows?: number;
  /** What stands there when it does not exist, or not for this member. */
  gone?: ReactNode;
  /** What stands above it until it is there. */
  heading?: ReactNode;
  children: (data: T) => ReactNode;
};

/** What a query brings, and what stands in its place while it is on its way or does not come. */
export function Fetched<T>({ query, label, rows = 5, gone, heading, children }: FetchedProps<T>) {
  const { data, error, isFetching, isRefetchError, dataUpdatedAt, refetch } = query;
  const again = () => void refetch();
  if (gone && isRefusal(error, "not-found")) return gone;
  if (data !== undefined) {
    return (
      <>
        {isRefetchError && <Stale since={dataUpdatedAt} retry={again} />}
        {children(data)}
      </>
    );
  }
  return (
    <>
      {heading}
      {error ? (
        <Trouble error={error} retry={again} busy={isFetching} />
      ) : (
        <Skeleton label={label} rows={rows} />
      )}
    </>
  );
}

"use client";

import { useSearchParams } from "next/navigation";
import { purposes, type Purpose } from "@/lib/domain/entry";

const shows = ["all", "in", "out"] as const;

/** What the reviewer's page shows. It stands in the address, so that a link says the same to whoever gets it. */
export interface Review {
  rig: string;
  show: (typeof shows)[number];
  walk: Purpose | null;
  holds: boolean;
  /** The rig whose list is set beside this one's. */
  beside: string | null;
}

/** The address read, and a way to change a part of it without a new entry in the browser's history. */
export function useReview(): [Review, (change: Partial<Review>) => void] {
  const query = useSearchParams();
  const review: Review = {
    rig: query.get("rig") ?? "",
    show: shows.find((one) => one === query.get("show")) ?? "all",
    walk: purposes.find((one) => one === query.get("walk")) ?? null,
    holds: query.get("holds") === "1",
    beside: query.get("beside"),
  };
  return [
    review,
    (change) => window.history.replaceState(null, "", `/desk/list?${written({ ...review, ...change })}`),
  ];
}

function written({ rig, show, walk, holds, beside }: Review): string {
  const query = new URLSearchParams({ rig });
  if (show !== "all") query.set("show", show);
  if (walk) query.set("walk", walk);
  if (holds) query.set("holds", "1");
  if (beside) query.set("beside", beside);
  return query.toString();
}

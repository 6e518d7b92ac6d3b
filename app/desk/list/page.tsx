import type { Metadata } from "next";
import { Suspense } from "react";
import { ListPage } from "@/components/rigs/list-page";
import { Skeleton } from "@/components/ui/skeleton";
import { reviewWords } from "@/lib/domain/messages/review";

export const dynamic = "error";
export const metadata: Metadata = { title: reviewWords.title };

export default function Page() {
  return (
    <Suspense fallback={<Skeleton label={reviewWords.fetching} rows={5} />}>
      <ListPage />
    </Suspense>
  );
}

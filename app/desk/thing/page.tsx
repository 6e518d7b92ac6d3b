import type { Metadata } from "next";
import { Suspense } from "react";
import { ThingPage } from "@/components/rigs/thing-page";
import { Skeleton } from "@/components/ui/skeleton";
import { thingWords } from "@/lib/domain/messages/things";

export const dynamic = "error";
export const metadata: Metadata = { title: thingWords.plainTitle };

export default function Page() {
  return (
    <Suspense fallback={<Skeleton label={thingWords.fetching} rows={5} />}>
      <ThingPage />
    </Suspense>
  );
}

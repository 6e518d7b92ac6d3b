import type { Metadata } from "next";
import { Suspense } from "react";
import { RigPage } from "@/components/rigs/rig-page";
import { Skeleton } from "@/components/ui/skeleton";
import { rigWords } from "@/lib/domain/messages/rigs";

export const dynamic = "error";
export const metadata: Metadata = { title: rigWords.plainTitle };

export default function Page() {
  return (
    <Suspense fallback={<Skeleton label={rigWords.fetching} rows={5} />}>
      <RigPage />
    </Suspense>
  );
}

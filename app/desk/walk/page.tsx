import type { Metadata } from "next";
import { Suspense } from "react";
import { WalkFetching } from "@/components/desk/walk-fetching";
import { WalkPage } from "@/components/desk/walk-page";
import { walkWords } from "@/lib/domain/messages/desk";

export const dynamic = "error";
export const metadata: Metadata = { title: walkWords.plainTitle };

export default function Page() {
  return (
    <Suspense fallback={<WalkFetching />}>
      <WalkPage />
    </Suspense>
  );
}

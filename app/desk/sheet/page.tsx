import type { Metadata } from "next";
import { Suspense } from "react";
import { SheetPage } from "@/components/sheet/sheet-page";
import { sheetFormWords } from "@/lib/domain/messages/sheet-form";

export const dynamic = "error";
export const metadata: Metadata = { title: sheetFormWords.title };

export default function Page() {
  return (
    <Suspense>
      <SheetPage />
    </Suspense>
  );
}

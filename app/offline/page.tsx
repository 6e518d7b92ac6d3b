import type { Metadata } from "next";
import { OfflineScreen } from "@/components/field/offline-screen";
import { fieldWords } from "@/lib/domain/messages/field";

export const dynamic = "error";
export const metadata: Metadata = { title: { absolute: fieldWords.documentTitle(fieldWords.offline.title) } };

/** What the worker shows for a page that needs the network when there is none. */
export default function OfflinePage() {
  return <OfflineScreen />;
}

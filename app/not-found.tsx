import type { Metadata } from "next";
import { LostPage } from "@/components/session/lost-page";
import { lostWords } from "@/lib/domain/messages/session";

export const metadata: Metadata = { title: lostWords.title };

export default function NotFound() {
  return <LostPage />;
}

import type { Metadata } from "next";
import { JoinPage } from "@/components/session/join-page";
import { joinWords } from "@/lib/domain/messages/people";

export const dynamic = "error";
export const metadata: Metadata = { title: joinWords.title };

export default function Page() {
  return <JoinPage />;
}

import type { Metadata } from "next";
import { History } from "@/components/desk/history";
import { historyWords } from "@/lib/domain/messages/desk";

export const dynamic = "error";
export const metadata: Metadata = { title: historyWords.title };

export default function Page() {
  return <History />;
}

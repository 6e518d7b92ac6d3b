import type { Metadata } from "next";
import { ThingsPage } from "@/components/rigs/things-page";
import { thingsWords } from "@/lib/domain/messages/things";

export const dynamic = "error";
export const metadata: Metadata = { title: thingsWords.title };

export default function Page() {
  return <ThingsPage />;
}

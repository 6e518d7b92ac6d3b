import type { Metadata } from "next";
import { RigsPage } from "@/components/rigs/rigs-page";
import { rigsWords } from "@/lib/domain/messages/rigs";

export const dynamic = "error";
export const metadata: Metadata = { title: rigsWords.title };

export default function Page() {
  return <RigsPage />;
}

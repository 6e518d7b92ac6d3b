import type { Metadata } from "next";
import { PeoplePage } from "@/components/people/people-page";
import { peopleWords } from "@/lib/domain/messages/people";

export const dynamic = "error";
export const metadata: Metadata = { title: peopleWords.title };

export default function Page() {
  return <PeoplePage />;
}

import type { Metadata } from "next";
import { SignInPage } from "@/components/session/sign-in-page";
import { signInWords } from "@/lib/domain/messages/session";

export const dynamic = "error";
export const metadata: Metadata = { title: signInWords.title };

export default function Page() {
  return <SignInPage />;
}

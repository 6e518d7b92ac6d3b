import type { Metadata } from "next";
import { SignUpPage } from "@/components/session/sign-up-page";
import { signUpWords } from "@/lib/domain/messages/account";

export const dynamic = "error";
export const metadata: Metadata = { title: signUpWords.title };

export default function Page() {
  return <SignUpPage />;
}

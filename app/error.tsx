"use client";

import { BrokenPage } from "@/components/session/broken-page";

export default function ErrorPage({ retry }: { retry: () => void }) {
  return <BrokenPage retry={retry} />;
}

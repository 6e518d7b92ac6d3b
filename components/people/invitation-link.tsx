"use client";

import { useRef, useState } from "react";
import { momentText } from "@/lib/client/time-words";
import type { MadeInvitation } from "@/lib/domain/invitation";
import { peopleWords as words } from "@/lib/domain/messages/people";
import { Button } from "../ui/button";
import { TextField } from "../ui/text-field";

/** The link of an invitation that was just made, to copy: there is no mail that would carry it. */
export function InvitationLink({ made }: { made: MadeInvitation }) {
  const field = useRef<HTMLInputElement>(null);
  const [said, setSaid] = useState<string | null>(null);
  const [until] = useState(() => momentText(made.expiresAt, new Date()));
  const link = new URL(made.url, window.location.origin).href;
  const copy = async () => {
    try {
      await navigator.clipboard.writeText(link);
      setSaid(words.copied);
    } catch {
      field.current?.select();
      setSaid(words.notCopied);
    }
  };
  return (
    <div className="flex w-full flex-col items-start gap-3 border-y-hair border-rule bg-shade px-4 py-4">
      <TextField
        ref={field}
        className="w-full"
        label={words.link}
        hint={words.linkHint(until)}
        value={link}
        readOnly
        onFocus={(event) => event.target.select()}
      />
      <Button size="desk" onClick={() => void copy()}>
        {words.copy}
      </Button>
      <p role="status" className="font-semibold empty:hidden">
        {said}
      </p>
    </div>
  );
}

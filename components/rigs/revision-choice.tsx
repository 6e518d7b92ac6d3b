"use client";

import { useId, useState } from "react";
import { momentText } from "@/lib/client/time-words";
import { revisionsWords as words } from "@/lib/domain/messages/rigs";
import type { RevisionRow } from "@/lib/domain/rigs";

type RevisionChoiceProps = {
  label: string;
  rows: readonly RevisionRow[];
  /** Digest of the one that is chosen. */
  value: string;
  onChoose: (digest: string) => void;
};

/** One revision out of a rig's, newest first. */
export function RevisionChoice({ label, rows, value, onChoose }: RevisionChoiceProps) {
  const id = useId();
  const [now] = useState(() => new Date());
  return (
    <div className="flex min-w-0 flex-col gap-1">
      <label htmlFor={id} className="font-semibold">
        {label}
      </label>
      <select
        id={id}
        value={value}
        onChange={({ target }) => onChoose(target.value)}
        className="min-h-12 w-full min-w-0 rounded-[3px] border-2 border-edge bg-paper px-3 py-2 text-lg text-ink"
      >
        {rows.map((row) => (
          <option key={row.number} value={row.digest}>
            {`${words.row(row.number)}, ${momentText(row.createdAt, now)}`}
          </option>
        ))}
      </select>
    </div>
  );
}

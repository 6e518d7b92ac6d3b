"use client";

import type { Field } from "@/lib/domain/sheet/field";
import { siWords, valueWords } from "@/lib/domain/sheet/reading";
import { rigWords } from "@/lib/domain/messages/rigs";
import { usePreferences } from "../settings/use-preferences";

/** A value of a sheet in the reader's units, its SI value for whoever asks; figures stand in columns. */
export function Value({ field, value }: { field: Field; value: unknown }) {
  const { units } = usePreferences();
  const words = valueWords(field, value, units);
  const si = siWords(field, value);
  if (value === null || value === undefined) return <span className="text-soft italic">{words}</span>;
  if (si === null) return <span className="whitespace-pre-line">{words}</span>;
  return (
    <span title={rigWords.si(si)} className="tabular text-[0.9375em]">
      {words}
    </span>
  );
}

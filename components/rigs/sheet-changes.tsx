"use client";

import { revisionsWords as words } from "@/lib/domain/messages/rigs";
import type { SheetDifference } from "@/lib/domain/sheet/compare";
import { sideWords } from "@/lib/domain/sheet/reading";
import { usePreferences } from "../settings/use-preferences";

/** What differs between two sheets, field by field, part after part, with what stood there and what stands there now. */
export function SheetChanges({ differences }: { differences: readonly SheetDifference[] }) {
  const parts = [...new Set(differences.map(({ where }) => where[0]!))];
  if (parts.length === 0) return <p className="mt-2 text-base">{words.nothingOnSheet}</p>;
  return parts.map((part) => (
    <section key={part} className="mt-3">
      <h3 className="border-b-hair border-ink pb-1 text-lg leading-tight font-extrabold">{part}</h3>
      <ul className="text-base">
        {differences
          .filter(({ where }) => where[0] === part)
          .map((difference) => (
            <Row key={difference.pointer} difference={difference} />
          ))}
      </ul>
    </section>
  ));
}

function Row({ difference }: { difference: SheetDifference }) {
  const { units } = usePreferences();
  const { where, before, after } = difference;
  return (
    <li className="grid grid-cols-1 gap-x-4 border-b border-rule py-2 @2xl:grid-cols-[minmax(0,1fr)_minmax(0,1fr)_minmax(0,1fr)]">
      <p className="text-soft">{where.slice(1).join(", ")}</p>
      <p>
        <span className="block text-sm text-soft">{words.before}</span>
        <del className="whitespace-pre-line no-underline">{sideWords(difference, before, units)}</del>
      </p>
      <p className="font-semibold">
        <span className="block text-sm font-normal text-soft">{words.after}</span>
        <ins className="whitespace-pre-line no-underline">{sideWords(difference, after, units)}</ins>
      </p>
    </li>
  );
}

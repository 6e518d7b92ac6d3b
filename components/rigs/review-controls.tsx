"use client";

import { useQuery } from "@tanstack/react-query";
import { useId, type ReactNode } from "react";
import { rigsQuery } from "@/lib/client/rig-queries";
import { purposes } from "@/lib/domain/entry";
import { besideWords, reviewWords as words } from "@/lib/domain/messages/review";
import { purposeWords } from "@/lib/domain/messages/walk";
import { Button } from "../ui/button";
import type { Review } from "./review-address";

type ReviewControlsProps = { review: Review; change: (change: Partial<Review>) => void };

/** Which checks are shown, and which other rig's list stands beside this one's. */
export function ReviewControls({ review, change }: ReviewControlsProps) {
  const { data } = useQuery(rigsQuery);
  const others = data?.rigs.filter(({ id }) => id !== review.rig) ?? [];
  return (
    <form
      aria-label={words.filters}
      onSubmit={(event) => event.preventDefault()}
      className="my-4 flex flex-wrap items-end gap-x-6 gap-y-3 border-y-hair border-rule py-3 text-base print:hidden"
    >
      {!review.beside && (
        <>
          <Shows review={review} change={change} />
          <Pick
            label={words.walk}
            value={review.walk ?? ""}
            onPick={(walk) => change({ walk: purposes.find((one) => one === walk) ?? null })}
          >
            <option value="">{words.anyWalk}</option>
            {purposes.map((purpose) => (
              <option key={purpose} value={purpose}>
                {purposeWords[purpose]}
              </option>
            ))}
          </Pick>
          <label className="flex min-h-desk items-center gap-2.5 font-semibold">
            <input
              type="checkbox"
              checked={review.holds}
              onChange={({ target }) => change({ holds: target.checked })}
              className="size-6 shrink-0 accent-ink"
            />
            {words.holds}
          </label>
        </>
      )}
      {(others.length > 0 || review.beside) && (
        <Pick
          label={besideWords.with}
          value={review.beside ?? ""}
          onPick={(beside) => change({ beside: beside || null })}
        >
          <option value="">{besideWords.none}</option>
          {others.map(({ id, name }) => (
            <option key={id} value={id}>
              {name}
            </option>
          ))}
        </Pick>
      )}
      <Button size="desk" className="@3xl:ml-auto" onClick={() => window.print()}>
        {words.print}
      </Button>
    </form>
  );
}

function Shows({ review, change }: ReviewControlsProps) {
  const name = useId();
  return (
    <fieldset className="min-w-0">
      <legend className="pb-1 font-semibold">{words.show}</legend>
      <div className="flex flex-wrap gap-2">
        {(Object.keys(words.shows) as Review["show"][]).map((show) => (
          <label
            key={show}
            className="relative flex min-h-desk min-w-desk items-center justify-center rounded-[3px] border-2 border-edge px-3.5 font-semibold has-checked:border-ink has-checked:bg-ink has-checked:text-paper"
          >
            {/* It lies over its label, so that the whole field shows the focus and takes the touch. */}
            <input
              type="radio"
              name={name}
              checked={review.show === show}
              onChange={() => change({ show })}
              className="absolute -inset-0.5 cursor-pointer appearance-none rounded-[3px]"
            />
            {words.shows[show]}
          </label>
        ))}
      </div>
    </fieldset>
  );
}

type PickProps = { label: string; value: string; onPick: (value: string) => void; children: ReactNode };

function Pick({ label, value, onPick, children }: PickProps) {
  return (
    <label className="min-w-0 font-semibold">
      <span className="block pb-1">{label}</span>
      <select
        value={value}
        onChange={({ target }) => onPick(target.value)}
        className="min-h-desk max-w-full min-w-0 rounded-[3px] border-2 border-edge bg-paper px-2.5 font-normal text-ink"
      >
        {children}
      </select>
    </label>
  );
}

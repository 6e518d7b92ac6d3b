"use client";

import { useQuery } from "@tanstack/react-query";
import Link from "next/link";
import { useSearchParams } from "next/navigation";
import { thingQuery } from "@/lib/client/rig-queries";
import { deskWords } from "@/lib/domain/messages/desk";
import { kindWords } from "@/lib/domain/messages/rigs";
import { thingsWords, thingWords as words } from "@/lib/domain/messages/things";
import type { ThingReading } from "@/lib/domain/rigs";
import { readThing } from "@/lib/domain/sheet/reading";
import { UUID } from "@/lib/domain/uuid";
import { BackLink } from "../desk/back-link";
import { DeskHeading } from "../desk/desk-heading";
import { Gone } from "../desk/gone";
import { Fetched } from "./fetched";
import { PartLines } from "./part-lines";
import { ThingHistory } from "./thing-history";

const gone = (
  <Gone
    page={words.plainTitle}
    title={words.goneTitle}
    text={words.gone}
    href="/desk/things"
    to={words.toThings}
  />
);
const back = <BackLink href="/desk/things" label={words.back} />;

/** One coach, car or piece of gear by the id in the query string: where it is, what it is, and its history. */
export function ThingPage() {
  const id = useSearchParams().get("id") ?? "";
  const thing = useQuery(thingQuery(id));
  if (!UUID.test(id)) return gone;
  return (
    <Fetched
      query={thing}
      label={words.fetching}
      gone={gone}
      heading={<DeskHeading over={back} title={words.plainTitle} />}
    >
      {(reading) => <Thing thing={reading} />}
    </Fetched>
  );
}

function Thing({ thing: { kind, label, rigs, history } }: { thing: ThingReading }) {
  const state = history.find((row) => row.state !== null)?.state;
  const part = state ? readThing(kind, state) : null;
  return (
    <>
      <title>{`${label} · ${deskWords.brand}`}</title>
      <DeskHeading over={back} title={label} sub={kindWords(kind)} />
      <div className="flex flex-wrap items-center gap-x-3 border-y-hair border-rule py-1 text-base">
        <span className="text-soft">{words.on}</span>
        {rigs.map(({ id, name }) => (
          <Link
            key={id}
            href={`/desk/rig?id=${id}`}
            prefetch={false}
            className="inline-flex min-h-desk items-center font-semibold underline decoration-1 underline-offset-4"
          >
            {name}
          </Link>
        ))}
        {rigs.length === 0 && <span className="flex min-h-desk items-center">{thingsWords.noRig}</span>}
      </div>
      <div className="mt-6 grid grid-cols-1 gap-x-10 gap-y-8 @5xl:grid-cols-[minmax(0,1fr)_minmax(0,1fr)] print:block">
        <ThingHistory kind={kind} history={history} />
        {part && (
          <section className="@container min-w-0">
            <h2 className="border-b-hair border-ink pb-1 text-xl leading-tight font-extrabold">
              {words.now}
            </h2>
            <PartLines part={part} />
          </section>
        )}
      </div>
    </>
  );
}

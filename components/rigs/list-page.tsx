"use client";

import { useQuery } from "@tanstack/react-query";
import { rigQuery } from "@/lib/client/rig-queries";
import { deskWords } from "@/lib/domain/messages/desk";
import { besideWords, reviewWords as words } from "@/lib/domain/messages/review";
import type { RigReading } from "@/lib/domain/rigs";
import { sheetIn, type Sheet } from "@/lib/domain/sheet/sheet";
import { UUID } from "@/lib/domain/uuid";
import { BackLink } from "../desk/back-link";
import { DeskHeading } from "../desk/desk-heading";
import { Gone } from "../desk/gone";
import { Notice } from "../ui/notice";
import { Fetched } from "./fetched";
import { useReview } from "./review-address";
import { ReviewBeside } from "./review-beside";
import { ReviewControls } from "./review-controls";
import { ReviewList } from "./review-list";
import { RuledOut } from "./ruled-out";

const gone = (
  <Gone page={words.title} title={words.goneTitle} text={words.gone} href="/desk/rigs" to={words.toRigs} />
);

/** The reviewer's page: every check of the catalogue on one rig, in or out and why; or its list beside another's. */
export function ListPage() {
  const [{ rig }] = useReview();
  const query = useQuery(rigQuery(rig));
  if (!UUID.test(rig)) return gone;
  const heading = (
    <DeskHeading over={<BackLink href={`/desk/rig?id=${rig}`} label={words.back} />} title={words.title} />
  );
  return (
    <Fetched query={query} label={words.fetching} gone={gone} heading={heading}>
      {(reading) => <Reviewed reading={reading} sheet={sheetIn(reading.document)} />}
    </Fetched>
  );
}

function Reviewed({ reading, sheet }: { reading: RigReading; sheet: Sheet | null }) {
  const [review, change] = useReview();
  const title = words.of(reading.name);
  return (
    <>
      <title>{`${title} · ${deskWords.brand}`}</title>
      <DeskHeading
        over={<BackLink href={`/desk/rig?id=${reading.id}`} label={reading.name} />}
        title={title}
        sub={review.beside ? besideWords.sub : words.sub}
      />
      {sheet === null ? (
        <Notice tone="plain">{words.noSheet}</Notice>
      ) : (
        <>
          {reading.newerList && <Notice tone="plain">{words.newer(reading.revision.number)}</Notice>}
          <RuledOut reasons={reading.ruledOut} />
          <ReviewControls review={review} change={change} />
          {review.beside ? (
            <ReviewBeside one={{ name: reading.name, sheet }} beside={review.beside} />
          ) : (
            <ReviewList sheet={sheet} review={review} />
          )}
        </>
      )}
    </>
  );
}

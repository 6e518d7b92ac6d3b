"use client";

import { useQuery } from "@tanstack/react-query";
import { useSearchParams } from "next/navigation";
import { revisionQuery, rigQuery } from "@/lib/client/rig-queries";
import { rigWords as words, revisionsWords } from "@/lib/domain/messages/rigs";
import type { RigReading } from "@/lib/domain/rigs";
import { UUID } from "@/lib/domain/uuid";
import { BackLink } from "../desk/back-link";
import { DeskHeading } from "../desk/desk-heading";
import { Gone } from "../desk/gone";
import { Compared } from "./compared";
import { Fetched } from "./fetched";
import { OldRevision } from "./old-revision";
import { RigView } from "./rig-view";

const gone = (
  <Gone
    page={words.plainTitle}
    title={words.goneTitle}
    text={words.gone}
    href="/desk/rigs"
    to={words.toRigs}
  />
);
const heading = (
  <DeskHeading over={<BackLink href="/desk/rigs" label={words.back} />} title={words.plainTitle} />
);

/** One rig by the id in the query string: at its latest revision, at the one that is named, or two compared. */
export function RigPage() {
  const query = useSearchParams();
  const id = query.get("id") ?? "";
  const digest = query.get("revision");
  const rig = useQuery(rigQuery(id));
  if (!UUID.test(id)) return gone;
  return (
    <Fetched query={rig} label={words.fetching} gone={gone} heading={heading}>
      {(reading) => <Shown reading={reading} digest={digest} from={query.get("from")} to={query.get("to")} />}
    </Fetched>
  );
}

type ShownProps = { reading: RigReading; digest: string | null; from: string | null; to: string | null };

function Shown({ reading, digest, from, to }: ShownProps) {
  const has = (wanted: string) => reading.revisions.some((revision) => revision.digest === wanted);
  if (from !== null && to !== null)
    return has(from) && has(to) ? <Compared rig={reading} from={from} to={to} /> : gone;
  if (digest === null || digest === reading.revision.digest) return <RigView reading={reading} />;
  return has(digest) ? <Old reading={reading} digest={digest} /> : gone;
}

function Old({ reading, digest }: { reading: RigReading; digest: string }) {
  const revision = useQuery(revisionQuery(reading.id, digest));
  return (
    <Fetched query={revision} label={revisionsWords.fetching} gone={gone} heading={heading}>
      {(old) => <OldRevision rig={reading} revision={old} />}
    </Fetched>
  );
}
